/**
 * One generation of chunk bitmaps: the sheet drawn at one scale. Bitmaps lie on whole device pixels of the
 * sheet and reach a pixel over their borders, so that at the scale they were drawn for they are copied to
 * the screen without resampling and no seam shows between them.
 */
import { chunkGrid, tilesDrawnFor, tilesOfChunk, CHUNK_SPAN, type ChunkGrid } from './chunk-grid';
import type { SheetDrawing } from './sheet-drawing';
import { paintRange, type Scene } from './tile-painting';

/** Longest side of a bitmap in device pixels; chunks hold fewer tiles rather than grow beyond it. */
const LONGEST_SIDE_PX = 1536;
const BLEED_PX = 1;

export interface RasterScale {
  /** CSS pixels a millimetre. */
  readonly pxPerMm: number;
  /** Device pixels a CSS pixel. */
  readonly ratio: number;
}

/** A bitmap's place on the sheet in device pixels, from the seam and the top. */
export interface ChunkBox {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

export interface ChunkRaster {
  readonly scale: RasterScale;
  readonly chunks: ChunkGrid;
  readonly boxes: readonly ChunkBox[];
}

/** The cut of a sheet into bitmaps for a scale. */
export function chunkRaster(drawing: SheetDrawing, scale: RasterScale): ChunkRaster {
  const chunks = chunkGrid(drawing.grid, spanFor(drawing, scale), drawing.reach);
  const count = chunks.columns * chunks.rows;
  const boxes = Array.from({ length: count }, (_, chunk) => boxOf(drawing, scale, chunks, chunk));
  return { scale, chunks, boxes };
}

function spanFor({ tileWidth, tileHeight }: SheetDrawing, { pxPerMm, ratio }: RasterScale): number {
  const side = Math.max(tileWidth, tileHeight) * pxPerMm * ratio;
  let span = CHUNK_SPAN;
  while (span > 1 && span * side > LONGEST_SIDE_PX) span /= 2;
  return span;
}

function boxOf(
  { tileWidth, tileHeight, size }: SheetDrawing,
  { pxPerMm, ratio }: RasterScale,
  chunks: ChunkGrid,
  chunk: number,
): ChunkBox {
  const range = tilesOfChunk(chunks, chunk);
  const scale = pxPerMm * ratio;
  const left = Math.floor(range.staveFrom * tileWidth * scale) - BLEED_PX;
  const top = Math.floor((size.height - range.courseTo * tileHeight) * scale) - BLEED_PX;
  const right = Math.ceil(range.staveTo * tileWidth * scale) + BLEED_PX;
  const bottom = Math.ceil((size.height - range.courseFrom * tileHeight) * scale) + BLEED_PX;
  return { left, top, width: right - left, height: bottom - top };
}

/** Draws a chunk into its bitmap, a new one when there is none yet. */
export function drawChunk(
  raster: ChunkRaster,
  scene: Scene,
  chunk: number,
  bitmap: HTMLCanvasElement = document.createElement('canvas'),
): HTMLCanvasElement {
  const box = raster.boxes[chunk];
  if (box === undefined) return bitmap;
  const canvas = bitmap;
  if (canvas.width !== box.width || canvas.height !== box.height) {
    canvas.width = box.width;
    canvas.height = box.height;
  }
  const context = canvas.getContext('2d');
  if (context === null) return canvas;
  const { pxPerMm, ratio } = raster.scale;
  context.setTransform(1, 0, 0, 1, 0, 0);
  context.clearRect(0, 0, box.width, box.height);
  paintRange(
    context,
    scene,
    { pxPerMm: pxPerMm * ratio, ratio, seamX: -box.left, topY: -box.top },
    tilesDrawnFor(raster.chunks, chunk),
  );
  return canvas;
}
