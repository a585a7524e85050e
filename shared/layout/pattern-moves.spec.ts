import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellAt, countWoods } from './cells';
import { applyPatch } from './patch';
import { swapWoods, turnedCells } from './pattern-moves';
import { smallLayout } from './small-layout.fixture';

const SEED = { seed: 280_714 };
const GRID = { staves: 8, courses: 3 };
const patterns = fc
  .array(fc.nat(3), { minLength: 24, maxLength: 24 })
  .map((woods) => Uint8Array.from(woods));

describe('turning the pattern by staves', () => {
  it('takes each tile to the right, and the last stave across the seam', () => {
    const cells = new Uint8Array(24);
    cells[cellAt(GRID, 7, 1)] = 2;
    expect(turnedCells(GRID, cells, 3)[cellAt(GRID, 2, 1)]).toBe(2);
    expect(turnedCells(GRID, cells, -3)[cellAt(GRID, 4, 1)]).toBe(2);
  });

  it('there and back is where it began, and so is a whole turn', () => {
    fc.assert(
      fc.property(patterns, fc.integer({ min: -500, max: 500 }), (cells, by) => {
        expect(turnedCells(GRID, turnedCells(GRID, cells, by), -by)).toEqual(cells);
        expect(turnedCells(GRID, cells, by + GRID.staves)).toEqual(turnedCells(GRID, cells, by));
      }),
      SEED,
    );
  });
});

describe('swapping two woods', () => {
  it('lays each where the other was, and no other tile', () => {
    expect(swapWoods(Uint8Array.of(0, 1, 2, 1), 1, 2)).toEqual({
      kind: 'cells',
      positions: [1, 2, 3],
      before: [1, 2, 1],
      after: [2, 1, 2],
    });
    expect(swapWoods(Uint8Array.of(0, 1), 2, 3)).toBeNull();
  });

  it('twice is where it began, and the two counts change places', () => {
    const woods = fc.nat(3);
    fc.assert(
      fc.property(patterns, woods, woods, (cells, one, other) => {
        const swap = (from: Uint8Array): Uint8Array => {
          const change = swapWoods(from, one, other);
          return applyPatch({ ...smallLayout(), cells: from }, change ? [change] : []).cells;
        };
        const swapped = swap(cells);
        expect(swap(swapped)).toEqual(cells);
        expect(countWoods(swapped, 4)[one]).toBe(countWoods(cells, 4)[other]);
      }),
      SEED,
    );
  });
});
