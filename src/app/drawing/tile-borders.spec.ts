import { describe, expect, it } from 'vitest';
import { tileBorders } from './tile-borders';

const GRID = { staves: 4, courses: 3 };
const sidesOf = (positions: readonly number[]): number =>
  (tileBorders(GRID, positions).match(/M/g) ?? []).length;

describe('borders round marked tiles', () => {
  it('go all round a single tile', () => {
    expect(tileBorders(GRID, [5])).toBe('M1 1v1M2 1v1M1 2h1M1 1h1');
  });

  it('leave out what lies between two marked tiles', () => {
    expect(sidesOf([4, 5])).toBe(6);
    expect(sidesOf([1, 5])).toBe(6);
  });

  it('close tiles off at the seam, where the picture ends', () => {
    expect(sidesOf([4, 7])).toBe(8);
  });

  it('go once round a whole shell', () => {
    expect(sidesOf([...Array(12).keys()])).toBe(2 * (4 + 3));
  });

  it('are nothing for no tiles', () => {
    expect(tileBorders(GRID, [])).toBe('');
  });
});
