import { describe, expect, it } from 'vitest';
import { inSentence, stepWords, tilesWords, timesWords } from './sentence-words';

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

  it('write a wood small inside a sentence, but not initials', () => {
    expect(inSentence('Black walnut')).toBe('black walnut');
    expect(inSentence('MDF')).toBe('MDF');
    expect(inSentence('Érable')).toBe('érable');
  });
});
