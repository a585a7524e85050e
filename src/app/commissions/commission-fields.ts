import { Component, input } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { newCommissionSchema, type Commission } from '@shared/api/commission';
import { matches, matchesIfGiven } from '../platform/schema-validator';

/** Title, client and due date as text; empty for none. */
export type CommissionForm = FormGroup<{
  title: FormControl<string>;
  client: FormControl<string>;
  due: FormControl<string>;
}>;

const { title, client, due } = newCommissionSchema.shape;

/** The form, filled with what a commission says already. */
export function commissionForm(
  commission: Pick<Commission, 'title' | 'client' | 'due'>,
): CommissionForm {
  const nonNullable = true;
  return new FormGroup({
    title: new FormControl(commission.title, {
      nonNullable,
      validators: matches(title, 'The title'),
    }),
    client: new FormControl(commission.client ?? '', {
      nonNullable,
      validators: matchesIfGiven(client, 'The client'),
    }),
    due: new FormControl(commission.due ?? '', {
      nonNullable,
      validators: matchesIfGiven(due, 'The date'),
    }),
  });
}

/** What the form holds, as the API takes it. */
export function commissionIn(form: CommissionForm): Pick<Commission, 'title' | 'client' | 'due'> {
  const value = form.getRawValue();
  return {
    title: value.title.trim(),
    client: value.client.trim() || null,
    due: value.due || null,
  };
}

/** The three fields that every commission has. */
@Component({
  selector: 'sl-commission-fields',
  imports: [MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <ng-container [formGroup]="form()">
      <mat-form-field hideRequiredMarker class="whole">
        <mat-label>Title</mat-label>
        <input matInput formControlName="title" autocomplete="off" required cdkFocusInitial />
        <mat-error>{{ form().controls.title.getError('schema') }}</mat-error>
      </mat-form-field>
      <mat-form-field>
        <mat-label>Client</mat-label>
        <input matInput formControlName="client" autocomplete="off" />
        <mat-hint>empty: for the workshop itself</mat-hint>
        <mat-error>{{ form().controls.client.getError('schema') }}</mat-error>
      </mat-form-field>
      <mat-form-field>
        <mat-label>Due</mat-label>
        <input matInput type="date" formControlName="due" />
        <mat-hint>may stay empty</mat-hint>
        <mat-error>{{ form().controls.due.getError('schema') }}</mat-error>
      </mat-form-field>
    </ng-container>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: 1fr 1fr;
      gap: 16px;
      padding-top: 8px;
    }
    .whole {
      grid-column: 1 / -1;
    }
    @media (max-width: 599px) {
      :host {
        grid-template-columns: 1fr;
      }
    }
  `,
})
export class CommissionFields {
  readonly form = input.required<CommissionForm>();
}
