/** How a starting pattern meets itself, in sentences. */
import { periodOf, type StartingPattern } from '@shared/layout/starting-patterns/starting-pattern';
import type { PatternLaid } from './pattern-laying';

export const KIND_WORDS: Record<StartingPattern['kind'], string> = {
  checker: 'Checker',
  bands: 'Bands',
  helix: 'Helix',
  diamonds: 'Diamonds',
  zigzag: 'Zigzag',
  scatter: 'Scatter',
};

/** What is true of the seam: how the pattern meets itself there, or why it does not. */
export function seamSentence({ pattern, grid, laid }: PatternLaid): string {
  if (!laid.meets) return laid.reason;
  if (pattern.kind === 'bands') return 'The bands run level all round: they meet at the seam.';
  if (pattern.kind === 'scatter') {
    return 'The scatter takes no notice of the seam: it is as even across it as anywhere.';
  }
  const strands =
    pattern.kind === 'helix' ? strandWords(pattern.lead / periodOf(pattern.stripes)) : '';
  const again =
    laid.period === grid.staves
      ? 'once round the shell'
      : `the same again every ${laid.period} ${laid.period === 1 ? 'stave' : 'staves'}`;
  return `It meets at the seam: ${strands}${again}.`;
}

function strandWords(strands: number): string {
  return strands === 1 ? '1 strand, ' : `${strands} strands side by side, `;
}

/** A value that meets, on its button. */
export function offerWords(pattern: StartingPattern, offer: number): string {
  if (pattern.kind !== 'helix') return `${offer} ${offer === 1 ? 'stave' : 'staves'}`;
  return `${offer} ${offer === 1 ? 'course' : 'courses'} a turn`;
}

/** The pattern with an offered value. */
export function withOffer(pattern: StartingPattern, offer: number): StartingPattern {
  switch (pattern.kind) {
    case 'helix':
      return { ...pattern, lead: offer };
    case 'checker':
    case 'diamonds':
    case 'zigzag':
      return { ...pattern, staves: offer };
    case 'bands':
    case 'scatter':
      return pattern;
  }
}
