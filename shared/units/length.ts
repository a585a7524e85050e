/** Lengths. Everything is kept and computed in millimetres; inches are only a way of showing them. */

/** A length in millimetres. */
export type Millimetres = number;

/** A point or a displacement in millimetres; x to the right, y up. */
export interface PointMm {
  readonly x: Millimetres;
  readonly y: Millimetres;
}

/** The unit a reader wants to see lengths in. */
export type LengthUnit = 'mm' | 'in';

/** One inch in millimetres, exactly (International Yard and Pound Agreement, 1959). */
export const MILLIMETRES_PER_INCH = 25.4;

/** The length in the reader's unit. */
export function fromMillimetres(length: Millimetres, unit: LengthUnit): number {
  return unit === 'in' ? length / MILLIMETRES_PER_INCH : length;
}

/** The length in millimetres of a figure given in the reader's unit. */
export function toMillimetres(figure: number, unit: LengthUnit): Millimetres {
  return unit === 'in' ? figure * MILLIMETRES_PER_INCH : figure;
}
