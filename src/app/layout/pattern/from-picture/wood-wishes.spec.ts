import type { Wood } from '@shared/layout/schema';
import { describe, expect, it } from 'vitest';
import { percentWords, shareWords, wishedWoods } from './wood-wishes';

const WOODS: Wood[] = ['ash', 'walnut', 'sapele'].map((key) => ({
  key,
  name: key,
  colour: '#AA8855',
  sawn: 'flat',
}));

describe('the woods of a picture', () => {
  it('take part as they are until something else is wished', () => {
    expect(wishedWoods(WOODS, new Map()).map(({ wood, weight }) => [wood, weight])).toEqual([
      [0, 1],
      [1, 1],
      [2, 1],
    ]);
  });

  it('keep their numbers when one before them is left out, and double their odds a step', () => {
    const wishes = new Map([
      ['ash', null],
      ['sapele', 2],
    ]);
    expect(wishedWoods(WOODS, wishes).map(({ wood, weight }) => [wood, weight])).toEqual([
      [1, 1],
      [2, 4],
    ]);
  });

  it.each([
    [0, 'as in the picture'],
    [1, '2 times as much'],
    [0.5, '1.4 times as much'],
    [-1, 'half as much'],
    [-2, '4 times less'],
  ])('wished by %s steps read "%s"', (steps, words) => {
    expect(shareWords(steps)).toBe(words);
  });

  it.each([
    [0, '0 %'],
    [1, 'under 1 %'],
    [150, '52 %'],
    [288, '100 %'],
  ])('with %s of 288 tiles have a share of %s', (count, words) => {
    expect(percentWords(count, 288)).toBe(words);
  });
});
