import type { Lab65 } from 'culori/fn';
import { describe, expect, it } from 'vitest';
import { countWoods, type Grid } from '../layout/cells';
import { labOf } from './contrast';
import { DITHERINGS, type Dithering } from './dithering';
import { woodsFromPicture, woodsOfLabs, type WishedWood } from './picture';

const ASH = '#DCC39A';
const WALNUT = '#5A3A27';
const SAPELE = '#964B30';

function woods(...colours: string[]): WishedWood[] {
  return colours.map((colour, wood) => ({ wood, colour, weight: 1 }));
}

/** The colour of every tile as bytes. */
function tiles(grid: Grid, colourAt: (stave: number, course: number) => string): Uint8Array {
  return Uint8Array.from(
    Array.from({ length: grid.staves * grid.courses }, (_, i) => {
      const colour = colourAt(i % grid.staves, Math.floor(i / grid.staves));
      return [1, 3, 5].map((at) => Number.parseInt(colour.slice(at, at + 2), 16));
    }).flat(),
  );
}

function grey(light: number, { staves, courses }: Grid): Lab65[] {
  return Array.from({ length: staves * courses }, () => ({ mode: 'lab65', l: light, a: 0, b: 0 }));
}

const GRID = { staves: 32, courses: 16 };

describe.each(DITHERINGS)('a picture laid %s', (dithering) => {
  const plainWish = { dithering, contrast: 1 };

  it('in the colours of the woods comes out as it is', () => {
    const checker = (stave: number, course: number) =>
      [ASH, WALNUT, SAPELE][(stave + 2 * course) % 3] ?? ASH;
    const laid = woodsFromPicture(tiles(GRID, checker), GRID, {
      ...plainWish,
      woods: woods(ASH, WALNUT, SAPELE),
    });
    expect([...laid]).toEqual(Array.from(laid, (_, i) => ((i % 32) + 2 * Math.floor(i / 32)) % 3));
  });

  it('uses only the woods it may, under their own numbers', () => {
    const wish = { ...plainWish, woods: [{ wood: 5, colour: WALNUT, weight: 1 }] };
    const laid = woodsFromPicture(
      tiles(GRID, () => ASH),
      GRID,
      wish,
    );
    expect(new Set(laid)).toEqual(new Set([5]));
  });

  it('gives a wood more tiles the more weight it has', () => {
    const slope = grey(0, GRID).map((lab, i) => ({ ...lab, l: (100 * (i % 32)) / 31 }));
    const whites = [0.25, 0.5, 1, 2, 4].map((weight) => {
      const [black, white] = woods('#000000', '#FFFFFF');
      const pair = [black!, { ...white!, weight }];
      return countWoods(woodsOfLabs(slope, GRID, { dithering, woods: pair }), 2)[1] ?? 0;
    });
    expect(whites).toEqual([...whites].sort((a, b) => a - b));
    expect(new Set(whites).size).toBe(5);
  });

  it('with no contrast is one grey', () => {
    const picture = tiles(GRID, (stave) => (stave < 16 ? '#FFFFFF' : '#000000'));
    const wish = { dithering, contrast: 0, woods: woods(ASH, WALNUT) };
    const laid = woodsFromPicture(picture, GRID, wish);
    const half = (from: number) =>
      laid.filter((wood, i) => wood === 1 && Math.floor((i % 32) / 16) === from).length;
    expect(Math.abs(half(0) - half(1))).toBeLessThan(20);
  });
});

describe.each(['ordered', 'error-diffusion'] satisfies Dithering[])('dithered %s', (dithering) => {
  const shareOfWhite = (light: number, weight: number): number => {
    const grid = { staves: 64, courses: 64 };
    const pair = [
      { wood: 0, colour: '#000000', weight: 1 },
      { wood: 1, colour: '#FFFFFF', weight },
    ];
    const laid = woodsOfLabs(grey(light, grid), grid, { dithering, woods: pair });
    return (countWoods(laid, 2)[1] ?? 0) / laid.length;
  };

  it.each([
    [50, 1, 0.5],
    [25, 1, 0.25],
    [50, 3, 0.75],
    [25, 3, 0.5],
    [75, 1 / 3, 0.5],
  ])('a grey of L* %s beside a white of weight %s has its share', (light, weight, share) => {
    expect(Math.abs(shareOfWhite(light, weight) - share)).toBeLessThan(0.02);
  });

  it('mixes the two nearest of three woods, not the far ones', () => {
    const three = woods('#000000', '#777777', '#FFFFFF');
    const laid = woodsOfLabs(grey(75, GRID), GRID, { dithering, woods: three });
    const [black, middle, white] = countWoods(laid, 3);
    expect(black).toBe(0);
    expect(Math.abs((middle ?? 0) - (white ?? 0))).toBeLessThan(30);
  });
});

describe('error diffusion', () => {
  it('does not smear what no wood can show: white paper above leaves the dark below alone', () => {
    const grid = { staves: 24, courses: 24 };
    const picture = tiles(grid, (_, course) => (course >= 12 ? '#FFFFFF' : WALNUT));
    const wish = { dithering: 'error-diffusion', contrast: 1 } as const;
    const laid = woodsFromPicture(picture, grid, { ...wish, woods: woods(ASH, WALNUT) });
    expect([...laid.slice(0, 24 * 12)].filter((wood) => wood === 0)).toHaveLength(0);
  });

  it('carries on across the seam: a dark last stave lightens the first of the next course', () => {
    const grid = { staves: 6, courses: 2 };
    const labs = grey(0, grid).map((lab, i) => ({ ...lab, l: i === 11 ? 49 : i === 0 ? 45 : 0 }));
    const laid = woodsOfLabs(labs, grid, {
      dithering: 'error-diffusion',
      woods: woods('#000000', '#FFFFFF'),
    });
    expect([laid[11], laid[0]]).toEqual([0, 1]);
  });
});

it('a wood that is the same colour as another does not upset the rest', () => {
  for (const dithering of DITHERINGS) {
    const wish = { dithering, woods: woods(ASH, ASH, WALNUT) };
    const laid = woodsOfLabs([labOf(WALNUT), labOf(ASH)], { staves: 2, courses: 1 }, wish);
    expect([...laid]).toEqual([2, 0]);
  }
});
