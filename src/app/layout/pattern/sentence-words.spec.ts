import { describe, expect, it } from 'vitest';
import {
  atTheEndWords,
  inSentence,
  sizeWords,
  stepWords,
  tilesWords,
  timesWords,
} from './sentence-words';

describe('the words of the sentence', () => {
  it('count in plain English', () => {
    expect([timesWords(1), timesWords(8)]).toEqual(['not repeated', '8 times round']);
    expect([stepWords(0), stepWords(1), stepWords(-2)]).toEqual([
      'on the same course',
      '1 course up',
      '2 courses down',
    ]);
    expect([tilesWords(1), tilesWords(0)]).toEqual(['1 tile', '0 tiles']);
    expect(tilesWords(12_305)).toBe('12\u202f305 tiles');
  });

  it('name the end that repeats step over', () => {
    expect(atTheEndWords('stop', 2)).toBe('stopping at the top');
    expect(atTheEndWords('wrap', 2)).toBe('wrapping to the bottom');
    expect(atTheEndWords('stop', -1)).toBe('stopping at the bottom');
    expect(atTheEndWords('wrap', -1)).toBe('wrapping to the top');
    expect(sizeWords({ staves: 3, courses: 2 })).toBe('3 × 2 tiles');
    expect(sizeWords({ staves: 1, courses: 1 })).toBe('1 tile');
  });

  it('write a wood small inside a sentence, but not initials', () => {
    expect(inSentence('Black walnut')).toBe('black walnut');
    expect(inSentence('MDF')).toBe('MDF');
    expect(inSentence('Érable')).toBe('érable');
  });
});
