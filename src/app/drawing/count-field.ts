import { Component, effect, input, output, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule, type ValidationErrors } from '@angular/forms';
import type { ErrorStateMatcher } from '@angular/material/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';

/**
 * A labelled field for a whole number. `typing` follows every key, `changed` comes when the field is left
 * or Enter is pressed: what cuts tiles off should not happen in the middle of a figure.
 */
@Component({
  selector: 'sl-count-field',
  imports: [MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <mat-form-field>
      <mat-label>{{ label() }}</mat-label>
      <input
        matInput
        type="text"
        inputmode="numeric"
        autocomplete="off"
        [formControl]="control"
        [errorStateMatcher]="atOnce"
        (change)="settle()"
      />
      <mat-error>{{ control.getError('count') }}</mat-error>
    </mat-form-field>
  `,
  styles: `
    :host,
    mat-form-field {
      display: block;
      width: 100%;
    }
  `,
})
export class CountField {
  readonly label = input.required<string>();
  readonly value = input.required<number>();
  /** Bounds, inclusive. */
  readonly least = input(0);
  readonly most = input(Number.MAX_SAFE_INTEGER);
  readonly access = input<'open' | 'locked'>('open');
  readonly typing = output<number>();
  readonly changed = output<number>();

  protected readonly control = new FormControl('', {
    nonNullable: true,
    validators: (control): ValidationErrors | null => {
      const parsed = this.parse(control.value as string);
      return typeof parsed === 'number' ? null : { count: parsed };
    },
  });
  protected readonly atOnce: ErrorStateMatcher = {
    isErrorState: (control) => control?.invalid ?? false,
  };

  constructor() {
    effect(() => {
      const value = String(this.value());
      if (this.parse(this.control.value) !== this.value()) {
        this.control.setValue(value, { emitEvent: false });
      }
    });
    effect(() => {
      if (this.access() === 'locked') this.control.disable({ emitEvent: false });
      else this.control.enable({ emitEvent: false });
    });
    this.control.valueChanges.pipe(takeUntilDestroyed()).subscribe((text) => {
      const parsed = this.parse(text);
      if (typeof parsed === 'number') this.typing.emit(parsed);
    });
  }

  protected settle(): void {
    const parsed = this.parse(this.control.value);
    if (typeof parsed === 'number') this.changed.emit(parsed);
  }

  /** The number, or the sentence that says what it must be. */
  private parse(text: string): number | string {
    const [least, most] = [untracked(this.least), untracked(this.most)];
    const figure = /^\d{1,6}$/.test(text.trim()) ? Number(text) : NaN;
    if (figure >= least && figure <= most) return figure;
    return `Must be a whole number from ${least} to ${most}.`;
  }
}
