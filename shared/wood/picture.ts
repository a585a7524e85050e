/**
 * From a picture to tiles: one colour a tile goes in, the nearest woods come out. Nearness is CIEDE2000; the
 * error that dithering carries on is kept in CIELAB. Dithering wraps across the seam: the error of the last
 * stave is carried into the first of the next courses, and the ordered pattern repeats in whole rounds.
 */
import type { Lab65 } from 'culori/fn';
import { colourDifference, labOf, labOfRgb } from './contrast';
import type { Grid } from '../layout/cells';

export const DITHERINGS = ['plain', 'ordered', 'error-diffusion'] as const;
export type Dithering = (typeof DITHERINGS)[number];

export interface PictureWish {
  readonly dithering: Dithering;
  /** 1 leaves the picture as it is; 0 is all grey, 2 twice the contrast. */
  readonly contrast: number;
  /** The woods to use: index in the layout, colour, and weight (1 is neutral; more draws more tiles). */
  readonly woods: readonly {
    readonly wood: number;
    readonly colour: string;
    readonly weight: number;
  }[];
}

/** Red, green, blue of each tile, 0–255, course by course from the bottom. */
export type TileColours = Uint8Array | Uint8ClampedArray;

/** The wood of each tile. `colours` must hold three bytes a tile. */
export function woodsFromPicture(colours: TileColours, grid: Grid, wish: PictureWish): Uint8Array {
  const tiles = grid.staves * grid.courses;
  const wished = stretched(
    Array.from({ length: tiles }, (_, i) => labOfTile(colours, i)),
    wish.contrast,
  );
  const palette = wish.woods.map(({ colour, weight }) => ({ lab: labOf(colour), weight }));
  const nearest = (lab: Lab65) => nearestWood(palette, lab);
  const chosen = chooseWoods(wish.dithering, wished, palette, grid, nearest);
  return Uint8Array.from(chosen, (index) => wish.woods[index]?.wood ?? 0);
}

interface PaletteWood {
  readonly lab: Lab65;
  readonly weight: number;
}

function chooseWoods(
  dithering: Dithering,
  wished: Lab65[],
  palette: readonly PaletteWood[],
  grid: Grid,
  nearest: (lab: Lab65) => number,
): number[] {
  switch (dithering) {
    case 'plain':
      return wished.map(nearest);
    case 'ordered':
      return ordered(wished, palette, grid, nearest);
    case 'error-diffusion':
      return diffused(wished, palette, grid, nearest);
  }
}

function labOfTile(colours: TileColours, tile: number): Lab65 {
  const [r, g, b] = [
    colours[3 * tile] ?? 0,
    colours[3 * tile + 1] ?? 0,
    colours[3 * tile + 2] ?? 0,
  ];
  return labOfRgb(r, g, b);
}

/** Contrast about the picture's mean. */
function stretched(labs: Lab65[], contrast: number): Lab65[] {
  const mean = labs.reduce((sum, { l }) => sum + l, 0) / Math.max(1, labs.length);
  return labs.map(({ l, a, b }) => ({
    mode: 'lab65',
    l: mean + (l - mean) * contrast,
    a: a * contrast,
    b: b * contrast,
  }));
}

function nearestWood(palette: readonly PaletteWood[], lab: Lab65): number {
  let nearest = 0;
  let least = Infinity;
  palette.forEach((wood, i) => {
    const difference = colourDifference(wood.lab, lab) / Math.max(wood.weight, 1e-3);
    if (difference < least) [nearest, least] = [i, difference];
  });
  return nearest;
}

/** Bayer's 4 × 4 threshold matrix (B. E. Bayer, IEEE ICC 1973; from memory), as −½…½. */
const BAYER = [
  [0, 8, 2, 10],
  [12, 4, 14, 6],
  [3, 11, 1, 9],
  [15, 7, 13, 5],
].map((row) => row.map((rank) => (rank + 0.5) / 16 - 0.5));

function ordered(
  wished: Lab65[],
  palette: readonly PaletteWood[],
  { staves }: Grid,
  nearest: (lab: Lab65) => number,
): number[] {
  const lightness = palette.map(({ lab }) => lab.l);
  const spread =
    (Math.max(...lightness) - Math.min(...lightness)) / Math.max(1, palette.length - 1);
  return wished.map((lab, i) => {
    const course = Math.floor(i / staves);
    // the last, broken round of thresholds is squeezed so that the matrix closes at the seam
    const column = Math.floor(
      (((i % staves) + 0.5) * 4 * Math.max(1, Math.round(staves / 4))) / staves,
    );
    const threshold = BAYER[course % 4]?.[column % 4] ?? 0;
    return nearest({ ...lab, l: lab.l + threshold * spread });
  });
}

/** Floyd and Steinberg's shares (Proc. SID 17, 1976; from memory), from the top course down. */
const SHARES: readonly { across: number; down: number; share: number }[] = [
  { across: 1, down: 0, share: 7 / 16 },
  { across: -1, down: 1, share: 3 / 16 },
  { across: 0, down: 1, share: 5 / 16 },
  { across: 1, down: 1, share: 1 / 16 },
];

function diffused(
  wished: Lab65[],
  palette: readonly PaletteWood[],
  { staves, courses }: Grid,
  nearest: (lab: Lab65) => number,
): number[] {
  const left = wished.map(({ l, a, b }) => ({ mode: 'lab65' as const, l, a, b }));
  const chosen = new Array<number>(left.length).fill(0);
  for (let course = courses - 1; course >= 0; course--) {
    for (let stave = 0; stave < staves; stave++) {
      const tile = course * staves + stave;
      const wish = left[tile] as Lab65;
      const wood = nearest(wish);
      chosen[tile] = wood;
      const got = palette[wood]?.lab ?? wish;
      for (const { across, down, share } of SHARES) {
        const to = course - down;
        // along its own course the error stops at the seam, where the tiles are already laid
        if (to < 0 || (down === 0 && stave + across >= staves)) continue;
        const heir = left[to * staves + ((stave + across + staves) % staves)] as Lab65;
        heir.l += (wish.l - got.l) * share;
        heir.a += (wish.a - got.a) * share;
        heir.b += (wish.b - got.b) * share;
      }
    }
  }
  return chosen;
}
