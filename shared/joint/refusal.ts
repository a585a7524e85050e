import { formatAngle, formatLength } from '../units/format';
import type { LengthUnit } from '../units/length';

/** A parameter that cannot be built, with the bound it breaks. */
export interface Refusal {
  /** The parameter's name, as in the layout file: "reach", "filletRadius"… */
  readonly field: string;
  readonly limit: 'least' | 'most';
  readonly value: number;
  readonly measure: 'length' | 'angle';
  /** Why the bound is there, as the end of a sentence. */
  readonly because: string;
}

/** The refusal as a sentence without the field's name: "must be at most 9.20 mm: beyond it the neck closes". */
export function refusalSentence(refusal: Refusal, unit: LengthUnit): string {
  const bound =
    refusal.measure === 'length' ? formatLength(refusal.value, unit) : formatAngle(refusal.value);
  return `must be at ${refusal.limit} ${bound}: ${refusal.because}`;
}
