/** Words of the sentence bar and of what is spoken, in one place so that both say the same. */
import type { Extent } from '@shared/layout/extent';
import type { Mirror } from '@shared/layout/repeats';

export { inSentence } from '@shared/layout/wood-name';

export const EXTENT_WORDS: Record<Extent, string> = {
  tile: 'one tile',
  course: 'a course',
  stave: 'a stave',
};

export const MIRROR_WORDS: Record<Mirror, string> = {
  none: 'not mirrored',
  'at-seam': 'mirrored at the seam',
  'at-mid-height': 'mirrored at mid-height',
  both: 'mirrored both ways',
};

/** Courses from one repeat to the next that are offered. */
export const STEPS = [-4, -3, -2, -1, 0, 1, 2, 3, 4] as const;

/** "not repeated", "8 times round". */
export function timesWords(times: number): string {
  return times === 1 ? 'not repeated' : `${times} times round`;
}

/** "on the same course", "1 course up", "2 courses down". */
export function stepWords(step: number): string {
  if (step === 0) return 'on the same course';
  const count = Math.abs(step);
  return `${count} ${count === 1 ? 'course' : 'courses'} ${step > 0 ? 'up' : 'down'}`;
}

/** "1 tile", "150 tiles", "12 305 tiles". */
export function tilesWords(count: number): string {
  return counted(count, 'tile');
}

/** A count with its noun; thousands apart by a narrow space that does not break. */
export function counted(count: number, noun: string): string {
  const figure = count.toLocaleString('en').replaceAll(',', '\u202f');
  return `${figure} ${noun}${count === 1 ? '' : 's'}`;
}
