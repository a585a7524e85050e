import { describe, expect, it } from 'vitest';
import { carryWords, sizeWords } from './carry-words';

describe('what carrying a pattern over does', () => {
  const from = { staves: 32, courses: 9 };

  it('names the wood new tiles are laid in when the shell grows', () => {
    expect(carryWords('keep', from, { staves: 36, courses: 9 }, 'White ash').says).toBe(
      'Every tile stays where it is. New tiles are laid in white ash.',
    );
  });

  it('says that tiles go when the shell shrinks', () => {
    expect(carryWords('keep', from, { staves: 24, courses: 12 }, 'MDF').says).toBe(
      'Every tile stays where it is. Tiles beyond the new size go. New tiles are laid in MDF.',
    );
  });

  it('counts one course as one', () => {
    expect(sizeWords({ staves: 8, courses: 1 })).toBe('8 staves × 1 course');
  });
});
