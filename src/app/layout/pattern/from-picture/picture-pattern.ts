/** A picture as a pattern: what the worker does for every touch of the dialog. */
import type { Grid } from '@shared/layout/cells';
import { woodsFromPicture, type PictureWish } from '@shared/wood/picture';
import type { Crop } from './crop';
import { tileColours, type PicturePixels } from './tile-colours';

export interface PatternWish extends PictureWish {
  readonly crop: Crop;
  /** Width over height of the unrolled shell. */
  readonly aspect: number;
  readonly grid: Grid;
}

/** In place of a wood: the tile lies beyond the picture and keeps the wood it has. */
export const KEEPS = 255;

/** The wood of each tile under the picture, `KEEPS` elsewhere. */
export function picturePattern(pixels: PicturePixels, wish: PatternWish): Uint8Array {
  const { colours, covered } = tileColours(pixels, wish, wish.grid);
  fillUncovered(colours, covered);
  return woodsFromPicture(colours, wish.grid, wish).map((wood, tile) =>
    covered[tile] === 1 ? wood : KEEPS,
  );
}

/** Tiles beyond the picture take its mean colour while woods are chosen, so that they do not move its contrast. */
function fillUncovered(colours: Uint8Array, covered: Uint8Array): void {
  const sums = [0, 0, 0];
  let count = 0;
  covered.forEach((isCovered, tile) => {
    if (isCovered === 0) return;
    sums.forEach((sum, i) => (sums[i] = sum + (colours[3 * tile + i] ?? 0)));
    count++;
  });
  const mean = sums.map((sum) => sum / Math.max(1, count));
  covered.forEach((isCovered, tile) => {
    if (isCovered === 0) colours.set(mean, 3 * tile);
  });
}

/** The pattern with the picture laid on it. */
export function laidOver(cells: Uint8Array, picture: Uint8Array): Uint8Array {
  return cells.map((wood, tile) => {
    const laid = picture[tile] ?? KEEPS;
    return laid === KEEPS ? wood : laid;
  });
}
