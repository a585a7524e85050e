/**
 * Tiles painted onto a canvas in device pixels. What is drawn follows from the size of a tile on the
 * screen: under 6 px runs of plain rectangles, then outlines in plain colour, from 14 px with grain.
 */
import { TEXTURE_PX, TEXTURE_TILES } from '../grain/grain-texture';
import { cellAt } from '@shared/layout/cells';
import type { TileRange } from './chunk-grid';
import type { SheetDrawing } from './sheet-drawing';

export type NumbersShown = 'shown' | 'hidden';

/** A wood as it is painted. */
export interface WoodPaint {
  readonly colour: string;
  /** Its grain, one texture over `TEXTURE_TILES` tile widths; null when there is no picture of it. */
  readonly texture: HTMLCanvasElement | null;
}

/** Everything that shows on tiles. */
export interface Scene {
  readonly drawing: SheetDrawing;
  readonly cells: Uint8Array;
  readonly woods: readonly WoodPaint[];
  readonly numbers: NumbersShown;
}

/** Where the sheet lies on a canvas, all in device pixels. */
export interface Placement {
  readonly pxPerMm: number;
  /** x of the seam. */
  readonly seamX: number;
  /** y of the untrimmed top of the sheet. */
  readonly topY: number;
  /** Device pixels a CSS pixel. */
  readonly ratio: number;
}

export interface PaintedTile {
  readonly stave: number;
  readonly course: number;
}

const RECTANGLES_UNDER_PX = 6;
const GRAIN_FROM_PX = 14;
const NUMBERS_FROM_PX = 18;
const INK = 'rgb(18 23 30 / 92%)';

/** Least side of a tile on the screen in CSS pixels. */
export function tilePx(drawing: SheetDrawing, { pxPerMm, ratio }: Placement): number {
  return (Math.min(drawing.tileWidth, drawing.tileHeight) * pxPerMm) / ratio;
}

/** Paints every tile of a range. */
export function paintRange(
  context: CanvasRenderingContext2D,
  scene: Scene,
  placement: Placement,
  range: TileRange,
): void {
  if (tilePx(scene.drawing, placement) < RECTANGLES_UNDER_PX) {
    paintRuns(context, scene, placement, range);
  } else {
    paintTiles(context, scene, placement, tilesOf(range));
  }
}

/** Paints single tiles: fills first, then the joints, so that every joint line lies on top. */
export function paintTiles(
  context: CanvasRenderingContext2D,
  scene: Scene,
  placement: Placement,
  tiles: readonly PaintedTile[],
): void {
  const size = tilePx(scene.drawing, placement);
  if (size < RECTANGLES_UNDER_PX) {
    for (const { stave, course } of tiles) {
      paintRuns(context, scene, placement, {
        staveFrom: stave,
        staveTo: stave + 1,
        courseFrom: course,
        courseTo: course + 1,
      });
    }
    return;
  }
  fillTiles(context, scene, placement, tiles, grainPatterns(context, scene, size));
  strokeJoints(context, scene.drawing, placement, tiles, Math.min(1.15, size / 22 + 0.25));
  if (scene.numbers === 'shown' && size >= NUMBERS_FROM_PX) {
    paintNumbers(context, scene, placement, tiles);
  }
  context.setTransform(1, 0, 0, 1, 0, 0);
}

function tilesOf(range: TileRange): PaintedTile[] {
  const tiles: PaintedTile[] = [];
  for (let course = range.courseFrom; course < range.courseTo; course++) {
    for (let stave = range.staveFrom; stave < range.staveTo; stave++) tiles.push({ stave, course });
  }
  return tiles;
}

/** Neighbouring tiles of one wood as one rectangle, its sides on whole pixels so that no gap shows. */
function paintRuns(
  context: CanvasRenderingContext2D,
  { drawing, cells, woods }: Scene,
  { pxPerMm, seamX, topY }: Placement,
  range: TileRange,
): void {
  const { grid, tileWidth, tileHeight, size } = drawing;
  const xOf = (stave: number): number => Math.round(seamX + stave * tileWidth * pxPerMm);
  const yOf = (course: number): number =>
    Math.round(topY + (size.height - course * tileHeight) * pxPerMm);
  for (let course = range.courseFrom; course < range.courseTo; course++) {
    const top = yOf(course + 1);
    const height = yOf(course) - top;
    let from = range.staveFrom;
    while (from < range.staveTo) {
      const wood = cells[cellAt(grid, from, course)];
      let to = from + 1;
      while (to < range.staveTo && cells[cellAt(grid, to, course)] === wood) to++;
      context.fillStyle = woods[wood ?? 0]?.colour ?? INK;
      context.fillRect(xOf(from), top, xOf(to) - xOf(from), height);
      from = to;
    }
  }
}

type GrainPatterns = readonly (CanvasPattern | null)[];

function grainPatterns(
  context: CanvasRenderingContext2D,
  { woods }: Scene,
  sizePx: number,
): GrainPatterns {
  if (sizePx < GRAIN_FROM_PX) return [];
  return woods.map(({ texture }) => texture && context.createPattern(texture, 'repeat'));
}

function fillTiles(
  context: CanvasRenderingContext2D,
  { drawing, cells, woods }: Scene,
  placement: Placement,
  tiles: readonly PaintedTile[],
  patterns: GrainPatterns,
): void {
  const phases = patterns.length > 0 ? grainPhases(drawing) : [];
  for (const { stave, course } of tiles) {
    const position = cellAt(drawing.grid, stave, course);
    const wood = cells[position] ?? 0;
    const pattern = patterns[wood];
    if (pattern) pattern.setTransform(phases[(position * 7) % phases.length]);
    context.fillStyle = pattern ?? woods[wood]?.colour ?? INK;
    moveTo(context, drawing, placement, stave, course);
    context.fill(drawing.pathsAt(stave, course).whole);
  }
}

/** Places of the texture under a tile: neighbours are cut from other places of the board. */
function grainPhases({ tileWidth, tileHeight }: SheetDrawing): DOMMatrix[] {
  const scale = (tileWidth * TEXTURE_TILES) / TEXTURE_PX;
  return [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12].map(
    (i) =>
      new DOMMatrix([scale, 0, 0, scale, -tileWidth * (0.5 + i * 0.37), -tileHeight * i * 0.61]),
  );
}

function strokeJoints(
  context: CanvasRenderingContext2D,
  drawing: SheetDrawing,
  placement: Placement,
  tiles: readonly PaintedTile[],
  width: number,
): void {
  context.strokeStyle = INK;
  context.lineWidth = (width * placement.ratio) / placement.pxPerMm;
  context.lineJoin = 'round';
  for (const { stave, course } of tiles) {
    moveTo(context, drawing, placement, stave, course);
    context.stroke(drawing.pathsAt(stave, course).joints);
  }
}

function moveTo(
  context: CanvasRenderingContext2D,
  drawing: SheetDrawing,
  { pxPerMm, seamX, topY }: Placement,
  stave: number,
  course: number,
): void {
  const { tileWidth, tileHeight, size } = drawing;
  context.setTransform(
    pxPerMm,
    0,
    0,
    pxPerMm,
    seamX + (stave + 0.5) * tileWidth * pxPerMm,
    topY + (size.height - (course + 0.5) * tileHeight) * pxPerMm,
  );
}

function paintNumbers(
  context: CanvasRenderingContext2D,
  { drawing, cells }: Scene,
  placement: Placement,
  tiles: readonly PaintedTile[],
): void {
  const { grid, tileWidth, tileHeight, size } = drawing;
  const { pxPerMm, seamX, topY, ratio } = placement;
  const px = Math.min(13, tilePx(drawing, placement) * 0.36) * ratio;
  context.setTransform(1, 0, 0, 1, 0, 0);
  context.font = `800 ${px}px Nunito, sans-serif`;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  for (const { stave, course } of tiles) {
    const x = seamX + (stave + 0.5) * tileWidth * pxPerMm;
    const y = topY + (size.height - (course + 0.5) * tileHeight) * pxPerMm;
    const number = (cells[cellAt(grid, stave, course)] ?? 0) + 1;
    const half = px * (number > 9 ? 0.85 : 0.65);
    context.fillStyle = 'rgb(255 253 249 / 86%)';
    context.beginPath();
    context.roundRect(x - half, y - px * 0.65, 2 * half, px * 1.3, px * 0.4);
    context.fill();
    context.fillStyle = '#1e2a36';
    context.fillText(String(number), x, y + px * 0.06);
  }
}
