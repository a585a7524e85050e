import { Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { thumbnailOf } from '@shared/layout/thumbnail';
import { Icon } from '../../drawing/icon';
import { ShellThumbnail } from '../../drawing/shell-thumbnail';
import { KeepVersion } from '../keep-version';
import { LayoutStore } from '../layout-store';
import type { Pair } from './pair';

/** The draft among the versions: what is open for work and not yet kept. */
@Component({
  selector: 'sl-draft-card',
  imports: [Icon, MatButton, ShellThumbnail],
  template: `
    <article class="card draft" aria-label="The draft">
      <div class="head">
        <sl-shell-thumbnail [thumbnail]="thumbnail()" />
        <div>
          <h2>The draft</h2>
          <p class="mute">{{ standing() }}</p>
        </div>
      </div>
      <div class="steps">
        @if (latest(); as number) {
          <button
            matButton
            type="button"
            aria-label="What changed in the draft"
            (click)="compared.emit({ before: number, after: 'draft' })"
          >
            <sl-icon matButtonIcon name="compare" /> What changed
          </button>
        }
        @if (store.rights.keepVersions()) {
          <button matButton type="button" (click)="keep()">
            <sl-icon matButtonIcon name="keep" /> Keep as version {{ (latest() ?? 0) + 1 }}
          </button>
        }
      </div>
    </article>
  `,
  styleUrl: './version-card.scss',
})
export class DraftCard {
  protected readonly store = inject(LayoutStore);
  private readonly keeping = inject(KeepVersion);

  /** The last version kept, or null. */
  readonly latest = input.required<number | null>();
  readonly compared = output<Pair>();

  protected readonly thumbnail = computed(() => thumbnailOf(this.store.layout()));
  protected readonly standing = computed(() => {
    const last = this.store.opened()?.lastVersion;
    if (!last) return 'Nothing of it is kept yet.';
    const edits = this.store.revision() - last.revision;
    if (edits <= 0) return `As version ${last.number} was kept.`;
    return `${edits} ${edits === 1 ? 'edit' : 'edits'} after version ${last.number}.`;
  });

  protected keep(): void {
    void this.keeping.ask(this.store);
  }
}
