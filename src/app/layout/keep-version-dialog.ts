import { Component, inject, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { worstOf } from '@shared/checks/check';
import { noteSchema } from '@shared/api/version';
import { Lamp } from '../drawing/lamp';
import { apiFailureOf } from '../platform/api-problem';
import { LayoutApi } from './layout-api';
import type { LayoutStore } from './layout-store';

/** Asks for a note, saves what is open and keeps it as the next version. Closes with the version's number. */
@Component({
  selector: 'sl-keep-version-dialog',
  imports: [Lamp, MatButton, MatDialogModule, MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <form (submit)="keep($event)">
      <h2 mat-dialog-title>Keep as version {{ number }}</h2>
      <mat-dialog-content>
        <p>A version is numbered and never changes again. The draft goes on from it.</p>
        @if (worst !== 'clear') {
          <p class="worst">
            <sl-lamp [state]="worst" />
            {{
              worst === 'stop'
                ? 'A check says stop: this version could be kept, but not cut.'
                : 'A check asks for caution.'
            }}
          </p>
        }
        <mat-form-field>
          <mat-label>What is new in it</mat-label>
          <textarea matInput rows="3" [formControl]="note" cdkFocusInitial></textarea>
          <mat-hint>May be left empty.</mat-hint>
          @if (note.hasError('note')) {
            <mat-error>The note {{ note.getError('note') }}.</mat-error>
          }
        </mat-form-field>
        @if (trouble(); as sentence) {
          <p class="trouble" role="alert">{{ sentence }}</p>
        }
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>Not now</button>
        <button matButton="filled" type="submit" [disabled]="busy() || note.invalid">
          {{ busy() ? 'Keeping…' : 'Keep version ' + number }}
        </button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    mat-form-field {
      width: 100%;
      margin-top: 6px;
    }
    .worst {
      display: flex;
      gap: 8px;
      align-items: center;
    }
    .trouble {
      color: var(--stop-ink);
      font-weight: 600;
    }
  `,
})
export class KeepVersionDialog {
  private readonly store = inject<LayoutStore>(MAT_DIALOG_DATA);
  private readonly api = inject(LayoutApi);
  private readonly dialog = inject<MatDialogRef<KeepVersionDialog, number>>(MatDialogRef);

  protected readonly number = (this.store.opened()?.lastVersion?.number ?? 0) + 1;
  protected readonly worst = worstOf(this.store.checks());
  protected readonly busy = signal(false);
  protected readonly trouble = signal<string | null>(null);
  protected readonly note = new FormControl('', {
    nonNullable: true,
    validators: (control) => {
      const parsed = noteSchema.safeParse(control.value);
      return parsed.success ? null : { note: parsed.error.issues[0]?.message };
    },
  });

  protected async keep(event: Event): Promise<void> {
    event.preventDefault();
    if (this.busy() || this.note.invalid) return;
    this.busy.set(true);
    this.trouble.set(await this.sentenceOfTrouble());
    this.busy.set(false);
  }

  /** Keeps the version and closes; null when it went well, otherwise what stood in the way. */
  private async sentenceOfTrouble(): Promise<string | null> {
    await this.store.flush();
    const saving = this.store.saving();
    const opened = this.store.opened();
    if (saving.kind === 'failed') return `The draft could not be saved first. ${saving.sentence}`;
    if (!opened) return null;
    try {
      const version = { revision: this.store.revision(), note: this.note.value };
      const kept = await this.api.keepVersion(opened.id, version);
      this.store.versionKept(kept);
      this.dialog.close(kept.version.number);
      return null;
    } catch (thrown) {
      return apiFailureOf(thrown).message;
    }
  }
}
