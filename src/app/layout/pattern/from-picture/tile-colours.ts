/** One colour a tile out of the pixels under it: their mean in linear light, which is what the eye sees from afar. */
import type { Grid } from '@shared/layout/cells';
import { frameGrid, type Crop, type PictureSize } from './crop';

/** Red, green, blue, opacity a pixel, row by row from the top, in sRGB; opacity is not looked at. */
export interface PicturePixels extends PictureSize {
  readonly data: Uint8ClampedArray;
}

export interface TiledPicture {
  /** Red, green, blue a tile, course by course from the bottom. */
  readonly colours: Uint8Array;
  /** 1 for tiles with picture under at least half of them, else 0. */
  readonly covered: Uint8Array;
}

/** The colours of a shell's tiles under the crop of a picture. `aspect` is that of the unrolled shell. */
export function tileColours(
  pixels: PicturePixels,
  { crop, aspect }: { readonly crop: Crop; readonly aspect: number },
  grid: Grid,
): TiledPicture {
  const tiles = grid.staves * grid.courses;
  const tiled = { colours: new Uint8Array(3 * tiles), covered: new Uint8Array(tiles) };
  // samples at most a pixel apart: exact where tiles are whole pixels, a fair mean everywhere else
  const across = samplesOver(crop.width / grid.staves);
  const down = samplesOver(crop.width / aspect / grid.courses);
  const columns = grid.staves * across;
  const rows = grid.courses * down;
  const { start, right, down: step } = frameGrid(crop, { size: pixels, aspect }, { columns, rows });
  const mean = new MeanColour(pixels);
  for (let tile = 0; tile < tiles; tile++) {
    const left = (tile % grid.staves) * across;
    const top = (grid.courses - 1 - Math.floor(tile / grid.staves)) * down;
    mean.begin();
    for (let row = top + 0.5; row < top + down; row++) {
      for (let column = left + 0.5; column < left + across; column++) {
        mean.add(
          start.x + column * right.x + row * step.x,
          start.y + column * right.y + row * step.y,
        );
      }
    }
    mean.write(tiled.colours, 3 * tile);
    tiled.covered[tile] = 2 * mean.count >= across * down ? 1 : 0;
  }
  return tiled;
}

function samplesOver(pixels: number): number {
  // a rounding error above a whole number is no further pixel
  return Math.max(1, Math.ceil(pixels - 1e-6));
}

class MeanColour {
  count = 0;
  private red = 0;
  private green = 0;
  private blue = 0;

  constructor(private readonly pixels: PicturePixels) {}

  begin(): void {
    this.count = this.red = this.green = this.blue = 0;
  }

  /** Counts the pixel at a place in; beyond the picture there is none. */
  add(x: number, y: number): void {
    const { width, height, data } = this.pixels;
    const [column, row] = [Math.floor(x), Math.floor(y)];
    if (column < 0 || row < 0 || column >= width || row >= height) return;
    const at = 4 * (row * width + column);
    this.red += LIGHT[data[at] ?? 0] ?? 0;
    this.green += LIGHT[data[at + 1] ?? 0] ?? 0;
    this.blue += LIGHT[data[at + 2] ?? 0] ?? 0;
    this.count++;
  }

  write(colours: Uint8Array, at: number): void {
    const share = 1 / Math.max(1, this.count);
    colours[at] = byteOf(this.red * share);
    colours[at + 1] = byteOf(this.green * share);
    colours[at + 2] = byteOf(this.blue * share);
  }
}

/** Light of each byte of sRGB, 0 to 1 (IEC 61966-2-1). */
const LIGHT = Float64Array.from({ length: 256 }, (_, byte) => {
  const value = byte / 255;
  return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
});

/** The byte of sRGB for a light of 0 to 1. */
function byteOf(light: number): number {
  const value = light <= 0.003_130_8 ? 12.92 * light : 1.055 * light ** (1 / 2.4) - 0.055;
  return Math.round(255 * value);
}
