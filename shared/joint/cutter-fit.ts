/**
 * Can this cutter make this outline? The cutter's centre runs on the outline offset outward by half its
 * diameter. The outline can be cut exactly when no inside arc or inside corner is tighter than the cutter's
 * radius and that path does not cross itself. Both only get harder as the cutter grows, so the largest
 * cutter that fits is found by halving.
 */
import { offsetOutline, type OffsetResult } from '../geometry/offset';
import type { Outline } from '../geometry/outline';
import {
  directionAtEnd,
  directionAtStart,
  endOf,
  lengthOf,
  middleOf,
  type Segment,
} from '../geometry/segment';
import { POINT_TOLERANCE } from '../geometry/tolerance';
import { cross } from '../geometry/vector';
import type { Millimetres, PointMm } from '../units/length';

/** The tightest inside arc of an outline, or inside corner (radius 0). */
export interface TightestInside {
  readonly radius: Millimetres;
  readonly at: PointMm;
  /** Index of the arc, or of the segment that ends at the corner. */
  readonly segment: number;
}

export interface CutterFit {
  readonly fits: boolean;
  /** Null when the outline has no inside arc and no inside corner. */
  readonly tightest: TightestInside | null;
  /**
   * Where the cutter's centre path crosses itself, or null. For a cutter too large for an inside radius it
   * is the path of the largest that is not.
   */
  readonly crossingAt: PointMm | null;
  /** Greatest diameter that fits, to 0.001 mm and rounded down; Infinity where nothing limits it. */
  readonly largestCutter: Millimetres;
  readonly limitedBy: 'inside-radius' | 'reach-in' | 'nothing';
}

/** The path of the cutter's centre round an outline: exact arcs, offset outward by half the diameter. */
export function centrePath(outline: Outline, diameter: Millimetres): OffsetResult {
  return offsetOutline(outline, diameter / 2);
}

/** Whether a cutter can make the outline, what limits it, and the largest that fits. */
export function cutterFit(outline: Outline, diameter: Millimetres): CutterFit {
  const tightest = tightestInside(outline);
  const roundest = tightest ? 2 * tightest.radius : Infinity;
  const roundEnough = roundest >= diameter - POINT_TOLERANCE;
  // where an inside radius is too tight already, the widest cutter it allows tells of mouths and gaps
  const path = centrePath(outline, Math.min(diameter, roundest));
  const crossingAt = path.ok ? null : path.at;
  return {
    fits: roundEnough && path.ok,
    tightest,
    crossingAt,
    ...largestCutter(outline, tightest),
  };
}

/** The tightest inside arc or inside corner of an outline, or null when there is none. */
export function tightestInside(outline: Outline): TightestInside | null {
  let tightest: TightestInside | null = null;
  outline.segments.forEach((segment, i) => {
    const next = outline.segments[(i + 1) % outline.segments.length] as Segment;
    if (segment.kind === 'arc' && segment.sweep < 0) keep(segment.radius, middleOf(segment), i);
    if (isInsideCorner(segment, next)) keep(0, endOf(segment), i);
  });
  return tightest;

  function keep(radius: Millimetres, at: PointMm, segment: number): void {
    if (!tightest || radius < tightest.radius - POINT_TOLERANCE) tightest = { radius, at, segment };
  }
}

/** A right turn of more than this is a corner; less is rounding at a tangent joint. */
const CORNER_SINE = 1e-6;

function isInsideCorner(before: Segment, after: Segment): boolean {
  if (lengthOf(before) === 0 || lengthOf(after) === 0) return false;
  return cross(directionAtEnd(before), directionAtStart(after)) < -CORNER_SINE;
}

/** Cutters are told apart to this. */
const CUTTER_STEP: Millimetres = 0.001;

/** A cutter larger than any the program knows of. */
const BEYOND_ANY_CUTTER: Millimetres = 1000;

function largestCutter(
  outline: Outline,
  tightest: TightestInside | null,
): Pick<CutterFit, 'largestCutter' | 'limitedBy'> {
  const roundest = tightest ? 2 * tightest.radius : BEYOND_ANY_CUTTER;
  if (centrePath(outline, roundest).ok) {
    return tightest
      ? { largestCutter: roundedDown(roundest), limitedBy: 'inside-radius' }
      : { largestCutter: Infinity, limitedBy: 'nothing' };
  }
  let [fits, crosses] = [0, roundest];
  while (crosses - fits > POINT_TOLERANCE) {
    const middle = (fits + crosses) / 2;
    if (centrePath(outline, middle).ok) fits = middle;
    else crosses = middle;
  }
  return { largestCutter: roundedDown(fits), limitedBy: 'reach-in' };
}

function roundedDown(diameter: Millimetres): Millimetres {
  // the search ends just short of the bound: a cutter of exactly 3.2 mm must not be called 3.199
  return Math.floor((diameter + 2 * POINT_TOLERANCE) / CUTTER_STEP) * CUTTER_STEP;
}
