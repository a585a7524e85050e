import { describe, expect, it } from 'vitest';
import { fillingCrop, type Crop } from './crop';
import { tileColours, type PicturePixels } from './tile-colours';

type Grey = (x: number, y: number) => number;

/** A picture of greys; the channels can be told apart: red as it is, green half of it, blue none. */
function picture(width: number, height: number, grey: Grey): PicturePixels {
  const data = new Uint8ClampedArray(4 * width * height);
  for (let i = 0; i < width * height; i++) {
    const light = grey(i % width, Math.floor(i / width));
    data.set([light, light / 2, 0, 255], 4 * i);
  }
  return { width, height, data };
}

function reds(
  pixels: PicturePixels,
  crop: Crop,
  grid: { staves: number; courses: number },
): number[] {
  const aspect = grid.staves / grid.courses;
  const { colours } = tileColours(pixels, { crop, aspect }, grid);
  return Array.from({ length: grid.staves * grid.courses }, (_, tile) => colours[3 * tile] ?? -1);
}

describe('the colour of a tile', () => {
  it('is that of the pixel when each tile lies over one, bottom course first', () => {
    const pixels = picture(3, 2, (x, y) => 10 * x + 100 * y);
    const crop = fillingCrop({ size: pixels, aspect: 1.5 });
    expect(reds(pixels, crop, { staves: 3, courses: 2 })).toEqual([100, 110, 120, 0, 10, 20]);
  });

  it('is the mean of the light, not of the figures: black and white in turn give 188', () => {
    const pixels = picture(8, 8, (x, y) => ((x + y) % 2) * 255);
    const crop = fillingCrop({ size: pixels, aspect: 1 });
    expect(reds(pixels, crop, { staves: 2, courses: 2 })).toEqual([188, 188, 188, 188]);
  });

  it('keeps the channels apart', () => {
    const pixels = picture(2, 2, () => 200);
    const crop = fillingCrop({ size: pixels, aspect: 1 });
    const { colours } = tileColours(pixels, { crop, aspect: 1 }, { staves: 1, courses: 1 });
    expect([...colours]).toEqual([200, 100, 0]);
  });

  it('is the mean of every pixel under it exactly, where tiles are whole pixels', () => {
    const pixels = picture(20, 10, (x, y) => (37 * x + 91 * y) % 256);
    const crop = fillingCrop({ size: pixels, aspect: 2 });
    const mean = (fromX: number, fromY: number): number => {
      let sum = 0;
      for (let y = fromY; y < fromY + 5; y++) {
        for (let x = fromX; x < fromX + 5; x++) {
          const value = ((37 * x + 91 * y) % 256) / 255;
          sum += value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
        }
      }
      return Math.round(255 * (1.055 * (sum / 25) ** (1 / 2.4) - 0.055));
    };
    const expected = [5, 0].flatMap((y) => [0, 5, 10, 15].map((x) => mean(x, y)));
    expect(reds(pixels, crop, { staves: 4, courses: 2 })).toEqual(expected);
  });

  it.each([
    [90, [100, 0, 110, 10, 120, 20]],
    [180, [120, 110, 100, 20, 10, 0]],
    [-90, [20, 120, 10, 110, 0, 100]],
  ])('follows a turn by %s° pixel by pixel (listed from the top)', (turn, expected) => {
    const pixels = picture(3, 2, (x, y) => 10 * x + 100 * y);
    const upright = Math.abs(turn) === 90 ? { staves: 2, courses: 3 } : { staves: 3, courses: 2 };
    const aspect = upright.staves / upright.courses;
    const crop = fillingCrop({ size: pixels, aspect }, turn);
    const { staves } = upright;
    const laid = reds(pixels, crop, upright);
    const fromTop = Array.from({ length: upright.courses }, (_, row) =>
      laid.slice((upright.courses - 1 - row) * staves, (upright.courses - row) * staves),
    ).flat();
    expect(fromTop).toEqual(expected);
  });

  it('of a leaning picture is that of the place under it', () => {
    const pixels = picture(400, 400, (x) => (x < 200 ? 0 : 255));
    const crop = { turn: 20, x: 0, y: 0, width: 200 };
    const [lowerLeft, lowerRight, upperLeft, upperRight] = reds(pixels, crop, {
      staves: 2,
      courses: 2,
    });
    // turned clockwise, the edge between black and white leans to the right at its top
    expect(lowerLeft).toBeGreaterThan(50);
    expect(lowerRight).toBe(255);
    expect(upperLeft).toBe(0);
    expect(upperRight).toBeLessThan(250);
  });
});

describe('tiles beyond the picture', () => {
  it('are told apart; those half on it count as covered', () => {
    const pixels = picture(40, 10, () => 90);
    const crop = { turn: 0, x: 0, y: 0, width: 80 };
    const { covered } = tileColours(pixels, { crop, aspect: 8 }, { staves: 8, courses: 1 });
    expect([...covered]).toEqual([0, 0, 1, 1, 1, 1, 0, 0]);
    const shifted = { ...crop, x: 5 };
    const half = tileColours(pixels, { crop: shifted, aspect: 8 }, { staves: 8, courses: 1 });
    expect([...half.covered]).toEqual([0, 1, 1, 1, 1, 1, 0, 0]);
  });

  it('take no part in the colour of those half on it', () => {
    const pixels = picture(40, 10, () => 90);
    const crop = { turn: 0, x: 5, y: 0, width: 80 };
    const laid = reds(pixels, crop, { staves: 8, courses: 1 });
    expect(laid[1]).toBe(90);
  });
});
