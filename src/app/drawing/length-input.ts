import { Directive, effect, ElementRef, forwardRef, inject, input } from '@angular/core';
import {
  NG_VALIDATORS,
  NG_VALUE_ACCESSOR,
  type ControlValueAccessor,
  type ValidationErrors,
  type Validator,
} from '@angular/forms';
import { formatCutterFigure, formatLengthFigure } from '@shared/units/format';
import type { LengthUnit, Millimetres } from '@shared/units/length';
import { parseLength } from './parse-length';

/**
 * Makes a text input hold a length. The control's value is in millimetres (null while what is typed is
 * not a length); the text is in the reader's unit. A value that is only shown is never rounded: it
 * changes when somebody types, not when it is formatted. Errors: `{ length: sentence }`.
 *
 *     <input matInput slLength [lengthUnit]="unit()" [formControl]="tileWidth" />
 */
@Directive({
  selector: 'input[slLength]',
  host: {
    type: 'text',
    inputmode: 'decimal',
    autocomplete: 'off',
    '(input)': 'typed()',
    '(blur)': 'left()',
  },
  providers: [
    { provide: NG_VALUE_ACCESSOR, useExisting: forwardRef(() => LengthInput), multi: true },
    { provide: NG_VALIDATORS, useExisting: forwardRef(() => LengthInput), multi: true },
  ],
})
export class LengthInput implements ControlValueAccessor, Validator {
  /** The unit the reader wants to see. */
  readonly lengthUnit = input.required<LengthUnit>();
  /** How fine the figure is shown: cutters have a third decimal where they need it. */
  readonly fineness = input<'length' | 'cutter'>('length');

  private readonly element = inject<ElementRef<HTMLInputElement>>(ElementRef).nativeElement;
  /** The exact value behind the text. */
  private held: Millimetres | null = null;
  private sentence: string | null = null;
  private changed: (value: Millimetres | null) => void = () => undefined;
  private touched: () => void = () => undefined;

  readonly setDisabledState: NonNullable<ControlValueAccessor['setDisabledState']> = (disabled) => {
    this.element.disabled = disabled;
  };

  constructor() {
    effect(() => this.show(this.lengthUnit()));
  }

  writeValue(value: Millimetres | null): void {
    this.sentence = null;
    this.held = value;
    this.show(this.lengthUnit());
  }

  registerOnChange(changed: (value: Millimetres | null) => void): void {
    this.changed = changed;
  }

  registerOnTouched(touched: () => void): void {
    this.touched = touched;
  }

  validate(): ValidationErrors | null {
    return this.sentence === null ? null : { length: this.sentence };
  }

  protected typed(): void {
    const parsed = parseLength(this.element.value, this.lengthUnit());
    this.sentence = parsed.ok ? null : parsed.message;
    this.held = parsed.ok ? parsed.millimetres : null;
    this.changed(this.held);
  }

  /** Tidies the text; what is not a length stays as it was typed, so that it can be mended. */
  protected left(): void {
    if (this.held !== null) this.show(this.lengthUnit());
    this.touched();
  }

  private show(unit: LengthUnit): void {
    if (this.sentence !== null) return;
    const figure = this.fineness() === 'cutter' ? formatCutterFigure : formatLengthFigure;
    this.element.value = this.held === null ? '' : figure(this.held, unit);
  }
}
