/** What must hold for every starting pattern on every shell. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countWoods, type Grid } from '@shared/layout/cells';
import { turnedCells } from '@shared/layout/pattern-moves';
import { patternProblems } from '@shared/layout/starting-patterns/bounds';
import { layStartingPattern } from '@shared/layout/starting-patterns/lay-pattern';
import { HANDS, type StartingPattern } from '@shared/layout/starting-patterns/starting-pattern';
import { FIXED_SEED } from './fixed-seed';

const WOODS = 4;
const whole = (min: number, max: number) => fc.integer({ min, max });
const wood = whole(0, WOODS - 1);
const grids = fc.record({ staves: whole(6, 60), courses: whole(1, 20) });
const stripes = fc.array(fc.record({ wood, width: whole(1, 5) }), { minLength: 1, maxLength: 4 });

const patterns: fc.Arbitrary<StartingPattern> = fc.oneof(
  fc.record({
    kind: fc.constant('checker' as const),
    woods: fc.array(wood, { minLength: 2, maxLength: 4 }),
    staves: whole(1, 6),
    courses: whole(1, 6),
  }),
  fc.record({ kind: fc.constant('bands' as const), stripes }),
  fc.record({
    kind: fc.constant('helix' as const),
    stripes,
    lead: whole(1, 40),
    hand: fc.constantFrom(...HANDS),
  }),
  fc.record({
    kind: fc.constant('diamonds' as const),
    ground: wood,
    diamond: wood,
    staves: whole(2, 20),
    courses: whole(2, 20),
    drawn: fc.constantFrom('filled' as const, 'outline' as const),
  }),
  fc.record({
    kind: fc.constant('zigzag' as const),
    stripes,
    staves: whole(2, 20),
    rise: whole(1, 12),
  }),
  fc.record({
    kind: fc.constant('scatter' as const),
    shares: fc.array(fc.record({ wood, share: whole(1, 100) }), { minLength: 1, maxLength: 4 }),
    seed: whole(0, 9999),
  }),
);

describe('every starting pattern', () => {
  it('lays a wood of the layout on every tile', () => {
    fc.assert(
      fc.property(patterns, grids, (pattern, grid) => {
        expect(patternProblems(pattern, WOODS)).toEqual([]);
        const { cells } = layStartingPattern(pattern, grid);
        expect(cells).toHaveLength(grid.staves * grid.courses);
        expect(cells.every((laid) => laid < WOODS)).toBe(true);
      }),
      { ...FIXED_SEED, numRuns: 400 },
    );
  });

  it('that says it meets is itself again when turned by its period', () => {
    fc.assert(
      fc.property(patterns, grids, (pattern, grid) => {
        const laid = layStartingPattern(pattern, grid);
        if (!laid.meets) return;
        expect(grid.staves % laid.period).toBe(0);
        expect(turnedCells(grid, laid.cells, laid.period)).toEqual(laid.cells);
      }),
      { ...FIXED_SEED, numRuns: 1000 },
    );
  });

  it('that does not meet offers values with which it does', () => {
    fc.assert(
      fc.property(patterns, grids, (pattern, grid) => {
        const laid = layStartingPattern(pattern, grid);
        if (laid.meets) return;
        for (const offer of laid.offers) {
          const offered = { ...pattern, [laid.field]: offer };
          expect(patternProblems(offered, WOODS)).toEqual([]);
          expect(layStartingPattern(offered, grid).meets).toBe(true);
        }
      }),
      { ...FIXED_SEED, numRuns: 1000 },
    );
  });
});

describe('every scatter', () => {
  const scatters = fc.record({
    shares: fc.tuple(whole(0, 100), whole(0, 100), whole(1, 100)),
    seed: whole(0, 9999),
  });
  const scattered = (shares: readonly number[], seed: number): StartingPattern => ({
    kind: 'scatter',
    shares: shares.map((share, index) => ({ wood: index, share })),
    seed,
  });

  it('has its shares to the tile, and is the same for the same seed', () => {
    fc.assert(
      fc.property(scatters, grids, ({ shares, seed }, grid) => {
        const { cells } = layStartingPattern(scattered(shares, seed), grid);
        const sum = shares.reduce((total, share) => total + share, 0);
        countWoods(cells, 3).forEach((count, index) => {
          const exact = ((shares[index] ?? 0) / sum) * cells.length;
          expect(Math.abs(count - exact)).toBeLessThan(1);
        });
        expect(layStartingPattern(scattered(shares, seed), grid).cells).toEqual(cells);
      }),
      { ...FIXED_SEED, numRuns: 200 },
    );
  });

  it('is as even across the seam as anywhere else', () => {
    const grid = { staves: 48, courses: 24 };
    const nearest = Array.from({ length: 12 }, (_, seed) => {
      const { cells } = layStartingPattern(scattered([90, 10], seed), grid);
      return nearestOfEach(grid, cells, 1);
    }).flat();
    const atSeam = nearest.filter(({ stave }) => stave < 3 || stave >= grid.staves - 3);
    const elsewhere = nearest.filter(({ stave }) => stave >= 3 && stave < grid.staves - 3);
    expect(atSeam.length / nearest.length).toBeGreaterThan(0.9 * (6 / grid.staves));
    expect(atSeam.length / nearest.length).toBeLessThan(1.1 * (6 / grid.staves));
    expect(mean(atSeam) / mean(elsewhere)).toBeGreaterThan(0.95);
    expect(mean(atSeam) / mean(elsewhere)).toBeLessThan(1.05);
    expect(least(atSeam)).toBeGreaterThanOrEqual(least(elsewhere));
    // a tenth of the tiles, laid as evenly as can be, lie 3.4 apart; thrown at random, 1.6
    expect(mean(elsewhere)).toBeGreaterThan(2.3);
    expect(least(elsewhere)).toBeGreaterThan(1.5);
  });
});

interface Nearest {
  readonly stave: number;
  readonly distance: number;
}

/** How far each tile of a wood is from the next of the same wood, round the shell, in tiles. */
function nearestOfEach({ staves }: Grid, cells: Uint8Array, wood: number): Nearest[] {
  const tiles = [...cells.keys()]
    .filter((at) => cells[at] === wood)
    .map((at) => ({ stave: at % staves, course: Math.floor(at / staves) }));
  return tiles.map((tile) => {
    const distances = tiles
      .filter((other) => other !== tile)
      .map((other) => {
        const across = Math.abs(tile.stave - other.stave);
        return Math.hypot(Math.min(across, staves - across), tile.course - other.course);
      });
    return { stave: tile.stave, distance: Math.min(...distances) };
  });
}

function mean(all: readonly Nearest[]): number {
  return all.reduce((sum, { distance }) => sum + distance, 0) / all.length;
}

function least(all: readonly Nearest[]): number {
  return Math.min(...all.map(({ distance }) => distance));
}
