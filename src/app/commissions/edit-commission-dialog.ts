import { Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import type { Commission, CommissionChanges } from '@shared/api/commission';
import { ProblemList } from '../drawing/problem-list';
import { apiFailureOf, type ApiFailure } from '../platform/api-problem';
import { CommissionFields, commissionForm, commissionIn } from './commission-fields';

/** What the dialog is opened with. */
export interface EditCommission {
  readonly commission: Commission;
  readonly save: (changes: CommissionChanges) => Promise<Commission>;
}

/** Title, client and due date of a commission that exists. */
@Component({
  selector: 'sl-edit-commission-dialog',
  imports: [CommissionFields, MatButton, MatDialogModule, ProblemList],
  template: `
    <h2 mat-dialog-title>Edit the commission</h2>
    <form (submit)="save($event)" novalidate>
      <mat-dialog-content>
        <sl-commission-fields [form]="form" />
        @if (failure(); as failure) {
          <sl-problem-list
            class="apart"
            [heading]="'Nothing was changed. ' + failure.message"
            [problems]="failure.fields"
          />
        }
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button matButton type="button" mat-dialog-close>Cancel</button>
        <button matButton="filled" type="submit" [attr.aria-disabled]="waiting()">
          {{ waiting() ? 'Saving…' : 'Save' }}
        </button>
      </mat-dialog-actions>
    </form>
  `,
  styles: `
    .apart {
      margin-top: 16px;
    }
  `,
})
export class EditCommissionDialog {
  private readonly data = inject<EditCommission>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<EditCommissionDialog>>(MatDialogRef);
  protected readonly form = commissionForm(this.data.commission);
  protected readonly waiting = signal(false);
  protected readonly failure = signal<ApiFailure | null>(null);

  protected async save(submitted: Event): Promise<void> {
    submitted.preventDefault();
    this.form.markAllAsTouched();
    if (this.form.invalid || this.waiting()) return;
    this.waiting.set(true);
    this.failure.set(null);
    try {
      await this.data.save(commissionIn(this.form));
      this.dialog.close();
    } catch (thrown) {
      this.failure.set(apiFailureOf(thrown));
    } finally {
      this.waiting.set(false);
    }
  }
}
