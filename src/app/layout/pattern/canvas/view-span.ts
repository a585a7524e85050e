import { roundStave } from '@shared/layout/cells';
import type { SheetDrawing } from './sheet-drawing';
import type { SizePx, Viewport } from './viewport';

/** Which part of the ring is in the window. */
export interface ViewSpan {
  /** Staves from the seam to the left border and the width in view; the first may be below 0. */
  readonly from: number;
  readonly width: number;
  /** Numbers, from 1, of the first and the last stave wholly in view. */
  readonly first: number;
  readonly last: number;
  readonly whole: boolean;
}

/** The span of staves a view shows. */
export function viewSpan(
  view: Viewport,
  size: SizePx,
  { grid, tileWidth }: SheetDrawing,
): ViewSpan {
  const from = view.leftMm / tileWidth;
  const width = size.width / view.pxPerMm / tileWidth;
  return {
    from,
    width: Math.min(width, grid.staves),
    first: roundStave(grid, Math.ceil(from - 0.02)) + 1,
    last: roundStave(grid, Math.floor(from + width + 0.02) - 1) + 1,
    whole: width >= grid.staves,
  };
}
