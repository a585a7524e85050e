/**
 * Starting patterns: whole patterns laid by name and painted over afterwards. Each is a rule from stave and
 * course to wood, so it is laid in one pass; each either meets itself at the seam or says why it cannot and
 * which values would.
 */
import { cellAt, type Grid } from '../cells';

/** A wood and how wide its stripe is, in courses or staves. */
export interface Stripe {
  readonly wood: number;
  readonly width: number;
}

export interface Checker {
  readonly kind: 'checker';
  readonly woods: readonly number[];
  /** Size of one field of the board, in staves and courses. */
  readonly staves: number;
  readonly courses: number;
}

export interface Bands {
  readonly kind: 'bands';
  readonly stripes: readonly Stripe[];
}

export const HANDS = ['right', 'left'] as const;
export type Hand = (typeof HANDS)[number];

export interface Helix {
  readonly kind: 'helix';
  readonly stripes: readonly Stripe[];
  /** Courses climbed in one turn. */
  readonly lead: number;
  /** Which way it climbs, as seen from outside. */
  readonly hand: Hand;
}

export interface Diamonds {
  readonly kind: 'diamonds';
  readonly ground: number;
  readonly diamond: number;
  /** Size of one diamond, in staves and courses. */
  readonly staves: number;
  readonly courses: number;
  readonly drawn: 'filled' | 'outline';
}

export interface Zigzag {
  readonly kind: 'zigzag';
  readonly stripes: readonly Stripe[];
  /** Staves from one crest to the next. */
  readonly staves: number;
  /** Courses from trough to crest. */
  readonly rise: number;
}

export interface Scatter {
  readonly kind: 'scatter';
  /** Share of each wood; they are taken relative to their sum. */
  readonly shares: readonly { readonly wood: number; readonly share: number }[];
  /** Another whole number, another scatter. */
  readonly seed: number;
}

export type StartingPattern = Checker | Bands | Helix | Diamonds | Zigzag | Scatter;

export const PATTERN_KINDS = [
  'checker',
  'bands',
  'helix',
  'diamonds',
  'zigzag',
  'scatter',
] as const satisfies readonly StartingPattern['kind'][];
export type PatternKind = (typeof PATTERN_KINDS)[number];

/** The pattern of a kind. */
export type PatternOf<K extends PatternKind> = Extract<StartingPattern, { readonly kind: K }>;

/** The laid cells, or why the pattern does not meet itself and the values of a field that would. */
export type LaidPattern =
  | {
      readonly meets: true;
      readonly cells: Uint8Array;
      /** Turned by this many staves the pattern is itself again; divides the staves. */
      readonly period: number;
    }
  | {
      readonly meets: false;
      readonly cells: Uint8Array;
      readonly field: 'staves' | 'lead';
      readonly reason: string;
      /** Values of the field that meet, nearest to the asked one first. */
      readonly offers: readonly number[];
    };

/** Cells filled by a rule from stave and course to wood. */
export function filled(grid: Grid, woodAt: (stave: number, course: number) => number): Uint8Array {
  const cells = new Uint8Array(grid.staves * grid.courses);
  for (let course = 0; course < grid.courses; course++) {
    for (let stave = 0; stave < grid.staves; stave++) {
      cells[cellAt(grid, stave, course)] = woodAt(stave, course);
    }
  }
  return cells;
}

/** The remainder that is never negative. */
export function modulo(value: number, period: number): number {
  return ((value % period) + period) % period;
}

/** Width of all stripes together. */
export function periodOf(stripes: readonly Stripe[]): number {
  return stripes.reduce((sum, stripe) => sum + stripe.width, 0);
}

/** The wood of the stripe that a whole position falls into. */
export function woodOfStripe(stripes: readonly Stripe[], position: number): number {
  let left = modulo(position, periodOf(stripes));
  for (const { wood, width } of stripes) {
    if (left < width) return wood;
    left -= width;
  }
  return stripes[0]?.wood ?? 0;
}

/** The greatest whole number that divides both. */
export function greatestDivisor(a: number, b: number): number {
  return b === 0 ? Math.abs(a) : greatestDivisor(b, a % b);
}

/** Whole numbers that divide another, ascending. */
export function divisorsOf(whole: number): number[] {
  return Array.from({ length: whole }, (_, i) => i + 1).filter((d) => whole % d === 0);
}

/** At most five values, nearest to the asked one first. */
export function nearestFirst(values: readonly number[], asked: number): number[] {
  return [...values].sort((a, b) => Math.abs(a - asked) - Math.abs(b - asked) || a - b).slice(0, 5);
}
