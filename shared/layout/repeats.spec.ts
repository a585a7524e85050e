import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellAt, tileName, tileOf, type Grid } from './cells';
import { AT_THE_END, MIRRORS, ONCE, positionsTouched, timesRound, type Repeats } from './repeats';

const laid = (grid: Grid) => ({ ...grid, cells: new Uint8Array(grid.staves * grid.courses) });

const lantern = laid({ staves: 32, courses: 9 });

const names = (grid: Grid, positions: readonly number[]): string[] =>
  positions.map((position) => {
    const { stave, course } = tileOf(grid, position);
    return tileName(stave, course);
  });

describe('one touch repeated round the shell', () => {
  it('offers only counts that divide the staves', () => {
    expect(timesRound(32)).toEqual([1, 2, 4, 8, 16, 32]);
    expect(timesRound(25)).toEqual([1, 5, 25]);
  });

  it('climbs one course a repeat and ends at the top', () => {
    const touched = positionsTouched(
      lantern,
      { extent: 'tile', tile: { stave: 3, course: 2 } },
      { ...ONCE, times: 8, step: 1 },
    );
    expect(names(lantern, touched)).toEqual(['C 4', 'D 8', 'E 12', 'F 16', 'G 20', 'H 24', 'I 28']);
  });

  it('comes in again from below when it wraps at the top', () => {
    const touched = positionsTouched(
      lantern,
      { extent: 'tile', tile: { stave: 3, course: 7 } },
      { ...ONCE, times: 4, step: 1, atTheEnd: 'wrap' },
    );
    expect(names(lantern, touched)).toEqual(['A 20', 'B 28', 'H 4', 'I 12']);
  });

  it('repeats a patch over the seam, cut off where it steps over the top', () => {
    const touched = positionsTouched(
      lantern,
      { extent: 'patch', corner: { stave: 31, course: 7 }, tile: { stave: 32, course: 8 } },
      { ...ONCE, times: 2, step: 1 },
    );
    expect(names(lantern, touched)).toEqual(['H 1', 'H 32', 'I 1', 'I 16', 'I 17', 'I 32']);
  });

  it('crosses itself when mirrored at the seam', () => {
    const touched = positionsTouched(
      lantern,
      { extent: 'tile', tile: { stave: 0, course: 0 } },
      { ...ONCE, times: 2, step: 3, mirror: 'at-seam' },
    );
    expect(names(lantern, touched)).toEqual(['A 1', 'A 32', 'D 16', 'D 17']);
  });

  it('lays a course at both ends when mirrored at mid-height', () => {
    const touched = positionsTouched(
      laid({ staves: 6, courses: 5 }),
      { extent: 'course', tile: { stave: 0, course: 1 } },
      { ...ONCE, mirror: 'at-mid-height' },
    );
    expect(touched).toEqual([6, 7, 8, 9, 10, 11, 18, 19, 20, 21, 22, 23]);
  });

  const touches = fc
    .record({
      staves: fc.integer({ min: 6, max: 48 }),
      courses: fc.integer({ min: 1, max: 20 }),
      at: fc.nat(),
      pick: fc.nat(),
      step: fc.integer({ min: -3, max: 3 }),
      mirror: fc.constantFrom(...MIRRORS),
      atTheEnd: fc.constantFrom(...AT_THE_END),
    })
    .map(({ staves, courses, at, pick, step, mirror, atTheEnd }) => {
      const grid = laid({ staves, courses });
      const counts = timesRound(staves);
      const times = counts[pick % counts.length] ?? 1;
      const repeats: Repeats = { times, step, mirror, atTheEnd };
      return { grid, tile: tileOf(grid, at % (staves * courses)), repeats };
    });

  it('always lays the tile that was touched, and no tile twice', () => {
    fc.assert(
      fc.property(touches, ({ grid, tile, repeats }) => {
        const positions = positionsTouched(grid, { extent: 'tile', tile }, repeats);
        expect(positions).toContain(cellAt(grid, tile.stave, tile.course));
        expect(new Set(positions).size).toBe(positions.length);
      }),
    );
  });

  it('is the same from whichever repeat it begins when all stay on one course', () => {
    fc.assert(
      fc.property(touches, fc.nat(), ({ grid, tile, repeats }, k) => {
        const level = { ...repeats, step: 0 };
        const sector = grid.staves / level.times;
        const other = { ...tile, stave: tile.stave + sector * (k % level.times) };
        expect(positionsTouched(grid, { extent: 'tile', tile: other }, level)).toEqual(
          positionsTouched(grid, { extent: 'tile', tile }, level),
        );
      }),
    );
  });

  it('lays every repeat when it wraps, and only those on the shell when it stops', () => {
    fc.assert(
      fc.property(touches, ({ grid, tile, repeats }) => {
        const bare: Repeats = { ...repeats, mirror: 'none' };
        const touch = { extent: 'tile', tile } as const;
        const wrapped = positionsTouched(grid, touch, { ...bare, atTheEnd: 'wrap' });
        const stopped = positionsTouched(grid, touch, { ...bare, atTheEnd: 'stop' });
        const on = Array.from({ length: bare.times }, (_, k) => tile.course + k * bare.step);
        const onShell = on.filter((course) => course >= 0 && course < grid.courses);
        expect(stopped.length).toBe(onShell.length);
        if (bare.step !== 0) expect(wrapped.length).toBe(bare.times);
        expect(wrapped).toEqual(expect.arrayContaining(stopped));
      }),
    );
  });

  it('is its own mirror image when mirrored', () => {
    fc.assert(
      fc.property(touches, ({ grid, tile, repeats }) => {
        const positions = positionsTouched(
          grid,
          { extent: 'tile', tile },
          { ...repeats, mirror: 'both' },
        );
        const turnedOver = positions
          .map((position) => tileOf(grid, position))
          .map(({ stave, course }) =>
            cellAt(grid, grid.staves - 1 - stave, grid.courses - 1 - course),
          );
        expect(turnedOver.sort((a, b) => a - b)).toEqual(positions);
      }),
    );
  });
});
