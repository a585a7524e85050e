import type { Whereabouts } from '@shared/api/live';
import type { CheckResult, CheckStation } from '@shared/checks/check';

/** A place in the open layout, in the order of the work. */
export interface Station {
  readonly path: Whereabouts['station'];
  readonly name: string;
  /** Whose checks its lamp shows: its own, all of them, or none. */
  readonly lamp: CheckStation | 'all' | null;
}

export const STATIONS: readonly Station[] = [
  { path: 'shell', name: 'Shell', lamp: 'shell' },
  { path: 'joint', name: 'Joint', lamp: 'joint' },
  { path: 'pattern', name: 'Pattern', lamp: 'pattern' },
  { path: 'cutting', name: 'Cutting', lamp: 'all' },
  { path: 'review', name: 'Review', lamp: null },
];

/** The checks a station's lamp stands for. */
export function checksOf(station: Station, checks: readonly CheckResult[]): readonly CheckResult[] {
  if (station.lamp === null) return [];
  return station.lamp === 'all' ? checks : checks.filter((check) => check.station === station.lamp);
}
