import { Component, computed, DOCUMENT, inject, input, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Layout } from '@shared/layout/schema';
import { Icon } from '../../../drawing/icon';
import { Announcer } from '../../../platform/announcer';
import { saveFile } from '../../../platform/save-file';
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
  /** The layout as far as it holds together; its cells may be those of an earlier stroke. */
  readonly layout = input.required<Layout>();
  readonly cells = input.required<Uint8Array>();

  private readonly document = inject(DOCUMENT);
  private readonly announcer = inject(Announcer);
  private readonly shell = viewChild.required(WrappedShell);
  protected readonly shown = computed<Layout>(() => {
    const layout = this.layout();
    const cells = this.cells();
    return cells.length === layout.cells.length ? { ...layout, cells } : layout;
  });

  protected async save(): Promise<void> {
    const picture = await this.shell().picture();
    if (!picture) {
      this.announcer.tell(
        'This browser cannot make the picture. A print of the page shows the drawing.',
      );
      return;
    }
    const name = this.layout()
      .name.replace(/[^\p{L}\p{N}]+/gu, '-')
      .toLowerCase();
    saveFile(this.document, picture, `${name}.png`);
  }
}
