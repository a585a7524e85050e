import { describe, expect, it } from 'vitest';
import { countWoods } from '../cells';
import { patternProblems } from './bounds';
import { firstPatterns } from './first-pattern';
import { layStartingPattern } from './lay-pattern';
import type { Diamonds, StartingPattern } from './starting-pattern';

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
    { pattern: { kind: 'helix', stripes: TWO, lead: 8, hand: 'right' }, period: 16 },
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
    const laid = layStartingPattern({ kind: 'helix', stripes: TWO, lead: 9, hand: 'right' }, GRID);
    expect(laid).toMatchObject({ meets: false, field: 'lead', offers: [8, 12, 4, 16, 20] });
    expect(
      layStartingPattern({ kind: 'helix', stripes: TWO, lead: 8, hand: 'right' }, GRID).meets,
    ).toBe(true);
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

describe('a helix', () => {
  const helix = { kind: 'helix', stripes: TWO, lead: 8, hand: 'right' } as const;

  it('of the left hand is the one of the right hand in a mirror', () => {
    const right = layStartingPattern(helix, GRID).cells;
    const left = layStartingPattern({ ...helix, hand: 'left' }, GRID).cells;
    const mirrored = right.map((_, p) => right[p - (p % 32) + 31 - (p % 32)] ?? 0);
    expect(left).toEqual(mirrored);
  });

  it('offers leads near the wished one, however steep it is', () => {
    const laid = layStartingPattern({ ...helix, lead: 101 }, GRID);
    expect(laid).toMatchObject({ meets: false, offers: [100, 104, 96, 108, 92] });
  });
});

describe('diamonds', () => {
  const drawn = (pattern: Omit<Diamonds, 'kind' | 'ground' | 'diamond'>): string[] => {
    const grid = { staves: pattern.staves, courses: pattern.courses };
    const { cells } = layStartingPattern(
      { kind: 'diamonds', ground: 0, diamond: 1, ...pattern },
      grid,
    );
    return Array.from({ length: grid.courses }, (_, course) =>
      [...cells.subarray(course * grid.staves, (course + 1) * grid.staves)].join(''),
    );
  };

  it('stand on their points, filled', () => {
    expect(drawn({ staves: 6, courses: 6, drawn: 'filled' })).toEqual([
      '001100',
      '011110',
      '111111',
      '111111',
      '011110',
      '001100',
    ]);
  });

  it('have an outline without gaps, also where they are much higher than wide', () => {
    expect(drawn({ staves: 4, courses: 8, drawn: 'outline' })).toEqual([
      '0110',
      '0110',
      '0110',
      '1001',
      '1001',
      '0110',
      '0110',
      '0110',
    ]);
    expect(drawn({ staves: 5, courses: 5, drawn: 'outline' })).toEqual([
      '00100',
      '01010',
      '10001',
      '01010',
      '00100',
    ]);
  });
});

describe('the first pattern of each kind', () => {
  it.each([
    { staves: 32, courses: 9 },
    { staves: 25, courses: 1 },
    { staves: 7, courses: 14 },
    { staves: 240, courses: 120 },
  ])(
    'is within its bounds on $staves × $courses, and meets where anything of its kind does',
    (grid) => {
      for (const pattern of Object.values(firstPatterns(grid, 0, 1))) {
        expect(patternProblems(pattern, 2)).toEqual([]);
        if (pattern.kind === 'scatter') continue;
        const oddChecker = pattern.kind === 'checker' && grid.staves % 2 === 1;
        expect(layStartingPattern(pattern, grid).meets).toBe(!oddChecker);
      }
    },
  );
});

describe('what cannot be laid', () => {
  it.each([
    [{ kind: 'bands', stripes: [{ wood: 0, width: 0 }] }, 'stripes.0.width'],
    [{ kind: 'bands', stripes: [] }, 'stripes'],
    [{ kind: 'bands', stripes: [{ wood: 2, width: 1 }] }, 'stripes.0.wood'],
    [{ kind: 'checker', woods: [0], staves: 1, courses: 1 }, 'woods'],
    [{ kind: 'checker', woods: [0, 1], staves: 0, courses: 1 }, 'staves'],
    [{ kind: 'helix', stripes: TWO, lead: 0, hand: 'left' }, 'lead'],
    [{ kind: 'helix', stripes: TWO, lead: 2.5, hand: 'left' }, 'lead'],
    [{ kind: 'zigzag', stripes: TWO, staves: 1, rise: 1 }, 'staves'],
    [{ kind: 'zigzag', stripes: TWO, staves: 4, rise: 0 }, 'rise'],
    [{ kind: 'scatter', shares: [{ wood: 0, share: 0 }], seed: 1 }, 'shares'],
    [{ kind: 'scatter', shares: [{ wood: 0, share: -1 }], seed: 1 }, 'shares.0.share'],
  ] satisfies [StartingPattern, string][])('%o is refused at %s', (pattern, field) => {
    expect(patternProblems(pattern, 2).map((problem) => problem.field)).toContain(field);
  });
});
