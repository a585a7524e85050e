/**
 * Where the shell is cut out of a picture. The picture is turned about its middle; the frame stays upright
 * over it and keeps the proportions of the unrolled shell. Places are pixels of the picture from its middle,
 * x to the right and y down, as they lie once it is turned.
 */

export interface PictureSize {
  readonly width: number;
  readonly height: number;
}

export interface Crop {
  /** Degrees the picture is turned clockwise, −180 up to 180. */
  readonly turn: number;
  /** The middle of the frame. */
  readonly x: number;
  readonly y: number;
  /** Of the frame; its height follows from the proportions. */
  readonly width: number;
}

/** A picture and how many times as wide as high the frame over it is. */
export interface Framed {
  readonly size: PictureSize;
  readonly aspect: number;
}

/** Width over height of an unrolled shell. */
export function aspectOf(shell: {
  readonly staves: number;
  readonly courses: number;
  readonly tileWidth: number;
  readonly tileHeight: number;
}): number {
  return (shell.staves * shell.tileWidth) / (shell.courses * shell.tileHeight);
}

/** The box round the turned picture. */
export function turnedSize({ width, height }: PictureSize, turn: number): PictureSize {
  const { cos, sin } = angleOf(turn);
  const [across, up] = [Math.abs(cos), Math.abs(sin)];
  return { width: width * across + height * up, height: width * up + height * across };
}

/** The largest frame inside the picture, in its middle: nothing of the shell stays without picture. */
export function fillingCrop({ size, aspect }: Framed, turn = 0): Crop {
  const { cos, sin } = angleOf(turn);
  const [across, up] = [Math.abs(cos), Math.abs(sin)];
  // a frame w wide turned within the picture takes w·across + w/aspect·up of its width, and likewise of its height
  const width = Math.min(size.width / (across + up / aspect), size.height / (up + across / aspect));
  return { turn, x: 0, y: 0, width };
}

/** The smallest frame round the whole picture. */
export function wholeCrop({ size, aspect }: Framed, turn = 0): Crop {
  return { turn, x: 0, y: 0, width: containingWidth({ size, aspect }, turn) };
}

function containingWidth({ size, aspect }: Framed, turn: number): number {
  const box = turnedSize(size, turn);
  return Math.max(box.width, box.height * aspect);
}

/** The narrowest and the widest frame: down to a few pixels, up to a little more than the whole picture. */
export function widthBounds(framed: Framed, turn: number): { least: number; most: number } {
  const most = 1.25 * containingWidth(framed, turn);
  const least = Math.min(most, LEAST_SIDE_PX * Math.max(1, framed.aspect));
  return { least, most };
}

const LEAST_SIDE_PX = 4;

/** The crop brought within its bounds: its middle stays on the picture. */
export function heldCrop(crop: Crop, framed: Framed): Crop {
  const { least, most } = widthBounds(framed, crop.turn);
  const { width, height } = framed.size;
  const middle = unturned(crop, crop.turn);
  const held = {
    x: between(middle.x, -width / 2, width / 2),
    y: between(middle.y, -height / 2, height / 2),
  };
  return { turn: crop.turn, ...turned(held, crop.turn), width: between(crop.width, least, most) };
}

/** The crop with its frame moved. */
export function movedCrop(crop: Crop, by: Point, framed: Framed): Crop {
  return heldCrop({ ...crop, x: crop.x + by.x, y: crop.y + by.y }, framed);
}

/** The crop with its frame so many times as wide, about its middle. */
export function zoomedCrop(crop: Crop, factor: number, framed: Framed): Crop {
  return heldCrop({ ...crop, width: crop.width * factor }, framed);
}

/** The crop with the picture turned to an angle; the same place of the picture stays in the middle. */
export function turnedCrop(crop: Crop, turn: number, framed: Framed): Crop {
  const around = ((((turn + 180) % 360) + 360) % 360) - 180;
  const middle = turned(unturned(crop, crop.turn), around);
  return heldCrop({ turn: around, ...middle, width: crop.width }, framed);
}

/** How a crop is turned: whole quarters, and what it leans beyond them (−45° up to 45°). */
export function quartersAndLean(turn: number): { quarters: number; lean: number } {
  const quarters = Math.round(turn / 90);
  return { quarters, lean: turn - 90 * quarters };
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** The frame's grid in pixels of the unturned picture, from its upper left corner: start, step right, step down. */
export interface FrameGrid {
  readonly start: Point;
  readonly right: Point;
  readonly down: Point;
}

/** The frame cut into columns and rows; steps are one column and one row long. */
export function frameGrid(
  crop: Crop,
  { size, aspect }: Framed,
  { columns, rows }: { readonly columns: number; readonly rows: number },
): FrameGrid {
  const [width, height] = [crop.width, crop.width / aspect];
  const corner = unturned({ x: crop.x - width / 2, y: crop.y - height / 2 }, crop.turn);
  return {
    start: { x: corner.x + size.width / 2, y: corner.y + size.height / 2 },
    right: unturned({ x: width / columns, y: 0 }, crop.turn),
    down: unturned({ x: 0, y: height / rows }, crop.turn),
  };
}

function turned({ x, y }: Point, turn: number): Point {
  const { cos, sin } = angleOf(turn);
  return { x: x * cos - y * sin, y: x * sin + y * cos };
}

function unturned(point: Point, turn: number): Point {
  return turned(point, -turn);
}

/** Quarter turns without a rounding error, so that their pixels are met exactly. */
function angleOf(turn: number): { cos: number; sin: number } {
  const quarters = turn / 90;
  if (Number.isInteger(quarters)) {
    const quarter = ((quarters % 4) + 4) % 4;
    return { cos: [1, 0, -1, 0][quarter] ?? 1, sin: [0, 1, 0, -1][quarter] ?? 0 };
  }
  const radians = (turn * Math.PI) / 180;
  return { cos: Math.cos(radians), sin: Math.sin(radians) };
}

function between(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value));
}
