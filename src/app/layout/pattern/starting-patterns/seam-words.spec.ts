import { describe, expect, it } from 'vitest';
import { layStartingPattern } from '@shared/layout/starting-patterns/lay-pattern';
import type { StartingPattern } from '@shared/layout/starting-patterns/starting-pattern';
import { offerWords, seamSentence, withOffer } from './seam-words';

const grid = { staves: 32, courses: 9 };
const stripes = [
  { wood: 0, width: 3 },
  { wood: 1, width: 1 },
];
const helix = { kind: 'helix', stripes, lead: 9, hand: 'right' } as const;

function said(pattern: StartingPattern): string {
  return seamSentence({ pattern, grid, laid: layStartingPattern(pattern, grid) });
}

describe('what is said of the seam', () => {
  it('counts the strands of a helix that meets', () => {
    expect(said({ ...helix, lead: 8 })).toBe(
      'It meets at the seam: 2 strands side by side, the same again every 16 staves.',
    );
    expect(said({ ...helix, lead: 4 })).toBe(
      'It meets at the seam: 1 strand, once round the shell.',
    );
  });

  it('says why a helix does not meet', () => {
    expect(said(helix)).toBe(
      'A lead of 9 courses a turn does not meet at the seam: the stripes repeat every 4 courses.',
    );
  });

  it('says that bands and scatters always meet', () => {
    expect(said({ kind: 'bands', stripes })).toMatch(/level all round/);
    expect(said({ kind: 'scatter', shares: [{ wood: 0, share: 1 }], seed: 1 })).toMatch(/even/);
  });
});

it('an offer taken makes the pattern meet', () => {
  const laid = layStartingPattern(helix, grid);
  const offers = laid.meets ? [] : laid.offers;
  expect(offerWords(helix, offers[0] ?? 0)).toBe('8 courses a turn');
  expect(layStartingPattern(withOffer(helix, offers[0] ?? 0), grid).meets).toBe(true);
  const diamonds = {
    kind: 'diamonds',
    ground: 0,
    diamond: 1,
    staves: 7,
    courses: 7,
    drawn: 'filled',
  } as const;
  expect(offerWords(diamonds, 8)).toBe('8 staves');
  expect(layStartingPattern(withOffer(diamonds, 8), grid).meets).toBe(true);
});
