/**
 * From a picture to tiles: one colour a tile goes in, the nearest woods come out. Nearness is CIEDE2000; what
 * dithering mixes is mixed in CIELAB.
 */
import type { Lab65 } from 'culori/fn';
import type { Grid } from '../layout/cells';
import { labOf, labOfRgb } from './contrast';
import { dithered, type Dithering } from './dithering';

export interface PictureWish {
  readonly dithering: Dithering;
  /** 1 leaves the picture as it is; 0 is all grey, 2 twice the contrast. */
  readonly contrast: number;
  /** The woods to use, at least one. */
  readonly woods: readonly WishedWood[];
}

export interface WishedWood {
  /** Index in the layout. */
  readonly wood: number;
  /** As "#RRGGBB". */
  readonly colour: string;
  /**
   * 1 is neutral, more draws more tiles. Dithered, it multiplies the wood's odds wherever two woods mix: of
   * weight 3 beside 1, half and half becomes three quarters.
   */
  readonly weight: number;
}

/** Red, green, blue of each tile, 0–255, course by course from the bottom. */
export type TileColours = Uint8Array | Uint8ClampedArray;

/** The wood of each tile. `colours` must hold three bytes a tile. */
export function woodsFromPicture(colours: TileColours, grid: Grid, wish: PictureWish): Uint8Array {
  const tiles = grid.staves * grid.courses;
  const labs = Array.from({ length: tiles }, (_, tile) => labOfTile(colours, tile));
  return woodsOfLabs(stretched(labs, wish.contrast), grid, wish);
}

/** The wood of each tile, for tiles whose wished colours are in CIELAB already. */
export function woodsOfLabs(
  labs: readonly Lab65[],
  grid: Grid,
  { dithering, woods }: Omit<PictureWish, 'contrast'>,
): Uint8Array {
  const palette = woods.map(({ colour, weight }) => ({
    lab: labOf(colour),
    weight: Math.max(weight, LEAST_WEIGHT),
  }));
  const chosen = dithered(dithering, labs, palette, grid);
  return Uint8Array.from(chosen, (index) => woods[index]?.wood ?? 0);
}

/** A wood without any weight is one that should have been left out. */
const LEAST_WEIGHT = 1e-3;

function labOfTile(colours: TileColours, tile: number): Lab65 {
  const at = 3 * tile;
  return labOfRgb(colours[at] ?? 0, colours[at + 1] ?? 0, colours[at + 2] ?? 0);
}

/** Contrast about the picture's mean. */
function stretched(labs: readonly Lab65[], contrast: number): Lab65[] {
  const mean = labs.reduce((sum, { l }) => sum + l, 0) / Math.max(1, labs.length);
  return labs.map(({ l, a, b }) => ({
    mode: 'lab65',
    l: mean + (l - mean) * contrast,
    a: a * contrast,
    b: b * contrast,
  }));
}
