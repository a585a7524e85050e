import type { LengthUnit } from '../units/length';

/** The three results a check can have, from best to worst. */
export const RESULTS = ['clear', 'caution', 'stop'] as const;
export type CheckOutcome = (typeof RESULTS)[number];

export const CHECK_KEYS = [
  'inside-radius',
  'reach-in',
  'flute',
  'undercut',
  'web',
  'neck',
  'board',
  'trim',
  'seam',
  'closing',
  'contrast',
] as const;
export type CheckKey = (typeof CHECK_KEYS)[number];

/** The station where what a check finds is mended. */
export type CheckStation = 'shell' | 'joint' | 'pattern';

/** A measured value: lengths in millimetres, angles in degrees, counts plain, differences of colour in ΔE00. */
export interface Measure {
  readonly value: number;
  readonly kind: 'length' | 'angle' | 'count' | 'colour-difference';
}

/** What a check found, in sentences that carry figures in the reader's unit. */
export interface CheckResult {
  readonly key: CheckKey;
  readonly result: CheckOutcome;
  readonly station: CheckStation;
  /** Its name on the screen and in the worksheet, e.g. "Tightest inside radius". */
  readonly title: string;
  /** What was found, or null where there is nothing to measure. */
  readonly figure: Measure | null;
  /** What it is held against, or null. */
  readonly limit: Measure | null;
  /** One sentence: what was found, with its figures. */
  readonly finding: string;
  /** Why it matters. */
  readonly reason: string;
  /** What to change; empty when clear. */
  readonly remedy: string;
}

export interface CheckSettings {
  /** The reader's unit; the layout's own when left out. */
  readonly lengthUnit?: LengthUnit;
  /** How far above the cutter's radius an inside radius should be, as a share. */
  readonly finishingMargin?: number;
  /** Least wood between sockets, mm. */
  readonly webMinimum?: number;
}

/** Common practice, no source: a path at exactly the cutter's radius dwells in the corner, so 5–10 % more. */
export const FINISHING_MARGIN = 0.08;

/** Common practice, no source. */
export const WEB_MINIMUM_MM = 2.5;

/** The worst of some outcomes; "clear" when there are none. */
export function worstOf(results: readonly { readonly result: CheckOutcome }[]): CheckOutcome {
  return results.reduce<CheckOutcome>(
    (worst, { result }) => (RESULTS.indexOf(result) > RESULTS.indexOf(worst) ? result : worst),
    'clear',
  );
}
