import { describe, expect, it } from 'vitest';
import { dueWords, lateWords, shellWords, versionWords } from './commission-words';
import { commissionWith } from './commission.fixture';

const NOW = new Date(2027, 2, 17, 12);

describe('a commission in words', () => {
  it('names its size and its first woods', () => {
    expect(shellWords(commissionWith())).toBe('32 × 9, white ash, black walnut');
    expect(shellWords(commissionWith({ woods: ['Ash', 'Oak', 'Elm', 'Yew', 'Box'] }))).toBe(
      '32 × 9, ash, oak, elm and 2 more',
    );
  });

  it('one that is due in the past is late until it is delivered', () => {
    expect(lateWords(commissionWith(), NOW)).toBe('3 days late');
    expect(lateWords(commissionWith({ stage: 'delivered' }), NOW)).toBe('');
    expect(lateWords(commissionWith({ due: '2027-03-17' }), NOW)).toBe('');
    expect(dueWords(null, NOW)).toBe('no date');
  });

  it('says who kept the last version and when', () => {
    const keptAt = new Date(2027, 2, 16, 15).toISOString();
    expect(versionWords({ number: 7, keptAt, keptBy: 'Ines Marlow' }, NOW)).toBe(
      '7 · yesterday, Ines',
    );
    expect(versionWords(null, NOW)).toBe('none yet');
  });
});
