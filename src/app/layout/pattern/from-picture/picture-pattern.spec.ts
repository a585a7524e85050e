import { describe, expect, it } from 'vitest';
import { fillingCrop, wholeCrop } from './crop';
import { KEEPS, laidOver, picturePattern, type PatternWish } from './picture-pattern';
import type { PicturePixels } from './tile-colours';

const WOODS = [
  { wood: 0, colour: '#F0E0C0', weight: 1 },
  { wood: 2, colour: '#503020', weight: 1 },
];

/** Light at the left, dark at the right. */
function halves(width: number, height: number): PicturePixels {
  const data = new Uint8ClampedArray(4 * width * height);
  for (let i = 0; i < width * height; i++) {
    data.set(i % width < width / 2 ? [240, 224, 192, 255] : [80, 48, 32, 255], 4 * i);
  }
  return { width, height, data };
}

function wishFor(pixels: PicturePixels, framing: typeof fillingCrop): PatternWish {
  const grid = { staves: 12, courses: 3 };
  const framed = { size: pixels, aspect: 4 };
  const rest = { aspect: 4, grid, dithering: 'plain', contrast: 1, woods: WOODS } as const;
  return { crop: framing(framed), ...rest };
}

describe('a picture as a pattern', () => {
  it('is laid in the woods of its colours', () => {
    const pixels = halves(120, 30);
    const row = [0, 0, 0, 0, 0, 0, 2, 2, 2, 2, 2, 2];
    const pattern = picturePattern(pixels, wishFor(pixels, fillingCrop));
    expect([...pattern]).toEqual([...row, ...row, ...row]);
  });

  it('leaves the tiles beyond it alone, whatever wood they have', () => {
    const pixels = halves(24, 20);
    const pattern = picturePattern(pixels, wishFor(pixels, wholeCrop));
    const row = [KEEPS, KEEPS, KEEPS, KEEPS, 0, 0, 2, 2, KEEPS, KEEPS, KEEPS, KEEPS];
    expect([...pattern]).toEqual([...row, ...row, ...row]);
    const before = new Uint8Array(36).fill(1);
    const laid = [1, 1, 1, 1, 0, 0, 2, 2, 1, 1, 1, 1];
    expect([...laidOver(before, pattern)]).toEqual([...laid, ...laid, ...laid]);
  });
});
