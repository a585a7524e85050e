import { Pipe, type PipeTransform } from '@angular/core';
import { formatLength } from '@shared/units/format';
import type { LengthUnit, Millimetres } from '@shared/units/length';

/** `{{ 28 | length: 'mm' }}` → "28.00 mm"; inches to 0.001. */
@Pipe({ name: 'length' })
export class LengthPipe implements PipeTransform {
  transform(length: Millimetres, unit: LengthUnit): string {
    return formatLength(length, unit);
  }
}
