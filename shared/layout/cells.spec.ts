import { describe, expect, it } from 'vitest';
import {
  cellAt,
  countWoods,
  courseLetters,
  decodeCells,
  encodeCells,
  roundStave,
  tileName,
  tileOf,
} from './cells';

const grid = { staves: 12, courses: 5 };

describe('positions', () => {
  it('run along a course first, from the bottom', () => {
    expect(cellAt(grid, 0, 0)).toBe(0);
    expect(cellAt(grid, 3, 2)).toBe(27);
    expect(tileOf(grid, 27)).toEqual({ stave: 3, course: 2 });
  });

  it('come in again beyond the seam', () => {
    expect(roundStave(grid, -1)).toBe(11);
    expect(cellAt(grid, 12, 1)).toBe(cellAt(grid, 0, 1));
    expect(cellAt(grid, -13, 0)).toBe(11);
  });
});

describe('names', () => {
  it('letters go on with AA after Z', () => {
    expect([0, 25, 26, 51, 52, 119].map(courseLetters)).toEqual(['A', 'Z', 'AA', 'AZ', 'BA', 'DP']);
  });

  it('a tile is its course and its stave from 1', () => {
    expect(tileName(11, 3)).toBe('D 12');
  });
});

describe('cells as text', () => {
  it('are base64 and back, every byte', () => {
    const cells = Uint8Array.from({ length: 256 }, (_, i) => i);
    expect(decodeCells(encodeCells(cells))).toEqual(cells);
    expect(encodeCells(Uint8Array.of(0, 1, 2, 3))).toBe('AAECAw==');
  });

  it.each(['AA', 'A===', 'AA==AA==', 'AA-_', ' AAAA', 'AAAA\n', 'é'])(
    '%j is not base64',
    (text) => {
      expect(decodeCells(text)).toBeNull();
    },
  );

  it('may be empty', () => {
    expect(decodeCells('')).toEqual(new Uint8Array());
  });
});

it('woods are counted, unused ones too', () => {
  expect(countWoods(Uint8Array.of(0, 2, 2, 0, 0), 4)).toEqual([3, 0, 2, 0]);
});
