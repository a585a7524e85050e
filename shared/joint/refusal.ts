import { formatAngle, formatLength, lengthDecimals } from '../units/format';
import { fromMillimetres, toMillimetres, type LengthUnit, type Millimetres } from '../units/length';

/** What a bound leaves of a neck or a head: less is no wood any more, and no drawing shows it. */
export const LEAST_WOOD: Millimetres = 0.01;

/** Rounding that a bound forgives: a parameter typed at its bound must be accepted. */
export const SLACK: Millimetres = 1e-9;

/** A parameter that cannot be built, with the bound it breaks. At the bound itself it can be built. */
export interface Refusal {
  /** The parameter's name, as in the layout file: "reach", "filletRadius"… */
  readonly field: string;
  readonly limit: 'least' | 'most';
  readonly value: number;
  readonly measure: 'length' | 'angle';
  /** Why the bound is there, as the end of a sentence. */
  readonly because: string;
}

/**
 * The refusal as a sentence without the field's name: "must be at most 9.20 mm: beyond it the neck closes".
 * The bound is rounded to its own side, so that the figure a reader copies is not refused again.
 */
export function refusalSentence(refusal: Refusal, unit: LengthUnit): string {
  return `must be at ${refusal.limit} ${printedBound(refusal, unit)}: ${refusal.because}`;
}

function printedBound({ limit, value, measure }: Refusal, unit: LengthUnit): string {
  if (measure === 'angle') return formatAngle(roundedWithin(value, limit, 2));
  const figure = roundedWithin(fromMillimetres(value, unit), limit, lengthDecimals(unit));
  return formatLength(toMillimetres(figure, unit), unit);
}

function roundedWithin(value: number, limit: Refusal['limit'], decimals: number): number {
  const steps = value * 10 ** decimals;
  // a bound of exactly 9.20 is 9.199999…: a millionth of a step is rounding, not geometry
  return (limit === 'most' ? Math.floor(steps + 1e-6) : Math.ceil(steps - 1e-6)) / 10 ** decimals;
}
