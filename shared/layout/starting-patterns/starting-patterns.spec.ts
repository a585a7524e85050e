import { describe, expect, it } from 'vitest';
import { countWoods } from '../cells';
import { layStartingPattern } from './lay-pattern';
import type { StartingPattern } from './starting-pattern';

const GRID = { staves: 32, courses: 9 };
const TWO = [
  { wood: 0, width: 3 },
  { wood: 1, width: 1 },
];

/** The cells after turning the shell by some staves. */
function turned(cells: Uint8Array, staves: number, by: number): Uint8Array {
  return cells.map((_, p) => {
    const [stave, course] = [p % staves, Math.floor(p / staves)];
    return cells[course * staves + ((stave + by) % staves)] ?? 0;
  });
}

describe('a starting pattern that meets itself at the seam', () => {
  const patterns: { pattern: StartingPattern; period: number }[] = [
    { pattern: { kind: 'checker', woods: [0, 1], staves: 2, courses: 1 }, period: 4 },
    { pattern: { kind: 'bands', stripes: TWO }, period: 1 },
    { pattern: { kind: 'helix', stripes: TWO, lead: 8 }, period: 16 },
    {
      pattern: { kind: 'diamonds', ground: 0, diamond: 1, staves: 8, courses: 9, drawn: 'outline' },
      period: 8,
    },
    { pattern: { kind: 'zigzag', stripes: TWO, staves: 8, rise: 3 }, period: 8 },
  ];

  it.each(patterns)('$pattern.kind is unchanged by turning it by its period', (row) => {
    const laid = layStartingPattern(row.pattern, GRID);
    expect(laid.meets).toBe(true);
    expect(turned(laid.cells, GRID.staves, row.period)).toEqual(laid.cells);
  });
});

describe('a starting pattern that cannot meet itself', () => {
  it('offers the leads with which a helix meets, nearest first', () => {
    const laid = layStartingPattern({ kind: 'helix', stripes: TWO, lead: 9 }, GRID);
    expect(laid).toMatchObject({ meets: false, field: 'lead', offers: [8, 12, 4, 16, 20] });
    expect(layStartingPattern({ kind: 'helix', stripes: TWO, lead: 8 }, GRID).meets).toBe(true);
  });

  it('offers the widths of diamonds that divide the staves', () => {
    const laid = layStartingPattern(
      { kind: 'diamonds', ground: 0, diamond: 1, staves: 7, courses: 7, drawn: 'filled' },
      GRID,
    );
    expect(laid).toMatchObject({ meets: false, field: 'staves', offers: [8, 4, 2, 16, 32] });
  });
});

describe('a scatter', () => {
  const shares = [
    { wood: 1, share: 0.2 },
    { wood: 0, share: 0.8 },
  ];

  it('has the shares to the tile and is the same for the same seed', () => {
    const { cells } = layStartingPattern({ kind: 'scatter', shares, seed: 3 }, GRID);
    expect(countWoods(cells, 2)).toEqual([230, 58]);
    expect(layStartingPattern({ kind: 'scatter', shares, seed: 3 }, GRID).cells).toEqual(cells);
    expect(layStartingPattern({ kind: 'scatter', shares, seed: 4 }, GRID).cells).not.toEqual(cells);
  });

  it('has no two sparse tiles side by side, at the seam neither', () => {
    const sparse = [
      { wood: 1, share: 0.1 },
      { wood: 0, share: 0.9 },
    ];
    const { cells } = layStartingPattern({ kind: 'scatter', shares: sparse, seed: 1 }, GRID);
    const next = turned(cells, GRID.staves, 1);
    expect(cells.some((wood, p) => wood === 1 && next[p] === 1)).toBe(false);
  });
});
