import { Component, computed, effect, input, output, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule, type ValidationErrors } from '@angular/forms';
import type { ErrorStateMatcher } from '@angular/material/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { formatLength } from '@shared/units/format';
import type { LengthUnit, Millimetres } from '@shared/units/length';
import { LengthInput } from './length-input';

/**
 * A labelled field for one length. `changed` gives millimetres, and only values that are a length within
 * the bounds; everything else is answered in the field with a sentence. `problem` is a sentence from
 * outside (a joint that does not close) and marks the field too.
 */
@Component({
  selector: 'sl-length-field',
  imports: [LengthInput, MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <mat-form-field>
      <mat-label>{{ label() }}</mat-label>
      <input
        matInput
        slLength
        [lengthUnit]="lengthUnit()"
        [fineness]="fineness()"
        [formControl]="control"
        [errorStateMatcher]="atOnce"
      />
      <span matTextSuffix class="unit">{{ unitWords() }}</span>
      @if (hint() !== '') {
        <mat-hint>{{ hint() }}</mat-hint>
      }
      <mat-error>{{ control.getError('length') ?? control.getError('problem') }}</mat-error>
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
      white-space: nowrap;
    }
  `,
})
export class LengthField {
  readonly label = input.required<string>();
  readonly lengthUnit = input.required<LengthUnit>();
  readonly value = input.required<Millimetres>();
  /** Bounds, inclusive, in millimetres. */
  readonly least = input<Millimetres>(0);
  readonly most = input<Millimetres>(Number.MAX_VALUE);
  readonly hint = input('');
  /** What the figure measures, shown after the unit, such as "⌀". */
  readonly measure = input('');
  readonly fineness = input<'length' | 'cutter'>('length');
  readonly problem = input<string | null>(null);
  readonly access = input<'open' | 'locked'>('open');
  readonly changed = output<Millimetres>();

  protected readonly control: FormControl<Millimetres | null> = new FormControl(null, (control) =>
    this.refuse(control.value as Millimetres | null),
  );
  protected readonly unitWords = computed(() => `${this.lengthUnit()} ${this.measure()}`.trim());
  /** A figure that cannot be is said while it is typed: the drawing beside it no longer follows. */
  protected readonly atOnce: ErrorStateMatcher = {
    isErrorState: (control) => control?.invalid ?? false,
  };

  constructor() {
    effect(() => this.take(this.value()));
    effect(() => {
      this.problem();
      untracked(() => this.control.updateValueAndValidity({ emitEvent: false }));
    });
    effect(() => {
      if (this.access() === 'locked') this.control.disable({ emitEvent: false });
      else this.control.enable({ emitEvent: false });
    });
    this.control.valueChanges.pipe(takeUntilDestroyed()).subscribe((value) => {
      if (value !== null && this.boundsBroken(value) === null) this.changed.emit(value);
    });
  }

  /** Follows the document, except where the field already holds that value. */
  private take(value: Millimetres): void {
    if (this.control.value !== value) this.control.setValue(value, { emitEvent: false });
  }

  private refuse(value: Millimetres | null): ValidationErrors | null {
    if (value === null) return null;
    const bounds = this.boundsBroken(value);
    if (bounds !== null) return { problem: bounds };
    const problem = untracked(this.problem);
    return problem === null ? null : { problem };
  }

  private boundsBroken(value: Millimetres): string | null {
    const unit = untracked(this.lengthUnit);
    const least = untracked(this.least);
    const most = untracked(this.most);
    if (value < least) return `Must be at least ${formatLength(least, unit)}.`;
    if (value > most) return `Must be at most ${formatLength(most, unit)}.`;
    return null;
  }
}
