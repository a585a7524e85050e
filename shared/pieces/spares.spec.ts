import { expect, it } from 'vitest';
import { spareCount } from './spares';

const build = { spareShare: 0.1, spareMinimum: 1 };

it('ten percent of a kind, rounded up', () => {
  expect(spareCount(40, build)).toBe(4);
  expect(spareCount(41, build)).toBe(5);
});

it('a share that divides does not round up to one more', () => {
  expect(spareCount(30, build)).toBe(3);
  expect(spareCount(100, { ...build, spareShare: 0.07 })).toBe(7);
});

it('never fewer than the workshop’s minimum', () => {
  expect(spareCount(3, { spareShare: 0, spareMinimum: 2 })).toBe(2);
  expect(spareCount(3, { spareShare: 0, spareMinimum: 0 })).toBe(0);
});
