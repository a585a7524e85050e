import { afterNextRender, DOCUMENT, inject, Injectable, Injector } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import type { Commission, CommissionChanges, Stage } from '@shared/api/commission';
import { Announcer } from '../platform/announcer';
import { apiFailureOf } from '../platform/api-problem';
import { Downloads } from '../platform/downloads';
import { STAGE_WORDS } from './commission-words';
import { CommissionsStore } from './commissions-store';

/** What can be done with one commission of the list. Each step is said, and can be taken back. */
@Injectable()
export class CommissionActions {
  private readonly store = inject(CommissionsStore);
  private readonly announcer = inject(Announcer);
  private readonly downloads = inject(Downloads);
  private readonly dialog = inject(MatDialog);
  private readonly document = inject(DOCUMENT);
  private readonly injector = inject(Injector);

  async edit(commission: Commission): Promise<void> {
    const { EditCommissionDialog } = await import('./edit-commission-dialog');
    this.dialog.open(EditCommissionDialog, {
      width: '520px',
      data: {
        commission,
        save: (changes: CommissionChanges) => this.store.change(commission.id, changes),
      },
    });
  }

  async move(commission: Commission, stage: Stage): Promise<void> {
    if (stage === commission.stage) return;
    await this.changeWithUndo(
      commission,
      { stage },
      { stage: commission.stage },
      `“${commission.title}” now stands at ${STAGE_WORDS[stage].toLowerCase()}.`,
    );
  }

  async archive(commission: Commission): Promise<void> {
    await this.changeWithUndo(
      commission,
      { archived: true },
      { archived: false },
      `“${commission.title}” is archived.`,
    );
  }

  async takeBack(commission: Commission): Promise<void> {
    await this.changeWithUndo(
      commission,
      { archived: false },
      { archived: true },
      `“${commission.title}” is back from the archive.`,
    );
  }

  async download(commission: Commission): Promise<void> {
    const url = `/api/layouts/${commission.layoutId}/file`;
    await this.saying('The layout file could not be downloaded.', () =>
      this.downloads.get(url, 'layout.json'),
    );
  }

  private async changeWithUndo(
    commission: Commission,
    changes: CommissionChanges,
    back: CommissionChanges,
    sentence: string,
  ): Promise<void> {
    await this.saying('Nothing was changed.', async () => {
      await this.store.change(commission.id, changes);
      this.announcer.offer(sentence, 'Undo', () => void this.undo(commission, back));
      afterNextRender(() => this.keepFocus(), { injector: this.injector });
    });
  }

  /** The row may be gone, and the button that was pressed with it: the keyboard goes on from the page. */
  private keepFocus(): void {
    if (this.document.activeElement === this.document.body) {
      this.document.querySelector('main')?.focus({ preventScroll: true });
    }
  }

  private async undo(commission: Commission, back: CommissionChanges): Promise<void> {
    await this.saying('It could not be taken back.', async () => {
      await this.store.change(commission.id, back);
      this.announcer.tell(`“${commission.title}” is as it was.`);
    });
  }

  private async saying(onFailure: string, step: () => Promise<void>): Promise<void> {
    try {
      await step();
    } catch (thrown) {
      const failure = apiFailureOf(thrown);
      // The sign-in page says by itself that the session has ended.
      if (failure.code === 'not-signed-in') return;
      this.announcer.tell(`${onFailure} ${failure.message}`);
    }
  }
}
