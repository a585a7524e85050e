/** Patterns to begin from: each meets itself on this shell where anything of its kind does. */
import type { Grid } from '../cells';
import { PATTERN_BOUNDS } from './bounds';
import {
  divisorsOf,
  nearestFirst,
  type Checker,
  type Diamonds,
  type PatternKind,
  type PatternOf,
  type Scatter,
  type Zigzag,
} from './starting-pattern';

/** Tiles of the second wood in a hundred of a scatter. */
const SPARSE = 20;

/** The pattern of each kind that is shown first, with a ground and a wood that stands out from it. */
export function firstPatterns(
  grid: Grid,
  ground: number,
  accent: number,
): { readonly [K in PatternKind]: PatternOf<K> } {
  const stripes = [
    { wood: ground, width: 3 },
    { wood: accent, width: 1 },
  ];
  const lead = 8;
  return {
    checker: firstChecker(grid, ground, accent),
    bands: { kind: 'bands', stripes },
    helix: { kind: 'helix', stripes, lead, hand: 'right' },
    diamonds: firstDiamonds(grid, ground, accent),
    zigzag: firstZigzag(grid, ground, accent),
    scatter: firstScatter(ground, accent),
  };
}

function firstChecker({ staves }: Grid, ground: number, accent: number): Checker {
  const widths = divisorsOf(staves).filter((width) => staves % (2 * width) === 0);
  const width = nearestFirst(widths, 2)[0] ?? 2;
  return { kind: 'checker', woods: [ground, accent], staves: width, courses: width };
}

function firstDiamonds(grid: Grid, ground: number, accent: number): Diamonds {
  const staves = slope(grid, 8);
  // a shell about as high as one diamond shows one whole
  const fitting = grid.courses <= staves + 1 ? grid.courses : staves;
  const courses = Math.max(PATTERN_BOUNDS.diamondCourses.least, fitting);
  return { kind: 'diamonds', ground, diamond: accent, staves, courses, drawn: 'filled' };
}

function firstZigzag(grid: Grid, ground: number, accent: number): Zigzag {
  const staves = slope(grid, 8);
  const stripes = [
    { wood: ground, width: 2 },
    { wood: accent, width: 2 },
  ];
  return { kind: 'zigzag', stripes, staves, rise: Math.max(1, Math.floor(staves / 2)) };
}

function firstScatter(ground: number, accent: number): Scatter {
  const shares = [
    { wood: ground, share: 100 - SPARSE },
    { wood: accent, share: SPARSE },
  ];
  return { kind: 'scatter', shares, seed: 1 };
}

/** The width that divides the staves and is nearest to the wished one. */
function slope({ staves }: Grid, wished: number): number {
  const widths = divisorsOf(staves).filter((width) => width >= PATTERN_BOUNDS.slope.least);
  return nearestFirst(widths, wished)[0] ?? staves;
}
