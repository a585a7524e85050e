import { Component, effect, input, output, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule, type ValidationErrors } from '@angular/forms';
import type { ErrorStateMatcher } from '@angular/material/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { Degrees } from '@shared/units/angle';

/** A labelled field for one angle in degrees; emits only angles within the bounds. */
@Component({
  selector: 'sl-angle-field',
  imports: [MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <mat-form-field>
      <mat-label>{{ label() }}</mat-label>
      <input
        matInput
        type="text"
        inputmode="decimal"
        autocomplete="off"
        [formControl]="control"
        [errorStateMatcher]="atOnce"
      />
      <span matTextSuffix class="unit">°</span>
      <mat-error>{{ control.getError('angle') }}</mat-error>
    </mat-form-field>
  `,
  styles: `
    :host,
    mat-form-field {
      display: block;
      width: 100%;
    }
    .unit {
      padding-left: 6px;
      color: var(--mute);
      font-weight: 600;
    }
  `,
})
export class AngleField {
  readonly label = input.required<string>();
  readonly value = input.required<Degrees>();
  /** Bounds, inclusive. */
  readonly least = input<Degrees>(0);
  readonly most = input<Degrees>(360);
  readonly problem = input<string | null>(null);
  readonly access = input<'open' | 'locked'>('open');
  readonly changed = output<Degrees>();

  protected readonly control = new FormControl('', {
    nonNullable: true,
    validators: (control): ValidationErrors | null => {
      const parsed = this.parse(control.value as string);
      const sentence = typeof parsed === 'string' ? parsed : untracked(this.problem);
      return sentence === null ? null : { angle: sentence };
    },
  });
  protected readonly atOnce: ErrorStateMatcher = {
    isErrorState: (control) => control?.invalid ?? false,
  };

  constructor() {
    effect(() => {
      const value = this.value();
      if (this.parse(this.control.value) === value) return;
      this.control.setValue(String(Number(value.toFixed(2))), { emitEvent: false });
    });
    effect(() => {
      this.problem();
      untracked(() => this.control.updateValueAndValidity({ emitEvent: false }));
    });
    effect(() => {
      if (this.access() === 'locked') this.control.disable({ emitEvent: false });
      else this.control.enable({ emitEvent: false });
    });
    this.control.valueChanges.pipe(takeUntilDestroyed()).subscribe((text) => {
      const parsed = this.parse(text);
      if (typeof parsed === 'number') this.changed.emit(parsed);
    });
  }

  /** The angle, or the sentence that says what it must be. */
  private parse(text: string): Degrees | string {
    const [least, most] = [untracked(this.least), untracked(this.most)];
    const figure = text.trim().replace(',', '.').replace(/°$/, '');
    const angle = /^\d+(?:\.\d*)?$|^\.\d+$/.test(figure) ? Number(figure) : NaN;
    if (angle >= least && angle <= most) return angle;
    return `Must be an angle from ${least}° to ${most}°.`;
  }
}
