/** What lies over the tiles: the far side's veil, seam, trim lines, letters and numbers, and what the next touch changes. */
import { courseLetters, tileOf } from '@shared/layout/cells';
import type { Tile } from '@shared/layout/extent';
import type { Millimetres } from '@shared/units/length';
import { MOST_OUTLINED, paintManyMarks } from './many-marks';
import type { SheetDrawing, TilePaths } from './sheet-drawing';
import { toScreen, turnsInView, type InsetsPx, type SizePx, type Viewport } from './viewport';

/** Colours of the theme, as the canvas takes them. */
export interface CanvasColours {
  readonly paper: string;
  readonly ink: string;
  readonly mute: string;
  readonly teal: string;
  readonly tealInk: string;
  readonly stop: string;
}

/** Where the turned ends are cut off, measured from the untrimmed bottom, and the words for it. */
export interface TrimLines {
  readonly bottom: Millimetres;
  readonly top: Millimetres;
  readonly words: string;
}

/** Where somebody else is on the pattern. */
export interface PersonMark {
  readonly tile: Tile;
  readonly initials: string;
  readonly colour: string;
}

export interface OverlayState {
  /** Positions the next touch will change. */
  readonly preview: readonly number[];
  /** Where the keyboard stands. */
  readonly cursor: Tile | null;
  /** Tiles somebody else laid too, mine on top. */
  readonly overlaid: ReadonlySet<number>;
  readonly people: readonly PersonMark[];
  readonly trim: TrimLines | null;
}

/** Room around the shell for numbers, letters and words. */
export const INSETS: InsetsPx = { top: 40, right: 28, bottom: 44, left: 44 };

export interface OverlayFrame {
  readonly drawing: SheetDrawing;
  readonly view: Viewport;
  readonly size: SizePx;
  readonly colours: CanvasColours;
  readonly state: OverlayState;
}

type Context = CanvasRenderingContext2D;

/** Paints the overlay; the context's unit is the CSS pixel. */
export function paintOverlay(context: Context, frame: OverlayFrame): void {
  paintVeil(context, frame);
  paintTileMarks(context, frame);
  const free = paintTrim(context, frame);
  paintSeam(context, frame, free);
  paintStaveNumbers(context, frame);
  paintCourseLetters(context, frame);
  paintInitials(context, frame);
}

/** Top and bottom of the sheet on the screen. */
function sheetSpan({ drawing, view }: OverlayFrame): { top: number; bottom: number } {
  return {
    top: toScreen(view, { x: 0, y: drawing.size.height }).y,
    bottom: toScreen(view, { x: 0, y: 0 }).y,
  };
}

/** The far side: what is beyond the seam from the middle of the window shows paler. */
function paintVeil(context: Context, frame: OverlayFrame): void {
  const { drawing, view, size, colours } = frame;
  const { top, bottom } = sheetSpan(frame);
  const from = toScreen(view, { x: 0, y: 0 }).x;
  const to = toScreen(view, { x: drawing.size.circumference, y: 0 }).x;
  context.globalAlpha = 0.48;
  context.fillStyle = colours.paper;
  if (from > 0) context.fillRect(0, top - 1, from, bottom - top + 2);
  if (to < size.width) context.fillRect(to, top - 1, size.width - to, bottom - top + 2);
  context.globalAlpha = 1;
}

/** The seam on every turn in view, with its words where they end before `free`. */
function paintSeam(context: Context, frame: OverlayFrame, free: number): void {
  const { drawing, view, size, colours } = frame;
  const { top, bottom } = sheetSpan(frame);
  const words = `seam: stave ${drawing.grid.staves} meets stave 1`;
  for (const turn of turnsInView(view, size, drawing.size)) {
    const x = toScreen(view, { x: turn * drawing.size.circumference, y: 0 }).x;
    if (x < -200 || x > size.width + 10) continue;
    line(context, { x, y: Math.max(0, top - 30) }, { x, y: bottom + 14 }, colours.teal, {
      width: 2,
      dash: [5, 5],
    });
    const y = Math.min(bottom + 22, size.height - 12);
    if (x + 16 + widthOf(context, words) > free) continue;
    label(context, words, { x: x + 6, y }, { colour: colours.tealInk, paper: colours.paper });
  }
}

/** The trim lines with their words at the right; answers up to where the row of words is free. */
function paintTrim(context: Context, frame: OverlayFrame): number {
  const { view, size, colours, state } = frame;
  if (!state.trim) return size.width;
  const heights = [state.trim.bottom, state.trim.top].map(
    (height) => Math.round(toScreen(view, { x: 0, y: height }).y) + 0.5,
  );
  if (heights.every((y) => y < 0 || y > size.height)) return size.width;
  for (const y of heights) {
    line(context, { x: 0, y }, { x: size.width, y }, 'rgb(255 253 249 / 70%)', { width: 2.6 });
    line(context, { x: 0, y }, { x: size.width, y }, '#b3261e', { width: 1.6, dash: [2, 4] });
  }
  const y = Math.min(sheetSpan(frame).bottom + 22, size.height - 12);
  const right = { x: size.width - 14, y };
  label(context, state.trim.words, right, {
    colour: colours.stop,
    paper: colours.paper,
    align: 'right',
  });
  return right.x - widthOf(context, state.trim.words) - 10;
}

interface LineStyle {
  readonly width: number;
  readonly dash?: readonly number[];
}

interface ScreenPoint {
  readonly x: number;
  readonly y: number;
}

function line(
  context: Context,
  from: ScreenPoint,
  to: ScreenPoint,
  colour: string,
  { width, dash = [] }: LineStyle,
): void {
  context.beginPath();
  context.setLineDash([...dash]);
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.moveTo(from.x, from.y);
  context.lineTo(to.x, to.y);
  context.stroke();
  context.setLineDash([]);
}

interface LabelStyle {
  readonly colour: string;
  readonly paper: string;
  readonly align?: 'left' | 'right';
}

const WORDS_FONT = '800 12.5px Nunito, sans-serif';

function widthOf(context: Context, words: string): number {
  context.font = WORDS_FONT;
  return context.measureText(words).width;
}

/** Words on a patch of paper, so that they can be read wherever they lie. */
function label(
  context: Context,
  words: string,
  { x, y }: ScreenPoint,
  { colour, paper, align = 'left' }: LabelStyle,
): void {
  const width = widthOf(context, words);
  context.textBaseline = 'middle';
  context.textAlign = align;
  context.fillStyle = paper;
  context.globalAlpha = 0.88;
  context.beginPath();
  context.roundRect(align === 'left' ? x - 5 : x - width - 5, y - 10, width + 10, 20, 6);
  context.fill();
  context.globalAlpha = 1;
  context.fillStyle = colour;
  context.fillText(words, x, y + 1);
}

function paintTileMarks(context: Context, frame: OverlayFrame): void {
  const { drawing, view, size } = frame;
  const many = frame.state.preview.length > MOST_OUTLINED;
  if (many) paintManyMarks(context, frame, frame.state.preview, frame.colours.teal);
  const marks = marksOf(many ? { ...frame, state: { ...frame.state, preview: [] } } : frame);
  if (marks.length === 0) return;
  const plain = Math.min(drawing.tileWidth, drawing.tileHeight) * view.pxPerMm < 8;
  for (const turn of turnsInView(view, size, drawing.size)) {
    for (const { tile, colour, width, fill } of marks) {
      const x = turn * drawing.size.circumference + (tile.stave + 0.5) * drawing.tileWidth;
      const centre = toScreen(view, { x, y: (tile.course + 0.5) * drawing.tileHeight });
      if (!nearWindow(frame, centre)) continue;
      context.save();
      context.translate(centre.x, centre.y);
      context.scale(view.pxPerMm, view.pxPerMm);
      const path = plain ? plainTile(drawing) : drawing.pathsAt(tile.stave, tile.course).whole;
      strokeMark(context, path, { colour, width: width / view.pxPerMm, fill });
      context.restore();
    }
  }
}

interface TileMark {
  readonly tile: Tile;
  readonly colour: string;
  readonly width: number;
  /** Share of the colour that also covers the tile. */
  readonly fill: number;
}

function marksOf({ drawing, colours, state }: OverlayFrame): TileMark[] {
  const mark = (colour: string, width: number, fill: number) => (position: number) => ({
    tile: tileOf(drawing.grid, position),
    colour,
    width,
    fill,
  });
  const cursor = state.cursor
    ? [{ tile: state.cursor, colour: colours.ink, width: 5, fill: 0 }]
    : [];
  return [
    ...state.people.map(({ tile, colour }) => ({ tile, colour, width: 2.5, fill: 0.12 })),
    ...[...state.overlaid].map(mark('#b26a00', 2.5, 0)),
    ...state.preview.map(mark(colours.teal, 2.5, 0.28)),
    ...cursor,
    ...cursor.map((mine) => ({ ...mine, colour: colours.teal, width: 3 })),
  ];
}

const INITIALS_FONT = '800 10px Nunito, sans-serif';
const DISC_PX = 9;

/** A disc with initials at the corner of every tile somebody else is on. */
function paintInitials(context: Context, frame: OverlayFrame): void {
  const { drawing, view, size, state } = frame;
  context.font = INITIALS_FONT;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  for (const turn of turnsInView(view, size, drawing.size)) {
    for (const { tile, initials, colour } of state.people) {
      const x = turn * drawing.size.circumference + (tile.stave + 1) * drawing.tileWidth;
      const corner = toScreen(view, { x, y: (tile.course + 1) * drawing.tileHeight });
      if (!nearWindow(frame, corner)) continue;
      context.fillStyle = colour;
      context.beginPath();
      context.arc(corner.x, corner.y, DISC_PX, 0, 2 * Math.PI);
      context.fill();
      context.fillStyle = '#ffffff';
      context.fillText(initials, corner.x, corner.y + 0.5);
    }
  }
}

function strokeMark(
  context: Context,
  path: Path2D,
  { colour, width, fill }: { colour: string; width: number; fill: number },
): void {
  if (fill > 0) {
    context.globalAlpha = fill;
    context.fillStyle = colour;
    context.fill(path);
    context.globalAlpha = 1;
  }
  context.lineJoin = 'round';
  context.strokeStyle = 'rgb(255 253 249 / 75%)';
  context.lineWidth = width * 1.9;
  context.stroke(path);
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.stroke(path);
}

function plainTile({ tileWidth, tileHeight }: SheetDrawing): TilePaths['whole'] {
  const path = new Path2D();
  path.rect(-tileWidth / 2, -tileHeight / 2, tileWidth, tileHeight);
  return path;
}

function nearWindow({ drawing, view, size }: OverlayFrame, centre: ScreenPoint): boolean {
  const margin = Math.max(drawing.tileWidth, drawing.tileHeight) * view.pxPerMm;
  return (
    centre.x > -margin &&
    centre.x < size.width + margin &&
    centre.y > -margin &&
    centre.y < size.height + margin
  );
}

/** Every how many staves or courses a number is written so that they keep so many pixels apart. */
function stepFor(tilePx: number, leastPx: number): number {
  return [1, 2, 5, 10, 20, 50, 100].find((step) => step * tilePx >= leastPx) ?? 200;
}

/** Stave numbers: over the shell, or held at the upper border while the shell runs out of it. */
function paintStaveNumbers(context: Context, frame: OverlayFrame): void {
  const { drawing, view, size, colours } = frame;
  const { staves } = drawing.grid;
  const tile = drawing.tileWidth * view.pxPerMm;
  const step = stepFor(tile, 26);
  const { top } = sheetSpan(frame);
  const y = Math.max(14, top - 16);
  if (top < y + 16) paintBand(context, frame, y);
  context.font = '700 12.5px Nunito, sans-serif';
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillStyle = colours.mute;
  context.strokeStyle = colours.paper;
  context.lineWidth = 5;
  context.lineJoin = 'round';
  const first = Math.floor(view.leftMm / drawing.tileWidth);
  const last = Math.ceil((view.leftMm + size.width / view.pxPerMm) / drawing.tileWidth);
  for (let stave = first; stave <= last; stave++) {
    const number = (((stave % staves) + staves) % staves) + 1;
    if (number !== 1 && number % step !== 0) continue;
    if (number !== 1 && staves + 1 - number < step * 0.7) continue;
    const x = toScreen(view, { x: (stave + 0.5) * drawing.tileWidth, y: 0 }).x;
    if (step > 1) context.strokeText(String(number), x, y + 1);
    context.fillText(String(number), x, y + 1);
  }
}

/** Paper under the numbers while they lie on the tiles. */
function paintBand(context: Context, { size, colours }: OverlayFrame, y: number): void {
  context.globalAlpha = 0.9;
  context.fillStyle = colours.paper;
  context.fillRect(0, y - 14, size.width, 28);
  context.globalAlpha = 1;
}

/** Course letters stay at the left border, each on a patch of paper. */
function paintCourseLetters(context: Context, frame: OverlayFrame): void {
  const { drawing, view, size, colours } = frame;
  const step = stepFor(drawing.tileHeight * view.pxPerMm, 28);
  const { bottom } = sheetSpan(frame);
  context.font = '800 12.5px Nunito, sans-serif';
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  for (let course = 0; course < drawing.grid.courses; course += step) {
    const middle = toScreen(view, { x: 0, y: (course + 0.5) * drawing.tileHeight }).y;
    const y = Math.min(middle, bottom - 9);
    if (y < 30 || y > size.height - 8) continue;
    const letters = courseLetters(course);
    const half = 9 + (letters.length - 1) * 5;
    context.fillStyle = colours.paper;
    context.globalAlpha = 0.9;
    context.beginPath();
    context.roundRect(20 - half, y - 10, 2 * half, 20, 7);
    context.fill();
    context.globalAlpha = 1;
    context.fillStyle = colours.mute;
    context.fillText(letters, 20, y + 1);
  }
}
