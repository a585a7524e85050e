import { MILLIMETRES_PER_INCH, type LengthUnit, type Millimetres } from '@shared/units/length';

/** Tiny excess that is only floating point must not round up to another centimetre. */
const EXCESS = 1e-6;

/**
 * How boards are bought: metres to a centimetre, or feet to a tenth; always rounded up, since a board
 * that is a hair short is short.
 */
export function formatBoardLength(length: Millimetres, unit: LengthUnit): string {
  if (unit === 'mm') return `${(Math.ceil(length / 10 - EXCESS) / 100).toFixed(2)} m`;
  const feet = length / (12 * MILLIMETRES_PER_INCH);
  return `${(Math.ceil(feet * 10 - EXCESS) / 10).toFixed(1)} ft`;
}
