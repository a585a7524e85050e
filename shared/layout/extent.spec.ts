import { describe, expect, it } from 'vitest';
import { positionsWithin } from './extent';

const grid = { staves: 6, courses: 3 };

describe('the tiles one touch reaches', () => {
  it('is the tile itself, also beyond the seam', () => {
    expect(positionsWithin(grid, 'tile', { stave: 2, course: 1 })).toEqual([8]);
    expect(positionsWithin(grid, 'tile', { stave: -1, course: 0 })).toEqual([5]);
    expect(positionsWithin(grid, 'tile', { stave: 6, course: 2 })).toEqual([12]);
  });

  it('is every tile of the course', () => {
    expect(positionsWithin(grid, 'course', { stave: 4, course: 1 })).toEqual([6, 7, 8, 9, 10, 11]);
  });

  it('is every tile of the stave from bottom to top', () => {
    expect(positionsWithin(grid, 'stave', { stave: 7, course: 1 })).toEqual([1, 7, 13]);
  });

  it('is nothing above or below the shell', () => {
    expect(positionsWithin(grid, 'stave', { stave: 0, course: 3 })).toEqual([]);
    expect(positionsWithin(grid, 'course', { stave: 0, course: -1 })).toEqual([]);
  });
});
