/** How figures are printed: inches to 0.001, millimetres to 0.01, angles to 0.01°, shares in percent. */
import type { Degrees } from './angle';
import { fromMillimetres, type LengthUnit, type Millimetres } from './length';

/** Decimals shown for a length in this unit. */
export function lengthDecimals(unit: LengthUnit): number {
  return unit === 'in' ? 3 : 2;
}

/** The figure alone, e.g. "28.00" or "1.102". */
export function formatLengthFigure(length: Millimetres, unit: LengthUnit): string {
  return withoutNegativeZero(fromMillimetres(length, unit).toFixed(lengthDecimals(unit)));
}

/** The figure with its unit, e.g. "28.00 mm" or "1.102 in". */
export function formatLength(length: Millimetres, unit: LengthUnit): string {
  return `${formatLengthFigure(length, unit)} ${unit}`;
}

/** A cutter's size: up to a third decimal in millimetres, since 1/8 in is 3.175 mm; inches with three. */
export function formatCutterFigure(diameter: Millimetres, unit: LengthUnit): string {
  const figure = fromMillimetres(diameter, unit).toFixed(3);
  return unit === 'mm' ? figure.replace(/0$/, '') : figure;
}

/** The angle with its sign, e.g. "5.63°". */
export function formatAngle(angle: Degrees): string {
  return `${withoutNegativeZero(angle.toFixed(2))}°`;
}

/** A share of one as whole percent, e.g. "8 %". */
export function formatShare(share: number): string {
  return `${Math.round(share * 100)} %`;
}

function withoutNegativeZero(figure: string): string {
  return /^-0(\.0*)?$/.test(figure) ? figure.slice(1) : figure;
}
