import type { Wood } from '@shared/layout/schema';
import { figuresOf } from '../grain/wood-figure';
import { inSentence } from '../sentence-words';
import type { WordOption } from './word-choice';

/** The woods of a layout as the choices of a blue word, each with a piece of itself. */
export function woodOptions(woods: readonly Wood[]): WordOption<number>[] {
  const figures = figuresOf(woods);
  return woods.map(({ name, colour }, value) => {
    const figure = figures[value];
    return { value, words: inSentence(name), ...(figure && { wood: { colour, figure } }) };
  });
}
