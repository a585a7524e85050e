import type { Carry } from '@shared/layout/carry';
import type { Grid } from '@shared/layout/cells';
import { inSentence } from '@shared/layout/wood-name';

export interface CarryWords {
  readonly name: string;
  readonly says: string;
}

/** What a way of carrying the pattern over does to it, for this change of size. */
export function carryWords(carry: Carry, from: Grid, to: Grid, firstWood: string): CarryWords {
  switch (carry) {
    case 'keep':
      return { name: 'Keep what fits', says: keptWords(from, to, firstWood) };
    case 'repeat':
      return { name: 'Repeat it', says: 'The pattern goes on round the shell and upwards.' };
    case 'stretch':
      return {
        name: 'Stretch it',
        says: 'Every tile takes the wood of the nearest one: the whole picture stays.',
      };
  }
}

function keptWords(from: Grid, to: Grid, firstWood: string): string {
  const grows = to.staves > from.staves || to.courses > from.courses;
  const shrinks = to.staves < from.staves || to.courses < from.courses;
  const added = grows ? ` New tiles are laid in ${inSentence(firstWood)}.` : '';
  const cut = shrinks ? ' Tiles beyond the new size go.' : '';
  return `Every tile stays where it is.${cut}${added}`;
}

/** "36 staves × 9 courses". */
export function sizeWords({ staves, courses }: Grid): string {
  return `${staves} staves × ${courses} ${courses === 1 ? 'course' : 'courses'}`;
}
