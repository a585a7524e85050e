import { Component, computed, inject, linkedSignal, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatProgressBar } from '@angular/material/progress-bar';
import type { Version } from '@shared/api/version';
import { firstValueFrom } from 'rxjs';
import { EmptyPlace } from '../../drawing/empty-place';
import { Trouble } from '../../drawing/trouble';
import { Announcer } from '../../platform/announcer';
import { apiFailureOf } from '../../platform/api-problem';
import { KeepVersion } from '../keep-version';
import { LayoutStore } from '../layout-store';
import { VersionsApi } from '../versions-api';
import { ComparisonView } from './comparison-view';
import { pairAtFirst, type Pair } from './pair';
import { RestoreDialog, type Restoring, type RestoreAnswer } from './restore-dialog';
import { DraftCard } from './draft-card';
import { VersionCard } from './version-card';

/** The Review station: the versions kept, what changed between any two, and going back to one. */
@Component({
  selector: 'sl-review-station',
  imports: [ComparisonView, DraftCard, EmptyPlace, MatButton, MatProgressBar, Trouble, VersionCard],
  templateUrl: './review-station.html',
  styleUrl: './review-station.scss',
})
export class ReviewStation {
  protected readonly store = inject(LayoutStore);
  private readonly api = inject(VersionsApi);
  private readonly keeping = inject(KeepVersion);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);

  protected readonly list = resource({
    params: () => {
      const opened = this.store.opened();
      return opened ? { id: opened.id, last: opened.lastVersion?.number } : undefined;
    },
    loader: async ({ params }) => (await this.api.list(params.id)).versions,
  });
  protected readonly trouble = computed(() => {
    const error = this.list.error();
    return error ? apiFailureOf(error.cause ?? error).message : null;
  });
  /** Newest first; what was listed before stays on the screen while the list is asked for again. */
  protected readonly versions = linkedSignal<readonly Version[] | null, readonly Version[]>({
    source: () => (this.list.hasValue() ? this.list.value() : null),
    computation: (listed, previous) =>
      listed ? [...listed].sort((a, b) => b.number - a.number) : (previous?.value ?? []),
  });
  protected readonly latest = computed(() => this.versions()[0] ?? null);
  /** The two that are compared; chosen anew when another version is kept. */
  protected readonly pair = linkedSignal<readonly Version[], Pair | null>({
    source: this.versions,
    computation: (versions) =>
      pairAtFirst(versions, {
        revision: this.store.revision(),
        unsaved: this.store.unsaved(),
      }),
  });

  protected compare(pair: Pair): void {
    this.pair.set(pair);
    const view = document.getElementById('sl-comparison');
    view?.scrollIntoView({ block: 'start' });
    view?.focus({ preventScroll: true });
  }

  protected keep(): void {
    void this.keeping.ask(this.store);
  }

  /** Asks, goes back, and opens what the draft now is. Unkept changes can be kept first. */
  protected async restore(version: Version): Promise<void> {
    const data: Restoring = { store: this.store, version };
    const dialog = this.dialogs.open<RestoreDialog, Restoring, RestoreAnswer>(RestoreDialog, {
      data,
      width: '560px',
    });
    const answer = await firstValueFrom(dialog.afterClosed());
    if (!answer) return;
    if (answer.kind === 'keep-first') {
      if ((await this.keeping.ask(this.store)) !== null) await this.restore(version);
      return;
    }
    const opened = this.store.opened();
    if (opened) await this.store.open(opened.commission.id);
    this.announcer.tell(
      `Version ${answer.number} is kept: it is version ${version.number} again, and so is the draft.`,
    );
  }
}
