import { expect, it } from 'vitest';
import { trimOf } from './trim';

it('nine courses of 28 mm finished at 238 mm lose 7 mm at each end', () => {
  expect(trimOf({ courses: 9, tileHeight: 28, finishedHeight: 238 })).toEqual({
    untrimmedHeight: 252,
    eachEnd: 7,
    lower: 7,
    upper: 245,
  });
});

it('courses that do not make the height have less than nothing to trim', () => {
  expect(trimOf({ courses: 8, tileHeight: 28, finishedHeight: 238 }).eachEnd).toBe(-7);
});
