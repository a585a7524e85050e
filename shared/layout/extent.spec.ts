import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellAt, roundStave, tileOf, type Grid } from './cells';
import { boxBetween, positionsWithin, type LaidGrid, type Tile } from './extent';

const cells = new Uint8Array(18);
const grid: LaidGrid = { staves: 6, courses: 3, cells };

describe('the tiles one touch reaches', () => {
  it('is the tile itself, also beyond the seam', () => {
    const touched = (tile: Tile) => positionsWithin(grid, { extent: 'tile', tile });
    expect(touched({ stave: 2, course: 1 })).toEqual([8]);
    expect(touched({ stave: -1, course: 0 })).toEqual([5]);
    expect(touched({ stave: 6, course: 2 })).toEqual([12]);
  });

  it('is every tile of the course', () => {
    const tile = { stave: 4, course: 1 };
    expect(positionsWithin(grid, { extent: 'course', tile })).toEqual([6, 7, 8, 9, 10, 11]);
  });

  it('is every tile of the stave from bottom to top', () => {
    const tile = { stave: 7, course: 1 };
    expect(positionsWithin(grid, { extent: 'stave', tile })).toEqual([1, 7, 13]);
  });

  it('is nothing above or below the shell', () => {
    expect(positionsWithin(grid, { extent: 'stave', tile: { stave: 0, course: 3 } })).toEqual([]);
    expect(positionsWithin(grid, { extent: 'wood', tile: { stave: 0, course: -1 } })).toEqual([]);
  });

  it('is a rectangle dragged over the seam, in one piece', () => {
    const patch = positionsWithin(grid, {
      extent: 'patch',
      corner: { stave: 5, course: 1 },
      tile: { stave: 7, course: 0 },
    });
    expect(patch).toEqual([5, 0, 1, 11, 6, 7]);
  });

  it('is the whole ring and no more when the rectangle is dragged further than once round', () => {
    const patch = positionsWithin(grid, {
      extent: 'patch',
      corner: { stave: 2, course: 2 },
      tile: { stave: 15, course: 7 },
    });
    expect([...patch].sort((a, b) => a - b)).toEqual([12, 13, 14, 15, 16, 17]);
  });

  it('is every tile of the wood that was touched', () => {
    const laid = { ...grid, cells: Uint8Array.from(cells, (_, i) => (i % 5 === 0 ? 1 : 0)) };
    const tile = { stave: 4, course: 1 };
    expect(positionsWithin(laid, { extent: 'wood', tile })).toEqual([0, 5, 10, 15]);
  });
});

const laidGrids = fc
  .record({
    staves: fc.integer({ min: 6, max: 14 }),
    courses: fc.integer({ min: 1, max: 9 }),
    at: fc.nat(),
    bytes: fc.uint8Array({ minLength: 126, maxLength: 126, max: 1 }),
  })
  .map(({ staves, courses, at, bytes }) => {
    const laid: LaidGrid = { staves, courses, cells: bytes.slice(0, staves * courses) };
    return { laid, tile: tileOf(laid, at % laid.cells.length) };
  });

/** The same by brute force: labels spread until nothing changes. */
function floodedByLabels(laid: LaidGrid, tile: Tile): number[] {
  const reached = new Set([cellAt(laid, tile.stave, tile.course)]);
  for (let before = -1; before !== reached.size;) {
    before = reached.size;
    for (const [position, wood] of laid.cells.entries()) {
      const joined = [...reached].some(
        (other) => laid.cells[other] === wood && areJoined(laid, position, other),
      );
      if (joined) reached.add(position);
    }
  }
  return [...reached].sort((a, b) => a - b);
}

function areJoined(size: Grid, one: number, other: number): boolean {
  const a = tileOf(size, one);
  const b = tileOf(size, other);
  const round = roundStave(size, a.stave - b.stave);
  const besides = Math.min(round, size.staves - round);
  return besides + Math.abs(a.course - b.course) === 1;
}

describe('connected tiles of a wood', () => {
  it('are those a flood by brute force reaches, across the seam too', () => {
    fc.assert(
      fc.property(laidGrids, ({ laid, tile }) => {
        const connected = positionsWithin(laid, { extent: 'connected', tile });
        expect([...connected].sort((a, b) => a - b)).toEqual(floodedByLabels(laid, tile));
      }),
      { numRuns: 60 },
    );
  });

  it('are the same from whichever of them is touched', () => {
    fc.assert(
      fc.property(laidGrids, fc.nat(), ({ laid, tile }, pick) => {
        const connected = positionsWithin(laid, { extent: 'connected', tile });
        const other = tileOf(laid, connected[pick % connected.length] ?? 0);
        const again = positionsWithin(laid, { extent: 'connected', tile: other });
        expect(new Set(again)).toEqual(new Set(connected));
      }),
    );
  });
});

describe('a patch', () => {
  const corners = fc.record({
    size: fc.record({
      staves: fc.integer({ min: 6, max: 30 }),
      courses: fc.integer({ min: 1, max: 12 }),
    }),
    a: fc.record({
      stave: fc.integer({ min: -40, max: 40 }),
      course: fc.integer({ min: -3, max: 15 }),
    }),
    b: fc.record({
      stave: fc.integer({ min: -40, max: 40 }),
      course: fc.integer({ min: -3, max: 15 }),
    }),
  });

  it('holds the tiles between its corners, whichever was first and wherever the seam lies', () => {
    fc.assert(
      fc.property(corners, ({ size, a, b }) => {
        const laid = { ...size, cells: new Uint8Array(size.staves * size.courses) };
        const wished = new Set<number>();
        for (let s = Math.min(a.stave, b.stave); s <= Math.max(a.stave, b.stave); s++) {
          for (let c = Math.min(a.course, b.course); c <= Math.max(a.course, b.course); c++) {
            if (c >= 0 && c < size.courses) wished.add(cellAt(size, s, c));
          }
        }
        const patch = positionsWithin(laid, { extent: 'patch', corner: a, tile: b });
        expect(new Set(patch)).toEqual(wished);
        expect(patch.length).toBe(wished.size);
        expect(boxBetween(size, a, b)).toEqual(boxBetween(size, b, a));
      }),
    );
  });
});
