/**
 * Where the window looks on the unrolled shell. Pattern space: millimetres, x along the staves from the
 * seam, y up from the untrimmed bottom. Screen space: CSS pixels, y down. The shell is round, so x has no
 * ends: after every move the view is brought back by whole turns until its middle lies on turn 0, and what
 * has passed the seam comes in again from turn −1 or 1.
 */
import type { Millimetres, PointMm } from '@shared/units/length';

/** A point of the canvas in CSS pixels. */
export interface PointPx {
  readonly x: number;
  readonly y: number;
}

export interface SizePx {
  readonly width: number;
  readonly height: number;
}

/** The unrolled shell: once round, and from end to end. */
export interface SheetMm {
  readonly circumference: Millimetres;
  readonly height: Millimetres;
}

/** Room kept free around the shell for numbers, letters and words. */
export interface InsetsPx {
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
  readonly left: number;
}

export interface Viewport {
  readonly pxPerMm: number;
  /** x of the pattern at the left border of the canvas. */
  readonly leftMm: Millimetres;
  /** y of the pattern at the upper border of the canvas. */
  readonly topMm: Millimetres;
}

/** Everything that bounds a move of the view. */
export interface ViewBounds {
  readonly size: SizePx;
  readonly sheet: SheetMm;
  readonly insets: InsetsPx;
  readonly leastPxPerMm: number;
  readonly mostPxPerMm: number;
}

/** The pattern point under a screen point; x may lie beyond the seam. */
export function toPattern(view: Viewport, screenPoint: PointPx): PointMm {
  return {
    x: view.leftMm + screenPoint.x / view.pxPerMm,
    y: view.topMm - screenPoint.y / view.pxPerMm,
  };
}

/** The screen point of a pattern point on turn 0. */
export function toScreen(view: Viewport, patternPoint: PointMm): PointPx {
  return {
    x: (patternPoint.x - view.leftMm) * view.pxPerMm,
    y: (view.topMm - patternPoint.y) * view.pxPerMm,
  };
}

/** The view after the picture has moved by so many pixels. */
export function panned(view: Viewport, bounds: ViewBounds, dx: number, dy: number): Viewport {
  return settled(
    {
      ...view,
      leftMm: view.leftMm - dx / view.pxPerMm,
      topMm: view.topMm + dy / view.pxPerMm,
    },
    bounds,
  );
}

/** The view scaled by a factor about a screen point that stays where it is. */
export function zoomedAt(
  view: Viewport,
  bounds: ViewBounds,
  about: PointPx,
  factor: number,
): Viewport {
  const still = toPattern(view, about);
  const pxPerMm = clamp(view.pxPerMm * factor, bounds.leastPxPerMm, bounds.mostPxPerMm);
  return settled(
    { pxPerMm, leftMm: still.x - about.x / pxPerMm, topMm: still.y + about.y / pxPerMm },
    bounds,
  );
}

/** The scale at which the whole shell, seam to seam and end to end, fits between the insets. */
export function scaleOfWhole(size: SizePx, sheet: SheetMm, insets: InsetsPx): number {
  const width = Math.max(1, size.width - insets.left - insets.right);
  return Math.min(width / sheet.circumference, scaleOfHeight(size, sheet, insets));
}

/** The scale at which the shell fits from end to end; it may run out of the window sideways. */
export function scaleOfHeight(size: SizePx, sheet: SheetMm, insets: InsetsPx): number {
  return Math.max(1, size.height - insets.top - insets.bottom) / sheet.height;
}

/** The view at a scale with the seam at the left inset and the shell in the middle of the height. */
export function viewFromSeam(bounds: ViewBounds, pxPerMm: number): Viewport {
  const { size, sheet, insets } = bounds;
  const room = size.height - insets.top - insets.bottom - sheet.height * pxPerMm;
  return settled(
    {
      pxPerMm,
      leftMm: -insets.left / pxPerMm,
      topMm: sheet.height + (insets.top + Math.max(0, room) / 2) / pxPerMm,
    },
    bounds,
  );
}

/** The view at the scale of the whole shell, which stands in the middle. */
export function viewOfWhole(bounds: ViewBounds): Viewport {
  const { size, sheet, insets } = bounds;
  const pxPerMm = scaleOfWhole(size, sheet, insets);
  const free = size.width - insets.left - insets.right - sheet.circumference * pxPerMm;
  const view = viewFromSeam(bounds, pxPerMm);
  return { ...view, leftMm: -(insets.left + free / 2) / pxPerMm };
}

/** The view turned until a point round the shell stands in the middle of the window. */
export function turnedTo(view: Viewport, bounds: ViewBounds, middleMm: Millimetres): Viewport {
  return settled({ ...view, leftMm: middleMm - bounds.size.width / 2 / view.pxPerMm }, bounds);
}

/** The least move that brings a box of the pattern (on the turn nearest the middle) between the insets. */
export function showing(
  view: Viewport,
  bounds: ViewBounds,
  box: {
    readonly x: Millimetres;
    readonly y: Millimetres;
    readonly width: Millimetres;
    readonly height: Millimetres;
  },
): Viewport {
  const { size, insets } = bounds;
  const scale = view.pxPerMm;
  const x = nearestTurn(box.x, middleOfView(view, size), bounds.sheet.circumference);
  const left = (x - view.leftMm) * scale;
  const top = (view.topMm - box.y - box.height) * scale;
  const dx = shiftInto(left, box.width * scale, insets.left, size.width - insets.right);
  const dy = shiftInto(top, box.height * scale, insets.top, size.height - insets.bottom);
  return panned(view, bounds, dx, dy);
}

/** The whole turns of the shell that are at least partly in the window, from left to right. */
export function turnsInView(view: Viewport, size: SizePx, sheet: SheetMm): number[] {
  const first = Math.floor(view.leftMm / sheet.circumference);
  const last = Math.ceil((view.leftMm + size.width / view.pxPerMm) / sheet.circumference) - 1;
  return Array.from({ length: Math.max(1, last - first + 1) }, (_, i) => first + i);
}

/** x of the pattern in the middle of the window. */
export function middleOfView(view: Viewport, size: SizePx): Millimetres {
  return view.leftMm + size.width / 2 / view.pxPerMm;
}

/** The view within its scale and height, its middle on turn 0. */
export function settled(view: Viewport, bounds: ViewBounds): Viewport {
  const { size, sheet, insets } = bounds;
  const pxPerMm = clamp(view.pxPerMm, bounds.leastPxPerMm, bounds.mostPxPerMm);
  const turns = Math.floor(middleOfView({ ...view, pxPerMm }, size) / sheet.circumference);
  const highest = sheet.height + insets.top / pxPerMm;
  const lowest = (size.height - insets.bottom) / pxPerMm;
  return {
    pxPerMm,
    leftMm: view.leftMm - turns * sheet.circumference,
    topMm: clamp(view.topMm, Math.min(highest, lowest), Math.max(highest, lowest)),
  };
}

function nearestTurn(x: Millimetres, middle: Millimetres, circumference: Millimetres): Millimetres {
  return x + Math.round((middle - x) / circumference) * circumference;
}

function shiftInto(from: number, length: number, least: number, most: number): number {
  if (from < least) return least - from;
  if (from + length > most) return Math.max(most - from - length, least - from);
  return 0;
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(Math.max(value, least), Math.max(least, most));
}
