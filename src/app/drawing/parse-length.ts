import { toMillimetres, type LengthUnit, type Millimetres } from '@shared/units/length';

export type ParsedLength =
  | { readonly ok: true; readonly millimetres: Millimetres }
  | { readonly ok: false; readonly message: string };

const DECIMAL = /^[−-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)$/;
const FRACTION = /^(?:(\d+)\s+)?(\d+)\s*\/\s*(\d+)$/;
const WITH_UNIT = /^(.*?)\s*(mm|cm|in|inch|inches|"|″)$/i;

/**
 * The length a person typed, in millimetres. Takes a point or a comma, a fraction such as "1 1/8", and
 * a unit of its own ("3 mm" in an inch field); without one the figure is in the reader's unit.
 */
export function parseLength(text: string, unit: LengthUnit): ParsedLength {
  const trimmed = text.trim();
  if (trimmed === '') return { ok: false, message: 'Enter a length.' };
  const withUnit = WITH_UNIT.exec(trimmed);
  const figure = figureOf(withUnit?.[1] ?? trimmed);
  if (figure === null) {
    const example = unit === 'in' ? '1.102 or 1 1/8' : '28.00';
    return {
      ok: false,
      message: `“${shortened(trimmed)}” is not a length. Write it like ${example}.`,
    };
  }
  return { ok: true, millimetres: inMillimetres(figure, withUnit?.[2]?.toLowerCase(), unit) };
}

function figureOf(text: string): number | null {
  const trimmed = text.trim();
  if (DECIMAL.test(trimmed)) return Number(trimmed.replace('−', '-').replace(',', '.'));
  const fraction = FRACTION.exec(trimmed);
  if (fraction === null || Number(fraction[3]) === 0) return null;
  return Number(fraction[1] ?? 0) + Number(fraction[2]) / Number(fraction[3]);
}

function inMillimetres(figure: number, written: string | undefined, unit: LengthUnit): Millimetres {
  if (written === undefined) return toMillimetres(figure, unit);
  if (written === 'mm') return figure;
  if (written === 'cm') return figure * 10;
  return toMillimetres(figure, 'in');
}

function shortened(text: string): string {
  return text.length > 24 ? `${text.slice(0, 24)}…` : text;
}
