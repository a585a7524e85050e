import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Segment } from '@shared/geometry/segment';
import { tilesBetween } from './stroke';
import { tilePicker } from './tile-picking';

const size = { tileWidth: 20, tileHeight: 30 };
const grid = { staves: 12, courses: 9 };
const halfDisc: Segment[] = [
  { kind: 'arc', centre: { x: 0, y: 0 }, radius: 4, startAngle: Math.PI, sweep: -Math.PI },
];
const straight = tilePicker({
  ...size,
  grid,
  scheme: 'one-way',
  staveTab: null,
  courseTab: null,
});
const tabbed = tilePicker({
  ...size,
  grid,
  scheme: 'one-way',
  staveTab: halfDisc,
  courseTab: halfDisc,
});

describe('a stroke between two samples of the pointer', () => {
  it('is one tile when the pointer stays in it', () => {
    expect(tilesBetween(straight, size, { x: 5, y: 5 }, { x: 15, y: 25 })).toEqual([
      { stave: 0, course: 0 },
    ]);
  });

  it('lays every tile of a fast sweep along a course and across the seam', () => {
    const tiles = tilesBetween(straight, size, { x: 230, y: 15 }, { x: 290, y: 15 });
    expect(tiles.map((tile) => tile.stave)).toEqual([11, 12, 13, 14]);
    const back = tilesBetween(straight, size, { x: 30, y: 15 }, { x: -30, y: 15 });
    expect(back.map((tile) => tile.stave)).toEqual([1, 0, -1, -2]);
  });

  it('lays the neighbour whose tab it passes over', () => {
    const tiles = tilesBetween(tabbed, size, { x: 22, y: 2 }, { x: 22, y: 28 });
    expect(tiles).toEqual([
      { stave: 1, course: 0 },
      { stave: 0, course: 0 },
      { stave: 1, course: 0 },
    ]);
  });

  it('goes on through the ends of the shell without laying anything there', () => {
    const tiles = tilesBetween(straight, size, { x: 10, y: 255 }, { x: 10, y: 400 });
    expect(tiles).toEqual([{ stave: 0, course: 8 }]);
  });

  it('has no gap: each tile shares an edge with the one before, whatever the way', () => {
    const point = fc.record({
      x: fc.integer({ min: -50_007, max: 70_000 }).map((x) => x / 101),
      y: fc.integer({ min: 0, max: 27_000 }).map((y) => y / 103),
    });
    fc.assert(
      fc.property(point, point, (from, to) => {
        const tiles = tilesBetween(straight, size, from, to);
        expect(tiles[0]).toEqual(straight(from));
        expect(tiles[tiles.length - 1]).toEqual(straight(to));
        tiles.slice(1).forEach((tile, i) => {
          const before = tiles[i] ?? tile;
          const apart = Math.abs(tile.stave - before.stave) + Math.abs(tile.course - before.course);
          expect(apart).toBe(1);
        });
      }),
    );
  });
});
