/** Words of the sentence bar and of what is spoken, in one place so that both say the same. */
import type { Grid } from '@shared/layout/cells';
import type { Extent } from '@shared/layout/extent';
import type { AtTheEnd, Mirror } from '@shared/layout/repeats';

export { inSentence } from '@shared/layout/wood-name';

export const EXTENT_WORDS: Record<Extent, string> = {
  tile: 'one tile',
  course: 'a course',
  stave: 'a stave',
  patch: 'a patch',
  wood: 'every tile of a wood',
  connected: 'connected tiles of a wood',
};

export const VERBS = ['lay', 'copy', 'lay-copy'] as const;
/** What the next touch does. */
export type Verb = (typeof VERBS)[number];

export const VERB_WORDS: Record<Verb, string> = {
  lay: 'Lay',
  copy: 'Copy',
  'lay-copy': 'Lay the copy',
};

export const COPY_EXTENTS = ['patch', 'course', 'stave', 'whole'] as const;
/** What can be copied: every one a rectangle. */
export type CopyExtent = (typeof COPY_EXTENTS)[number];

export const COPY_WORDS: Record<CopyExtent, string> = {
  patch: 'a patch',
  course: 'a course',
  stave: 'a stave',
  whole: 'the whole pattern',
};

export const MIRROR_WORDS: Record<Mirror, string> = {
  none: 'not mirrored',
  'at-seam': 'mirrored left-right',
  'at-mid-height': 'mirrored up-down',
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

/** "stopping at the top", "wrapping to the bottom"; the other way round for repeats that step down. */
export function atTheEndWords(atTheEnd: AtTheEnd, step: number): string {
  const [end, other] = step < 0 ? ['bottom', 'top'] : ['top', 'bottom'];
  return atTheEnd === 'stop' ? `stopping at the ${end}` : `wrapping to the ${other}`;
}

/** "3 × 2 tiles": staves first. */
export function sizeWords({ staves, courses }: Grid): string {
  return staves * courses === 1 ? '1 tile' : `${staves} × ${courses} tiles`;
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
