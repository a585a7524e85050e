import type { Millimetres, PointMm } from '../units/length';
import { intersections } from './intersect';
import { boundsOf, type Bounds } from './outline';
import {
  directionAtStart,
  endOf,
  lengthOf,
  startOf,
  type ArcSegment,
  type LineSegment,
  type Segment,
} from './segment';
import { POINT_TOLERANCE } from './tolerance';
import { cross, distance, subtract } from './vector';

/**
 * Neighbours share an end, and tangent arcs agree there to about 1e-7 mm; what they share within this of
 * that end is the joint itself and not a crossing.
 */
const SHARED_END: Millimetres = 1e-3;

/**
 * A point where a closed chain crosses or touches itself other than where neighbours meet, or null. A chain
 * that just touches itself (a cutter exactly as wide as a mouth) counts as free: touching is forgiven up to
 * a millionth of a millimetre.
 */
export function selfCrossing(chain: readonly Segment[]): PointMm | null {
  const segments = chain.filter((segment) => lengthOf(segment) > POINT_TOLERANCE);
  const boxes = segments.map((segment) => boundsOf([segment]));
  const count = segments.length;
  for (let i = 0; i < count; i++) {
    for (let j = i + 1; j < count; j++) {
      if (!boxesMeet(boxes[i] as Bounds, boxes[j] as Bounds)) continue;
      const [a, b] = [segments[i] as Segment, segments[j] as Segment];
      const shared: PointMm[] = [];
      if (j === i + 1) shared.push(endOf(a));
      if (i === 0 && j === count - 1) shared.push(startOf(a));
      const crossing = intersections(a, b, 1e-9).find(
        (point) => !shared.some((end) => distance(end, point) <= SHARED_END),
      );
      if (crossing && !onlyTouches(a, b)) return crossing;
    }
  }
  return null;
}

/** True when two segments lie beside each other and overlap by no more than the tolerance. */
function onlyTouches(a: Segment, b: Segment): boolean {
  if (a.kind === 'line') return b.kind === 'line' ? linesTouch(a, b) : lineTouchesArc(a, b);
  if (b.kind === 'line') return lineTouchesArc(b, a);
  const between = distance(a.centre, b.centre);
  return (
    between >= a.radius + b.radius - POINT_TOLERANCE ||
    between <= Math.abs(a.radius - b.radius) + POINT_TOLERANCE
  );
}

/** Lines along each other: two flanks of a mouth exactly as wide as the cutter. */
function linesTouch(a: LineSegment, b: LineSegment): boolean {
  return [b.from, b.to].every((point) => heightOver(a, point) <= POINT_TOLERANCE);
}

function lineTouchesArc(line: LineSegment, arc: ArcSegment): boolean {
  return heightOver(line, arc.centre) >= arc.radius - POINT_TOLERANCE;
}

/** Distance of a point from the whole line. */
function heightOver(line: LineSegment, point: PointMm): Millimetres {
  return Math.abs(cross(directionAtStart(line), subtract(point, line.from)));
}

function boxesMeet(a: Bounds, b: Bounds): boolean {
  return a.minX <= b.maxX && b.minX <= a.maxX && a.minY <= b.maxY && b.minY <= a.maxY;
}
