import { describe, expect, it } from 'vitest';
import {
  aspectOf,
  fillingCrop,
  frameGrid,
  heldCrop,
  movedCrop,
  quartersAndLean,
  turnedCrop,
  turnedSize,
  wholeCrop,
  widthBounds,
  zoomedCrop,
  type Crop,
  type Framed,
} from './crop';

const LANTERN = { staves: 32, courses: 9, tileWidth: 28, tileHeight: 28 };
const framed: Framed = { size: { width: 800, height: 600 }, aspect: aspectOf(LANTERN) };

/** The four corners of the frame in pixels of the unturned picture. */
function corners(crop: Crop, of: Framed = framed) {
  const { start, right, down } = frameGrid(crop, of, { columns: 1, rows: 1 });
  return [
    start,
    { x: start.x + right.x, y: start.y + right.y },
    { x: start.x + right.x + down.x, y: start.y + right.y + down.y },
    { x: start.x + down.x, y: start.y + down.y },
  ];
}

describe('the frame over a picture', () => {
  it('has the proportions of the unrolled shell', () => {
    expect(aspectOf(LANTERN)).toBeCloseTo(32 / 9, 12);
    expect(aspectOf({ ...LANTERN, tileWidth: 14 })).toBeCloseTo(16 / 9, 12);
  });

  it('fills a picture from edge to edge at first', () => {
    expect(fillingCrop(framed)).toEqual({ turn: 0, x: 0, y: 0, width: 800 });
    const tall = { ...framed, aspect: 0.5 };
    expect(fillingCrop(tall).width).toBe(300);
  });

  it.each([0, 10, 30, 45, 90, 135, -70])(
    'that fills touches the edges of a picture turned by %s° and stays within',
    (turn) => {
      const places = corners(fillingCrop(framed, turn));
      const overX = places.map(({ x }) => Math.max(-x, x - 800));
      const overY = places.map(({ y }) => Math.max(-y, y - 600));
      expect(Math.max(...overX, ...overY)).toBeCloseTo(0, 9);
    },
  );

  it('goes round the whole picture when that is wished', () => {
    expect(wholeCrop(framed).width).toBeCloseTo((600 * 32) / 9, 9);
    expect(wholeCrop({ ...framed, aspect: 0.5 }).width).toBe(800);
  });

  it('keeps its middle on the picture, however far it is moved', () => {
    const moved = movedCrop(fillingCrop(framed), { x: 5000, y: -5000 }, framed);
    expect([moved.x, moved.y]).toEqual([400, -300]);
    const leaning = movedCrop(fillingCrop(framed, 30), { x: 5000, y: 0 }, framed);
    const cos = Math.cos(Math.PI / 6);
    const along = { x: leaning.x * cos + leaning.y / 2, y: leaning.y * cos - leaning.x / 2 };
    expect(along.x).toBeCloseTo(400, 9);
    expect(along.y).toBeCloseTo(-300, 9);
  });

  it('is sized about its middle, between a few pixels and a little more than the picture', () => {
    const crop = { turn: 0, x: 100, y: 50, width: 200 };
    expect(zoomedCrop(crop, 1.5, framed)).toEqual({ ...crop, width: 300 });
    const { least, most } = widthBounds(framed, 0);
    expect(zoomedCrop(crop, 1e-9, framed).width).toBe(least);
    expect(zoomedCrop(crop, 1e9, framed).width).toBe(most);
    expect(most).toBeCloseTo(1.25 * wholeCrop(framed).width, 9);
  });

  it('can be laid on a picture of one pixel', () => {
    const dot: Framed = { size: { width: 1, height: 1 }, aspect: 32 / 9 };
    const crop = heldCrop(fillingCrop(dot), dot);
    expect(crop.width).toBeGreaterThan(0);
    expect(Number.isFinite(crop.width)).toBe(true);
  });
});

describe('turning a picture', () => {
  it('keeps the same place of it in the middle of the frame', () => {
    const crop = { turn: 0, x: 100, y: 50, width: 200 };
    const right = turnedCrop(crop, 90, framed);
    expect(right).toEqual({ turn: 90, x: -50, y: 100, width: 200 });
    expect(turnedCrop(right, 0, framed)).toEqual(crop);
  });

  it('by four quarters brings it back', () => {
    let crop: Crop = { turn: 0, x: 30, y: -20, width: 400 };
    for (let i = 0; i < 4; i++) crop = turnedCrop(crop, crop.turn + 90, framed);
    expect(crop).toEqual({ turn: 0, x: 30, y: -20, width: 400 });
  });

  it('goes round: 270° is a quarter to the left', () => {
    expect(turnedCrop(fillingCrop(framed), 270, framed).turn).toBe(-90);
    expect(turnedCrop(fillingCrop(framed), 180, framed).turn).toBe(-180);
  });

  it.each([
    [0, 0, 0],
    [12.5, 0, 12.5],
    [-90, -1, 0],
    [100, 1, 10],
    [-95, -1, -5],
  ])('by %s° is %s quarters and leans %s°', (turn, quarters, lean) => {
    const found = quartersAndLean(turn);
    expect([found.quarters + 0, found.lean + 0]).toEqual([quarters, lean]);
  });

  it('by a quarter swaps width and height of the box round it, exactly', () => {
    expect(turnedSize(framed.size, 90)).toEqual({ width: 600, height: 800 });
    expect(turnedSize(framed.size, 45).width).toBeCloseTo(1400 / Math.SQRT2, 9);
  });
});
