import { Component, computed, inject, resource, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { noteSchema, type Version } from '@shared/api/version';
import { compareLayouts } from '@shared/layout/comparison';
import { readLayout } from '@shared/layout/read-layout';
import { apiFailureOf } from '../../platform/api-problem';
import { comparisonWords } from '../comparison-words';
import type { LayoutStore } from '../layout-store';
import { VersionsApi } from '../versions-api';

export interface Restoring {
  readonly store: LayoutStore;
  readonly version: Version;
}

export type RestoreAnswer =
  { readonly kind: 'restored'; readonly number: number } | { readonly kind: 'keep-first' };

/** Says what going back to a version does to the draft, asks, and does it. */
@Component({
  selector: 'sl-restore-dialog',
  imports: [MatButton, MatDialogModule, MatFormFieldModule, MatInput, ReactiveFormsModule],
  templateUrl: './restore-dialog.html',
  styles: `
    mat-form-field {
      width: 100%;
      margin-top: 16px;
    }
    .unkept {
      padding: 10px 14px;
      border: 1px solid var(--line-strong);
      border-radius: var(--radius);
    }
    .unkept p {
      margin: 0 0 8px;
    }
    .trouble {
      color: var(--stop-ink);
      font-weight: 600;
    }
  `,
})
export class RestoreDialog {
  protected readonly version = inject<Restoring>(MAT_DIALOG_DATA).version;
  private readonly store = inject<Restoring>(MAT_DIALOG_DATA).store;
  private readonly api = inject(VersionsApi);
  private readonly dialog = inject<MatDialogRef<RestoreDialog, RestoreAnswer>>(MatDialogRef);

  protected readonly last = this.store.opened()?.lastVersion?.number ?? 0;
  protected readonly busy = signal(false);
  protected readonly trouble = signal<string | null>(null);
  protected readonly note = new FormControl('', {
    nonNullable: true,
    validators: ({ value }) => {
      const parsed = noteSchema.safeParse(value);
      return parsed.success ? null : { note: parsed.error.issues[0]?.message };
    },
  });
  private readonly lastKept = resource({
    params: () => ({ id: this.store.opened()?.id ?? '', number: this.last }),
    loader: ({ params }) => this.api.detail(params.id, params.number),
  });
  /** What of the draft no version holds, in a few words; null when it is all kept. */
  protected readonly unkept = computed(() => {
    const read = this.lastKept.hasValue() ? readLayout(this.lastKept.value().layout) : null;
    if (read?.ok !== true) return null;
    const [kept, draft] = [read.layout, this.store.layout()];
    const comparison = compareLayouts(kept, draft);
    const { summary } = comparisonWords(comparison, kept, draft, this.store.lengthUnit());
    return summary === 'nothing' ? null : summary;
  });
  protected readonly looking = this.lastKept.isLoading;

  protected keepFirst(): void {
    this.dialog.close({ kind: 'keep-first' });
  }

  protected async restore(event: Event): Promise<void> {
    event.preventDefault();
    if (this.busy() || this.looking() || this.note.invalid) return;
    this.busy.set(true);
    this.trouble.set(await this.sentenceOfTrouble());
    this.busy.set(false);
  }

  /** Restores and closes; null when it went well, otherwise what stood in the way. */
  private async sentenceOfTrouble(): Promise<string | null> {
    await this.store.flush();
    const saving = this.store.saving();
    const opened = this.store.opened();
    if (saving.kind === 'failed') return `The draft could not be saved first. ${saving.sentence}`;
    if (!opened) return null;
    try {
      const { number } = this.version;
      const kept = await this.api.restore(opened.id, number, { note: this.note.value });
      this.dialog.close({ kind: 'restored', number: kept.version.number });
      return null;
    } catch (thrown) {
      return apiFailureOf(thrown).message;
    }
  }
}
