/** Marks on hundreds of tiles at once: squares in one path, since every tile's own outline would take longer than a frame. */
import { tileOf } from '@shared/layout/cells';
import type { SheetDrawing } from './sheet-drawing';
import { toScreen, turnsInView, type SizePx, type Viewport } from './viewport';

/** So many tiles are still marked each with its own outline. */
export const MOST_OUTLINED = 600;

interface SeenSheet {
  readonly drawing: SheetDrawing;
  readonly view: Viewport;
  readonly size: SizePx;
}

/** Covers the tiles at these positions with a veil of the colour and a line round each. */
export function paintManyMarks(
  context: CanvasRenderingContext2D,
  { drawing, view, size }: SeenSheet,
  positions: readonly number[],
  colour: string,
): void {
  const width = drawing.tileWidth * view.pxPerMm;
  const height = drawing.tileHeight * view.pxPerMm;
  const squares = new Path2D();
  for (const turn of turnsInView(view, size, drawing.size)) {
    for (const position of positions) {
      const { stave, course } = tileOf(drawing.grid, position);
      const { x, y } = toScreen(view, {
        x: turn * drawing.size.circumference + stave * drawing.tileWidth,
        y: (course + 1) * drawing.tileHeight,
      });
      const seen = x + width > 0 && x < size.width && y + height > 0 && y < size.height;
      if (seen) squares.rect(x, y, width, height);
    }
  }
  context.fillStyle = colour;
  context.globalAlpha = 0.28;
  context.fill(squares);
  context.globalAlpha = 1;
  context.strokeStyle = colour;
  context.lineWidth = Math.min(2, width / 8);
  context.stroke(squares);
}
