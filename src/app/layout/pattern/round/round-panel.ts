import { Component, computed, DOCUMENT, inject, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { layoutFileName } from '@shared/layout/file-name';
import type { Layout } from '@shared/layout/schema';
import { Icon } from '../../../drawing/icon';
import { Announcer } from '../../../platform/announcer';
import { saveFile } from '../../../platform/save-file';
import { LayoutStore } from '../../layout-store';
import { WrappedShell } from '../../../wrapped-shell/wrapped-shell';

/** The wrapped shell beside the canvas: follows every tile, turns, and gives a picture for the client. */
@Component({
  selector: 'sl-round-panel',
  imports: [Icon, MatButton, WrappedShell],
  template: `
    <div class="head">
      <h2>As it will be after turning</h2>
      <button matButton type="button" (click)="save()">
        <sl-icon matButtonIcon name="download" /> Save a picture
      </button>
    </div>
    <sl-wrapped-shell [layout]="shown()" />
  `,
  styleUrl: './round-panel.scss',
})
export class RoundPanel {
  private readonly document = inject(DOCUMENT);
  private readonly announcer = inject(Announcer);
  private readonly shell = viewChild.required(WrappedShell);
  private readonly store = inject(LayoutStore);
  /** The layout as far as it holds together, with the woods and tiles of this moment. */
  protected readonly shown = computed<Layout>(() => {
    const sound = this.store.soundLayout();
    const { woods, cells } = this.store.layout();
    return cells.length === sound.cells.length ? { ...sound, woods, cells } : sound;
  });

  protected async save(): Promise<void> {
    const picture = await this.shell().picture();
    if (!picture) {
      this.announcer.tell(
        'This browser cannot make the picture. A print of the page shows the drawing.',
      );
      return;
    }
    saveFile(this.document, picture, layoutFileName(this.shown().name, '.png'));
  }
}
