/**
 * Dithering against @thi.ng/pixel-dither, which knows nothing of shells: its pictures end at their edges and
 * hold one channel of 16 bit. So both are given black, white and greys, whose L* stands for that channel.
 */
import type { Grid } from '@shared/layout/cells';
import type { Dithering } from '@shared/wood/dithering';
import { woodsOfLabs } from '@shared/wood/picture';
import { GRAY16 } from '@thi.ng/pixel/format/gray16';
import { intBuffer } from '@thi.ng/pixel/int';
import { ditherWith } from '@thi.ng/pixel-dither/dither';
import { FLOYD_STEINBERG } from '@thi.ng/pixel-dither/floyd-steinberg';
import { defBayer } from '@thi.ng/pixel-dither/ordered';
import { describe, expect, it } from 'vitest';

const BLACK_AND_WHITE = [
  { wood: 0, colour: '#000000', weight: 1 },
  { wood: 1, colour: '#FFFFFF', weight: 1 },
];

/** Light of each tile, 0 to 1, course by course from the bottom. */
type Tone = (stave: number, course: number) => number;

function tonesOf({ staves, courses }: Grid, tone: Tone): number[] {
  return Array.from({ length: staves * courses }, (_, i) =>
    tone(i % staves, Math.floor(i / staves)),
  );
}

/** 0 for black and 1 for white, as we lay them. */
function laid(dithering: Dithering, grid: Grid, tone: Tone): number[] {
  const labs = tonesOf(grid, tone).map(
    (light) => ({ mode: 'lab65', l: 100 * light, a: 0, b: 0 }) as const,
  );
  return [...woodsOfLabs(labs, grid, { dithering, woods: BLACK_AND_WHITE })];
}

/** The same by the other program, whose first row is our highest course. */
function judged(grid: Grid, tone: Tone): number[] {
  const { staves, courses } = grid;
  const tones = tonesOf(grid, (stave, row) => tone(stave, courses - 1 - row));
  const rows = Uint16Array.from(tones, (light) => Math.round(65_535 * light));
  const { data } = ditherWith(FLOYD_STEINBERG, intBuffer(staves, courses, GRAY16, rows));
  return tonesOf(grid, (stave, course) =>
    (data[(courses - 1 - course) * staves + stave] ?? 0) > 32_767 ? 1 : 0,
  );
}

/** Share of white in each block of so many staves and courses. */
function meansOf(cells: readonly number[], { staves, courses }: Grid, side: number): number[] {
  const means: number[] = [];
  for (let course = 0; course + side <= courses; course += side) {
    for (let stave = 0; stave + side <= staves; stave += side) {
      let sum = 0;
      for (let i = 0; i < side * side; i++) {
        const at = (course + Math.floor(i / side)) * staves + stave + (i % side);
        sum += cells[at] ?? 0;
      }
      means.push(sum / (side * side));
    }
  }
  return means;
}

function farthest(ours: readonly number[], theirs: readonly number[]): number {
  return Math.max(...ours.map((value, i) => Math.abs(value - (theirs[i] ?? NaN))));
}

describe('error diffusion', () => {
  const slope: Tone = (stave) => (stave + 0.5) / 240;
  const wave: Tone = (stave, course) =>
    0.503 + 0.45 * Math.sin((stave / 48) * 2 * Math.PI) * Math.cos(course / 17);

  it('of one course is the same tile by tile: nothing crosses the seam there', () => {
    const grid = { staves: 240, courses: 1 };
    for (const tone of [slope, wave, () => 0.31, () => 0.503, () => 0.87]) {
      expect(laid('error-diffusion', grid, tone)).toEqual(judged(grid, tone));
    }
  });

  it('of the highest course of many is the same tile by tile', () => {
    const grid = { staves: 96, courses: 24 };
    const highest = (cells: number[]) => cells.slice(-grid.staves);
    for (const tone of [slope, wave]) {
      expect(highest(laid('error-diffusion', grid, tone))).toEqual(highest(judged(grid, tone)));
    }
  });

  it.each([
    ['a slope', slope],
    ['a wave', wave],
    ['one grey', () => 0.37],
  ] satisfies [string, Tone][])('of %s gives every block the same tone', (_, tone) => {
    const grid = { staves: 240, courses: 120 };
    const [ours, theirs] = [laid('error-diffusion', grid, tone), judged(grid, tone)];
    const wished = tonesOf(grid, tone);
    // what crosses a block's edge is not in it yet: round 12 × 12 tiles that leaves a few of them open
    for (const { side, most } of [
      { side: 12, most: 6.5 / 144 },
      { side: 60, most: 0.005 },
    ]) {
      const means = meansOf(ours, grid, side);
      expect(farthest(means, meansOf(theirs, grid, side))).toBeLessThan(most);
      expect(farthest(means, meansOf(wished, grid, side))).toBeLessThan(most);
    }
  });

  it('keeps its tone at the seam, where the other program loses what passes its edge', () => {
    const grid = { staves: 24, courses: 120 };
    const grey = () => 0.29;
    const white = (cells: number[]) => cells.reduce((sum, cell) => sum + cell, 0) / cells.length;
    const ours = Math.abs(white(laid('error-diffusion', grid, grey)) - 0.29);
    const theirs = Math.abs(white(judged(grid, grey)) - 0.29);
    expect(ours).toBeLessThan(0.004);
    expect(ours).toBeLessThanOrEqual(theirs);
  });
});

describe('ordered dithering', () => {
  it('lays tile by tile by the matrix of the other program', () => {
    const grid = { staves: 64, courses: 34 };
    const { mat } = defBayer(4);
    const tone: Tone = (stave, course) => ((stave * 7 + course * 3) % 101) / 100;
    const theirs = tonesOf(grid, (stave, course) => {
      const rank = mat[course % 4]?.[stave % 4] ?? NaN;
      return tone(stave, course) > (rank + 0.5) / 16 ? 1 : 0;
    });
    expect(laid('ordered', grid, tone)).toEqual(theirs);
  });

  it('gives every grey its share, to a sixteenth', () => {
    const grid = { staves: 32, courses: 16 };
    for (let whites = 0; whites <= 16; whites++) {
      const cells = laid('ordered', grid, () => whites / 16);
      expect(cells.filter((cell) => cell === 1)).toHaveLength(whites * 32);
    }
  });
});
