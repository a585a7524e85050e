import type { Commission, Stage } from '@shared/api/commission';
import { calendarDay, daysBetween, dayWords, pastDayWords } from './day-words';

export const STAGE_WORDS: Record<Stage, string> = {
  design: 'Design',
  'with-client': 'With the client',
  approved: 'Approved',
  cutting: 'Cutting',
  assembly: 'Assembly',
  delivered: 'Delivered',
};

const WOODS_NAMED = 3;

/** "32 × 9, white ash, black walnut and 2 more". */
export function shellWords(commission: Pick<Commission, 'staves' | 'courses' | 'woods'>): string {
  const { staves, courses, woods } = commission;
  const named = woods.slice(0, WOODS_NAMED).map((wood) => wood.toLowerCase());
  const rest = woods.length - named.length;
  const list = [`${staves} × ${courses}`, ...named].join(', ');
  return rest > 0 ? `${list} and ${rest} more` : list;
}

/** "14 March", or "no date". */
export function dueWords(due: string | null, now: Date): string {
  return due === null ? 'no date' : dayWords(calendarDay(due), now);
}

/** "3 days late" for what should have been delivered, else nothing. */
export function lateWords(commission: Pick<Commission, 'due' | 'stage'>, now: Date): string {
  if (commission.due === null || commission.stage === 'delivered') return '';
  const days = daysBetween(calendarDay(commission.due), now);
  if (days <= 0) return '';
  return days === 1 ? '1 day late' : `${days} days late`;
}

/** "7 · yesterday, Ines", or "none yet". */
export function versionWords(version: Commission['lastVersion'], now: Date): string {
  if (version === null) return 'none yet';
  const firstName = version.keptBy.split(' ')[0] ?? version.keptBy;
  return `${version.number} · ${pastDayWords(new Date(version.keptAt), now)}, ${firstName}`;
}
