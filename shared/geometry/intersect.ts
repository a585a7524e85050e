/**
 * Where segments meet. Supports (whole lines and whole circles) are intersected in closed form, then points
 * off the segments are dropped. Limit: two circles that touch are ill-conditioned, so a touching point can
 * be off by about the square root of the rounding error (1e-7 mm at our sizes).
 */
import type { Millimetres, PointMm } from '../units/length';
import { endOf, startOf, type ArcSegment, type LineSegment, type Segment } from './segment';
import { POINT_TOLERANCE } from './tolerance';
import { add, cross, distance, dot, scale, subtract, unit } from './vector';

/** A line this little outside a circle still counts as touching it: rounding, not geometry. */
const TOUCHING: Millimetres = 1e-9;

/** Points that both segments have in common; the ends of the overlap where they lie on each other. */
export function intersections(
  a: Segment,
  b: Segment,
  tolerance: Millimetres = POINT_TOLERANCE,
): PointMm[] {
  const points = sameSupport(a, b, tolerance)
    ? [startOf(a), endOf(a), startOf(b), endOf(b)]
    : supportIntersections(a, b);
  return points.filter((point) => liesOn(a, point, tolerance) && liesOn(b, point, tolerance));
}

/** Points where the whole lines or circles behind two segments meet. */
export function supportIntersections(a: Segment, b: Segment): PointMm[] {
  if (a.kind === 'line') {
    return b.kind === 'line' ? lineWithLine(a, b) : lineWithCircle(a, b);
  }
  return b.kind === 'line' ? lineWithCircle(b, a) : circleWithCircle(a, b);
}

function lineWithLine(a: LineSegment, b: LineSegment): PointMm[] {
  const alongA = subtract(a.to, a.from);
  const alongB = subtract(b.to, b.from);
  const slant = cross(alongA, alongB);
  const reach = Math.hypot(alongA.x, alongA.y) * Math.hypot(alongB.x, alongB.y);
  if (Math.abs(slant) <= 1e-12 * reach) return [];
  return [add(a.from, scale(alongA, cross(subtract(b.from, a.from), alongB) / slant))];
}

function lineWithCircle(line: LineSegment, circle: ArcSegment): PointMm[] {
  const along = unit(subtract(line.to, line.from));
  const foot = add(line.from, scale(along, dot(subtract(circle.centre, line.from), along)));
  const height = distance(foot, circle.centre);
  return halfChord(circle.radius, height).map((half) => add(foot, scale(along, half)));
}

function circleWithCircle(a: ArcSegment, b: ArcSegment): PointMm[] {
  const between = distance(a.centre, b.centre);
  if (between === 0) return [];
  const along = unit(subtract(b.centre, a.centre));
  const height = (between ** 2 + a.radius ** 2 - b.radius ** 2) / (2 * between);
  const foot = add(a.centre, scale(along, height));
  const across = { x: -along.y, y: along.x };
  return halfChord(a.radius, Math.abs(height)).map((half) => add(foot, scale(across, half)));
}

/** ± half the chord at a height over the centre; one zero where the line only touches; nothing beyond. */
function halfChord(radius: Millimetres, height: Millimetres): number[] {
  const squared = radius ** 2 - height ** 2;
  if (squared > 0) return [-Math.sqrt(squared), Math.sqrt(squared)];
  return height - radius <= TOUCHING ? [0] : [];
}

function sameSupport(a: Segment, b: Segment, tolerance: Millimetres): boolean {
  if (a.kind === 'line' && b.kind === 'line') {
    return [b.from, b.to].every((point) => distanceToLine(a, point) <= tolerance);
  }
  if (a.kind === 'arc' && b.kind === 'arc') {
    return distance(a.centre, b.centre) <= tolerance && Math.abs(a.radius - b.radius) <= tolerance;
  }
  return false;
}

function distanceToLine(line: LineSegment, point: PointMm): Millimetres {
  const along = unit(subtract(line.to, line.from));
  return Math.abs(cross(along, subtract(point, line.from)));
}

/** True when the point is on the segment, ends included. */
export function liesOn(
  segment: Segment,
  point: PointMm,
  tolerance: Millimetres = POINT_TOLERANCE,
): boolean {
  if (isBesideSupport(segment, point, tolerance)) return false;
  // ends are last: on an arc they cost four sines
  return (
    isBetweenEnds(segment, point) ||
    distance(point, startOf(segment)) <= tolerance ||
    distance(point, endOf(segment)) <= tolerance
  );
}

function isBesideSupport(segment: Segment, point: PointMm, tolerance: Millimetres): boolean {
  return segment.kind === 'line'
    ? distanceToLine(segment, point) > tolerance
    : Math.abs(distance(point, segment.centre) - segment.radius) > tolerance;
}

function isBetweenEnds(segment: Segment, point: PointMm): boolean {
  if (segment.kind === 'arc') return withinSweep(segment, point);
  const along = subtract(segment.to, segment.from);
  const travelled = dot(subtract(point, segment.from), along);
  return travelled >= 0 && travelled <= dot(along, along);
}

/** True when the direction from the arc's centre to the point lies within its sweep. */
export function withinSweep(arc: ArcSegment, point: PointMm): boolean {
  const angle = Math.atan2(point.y - arc.centre.y, point.x - arc.centre.x);
  return turnFromStart(arc, angle) <= Math.abs(arc.sweep);
}

/** How far the arc travels from its start to a direction, 0 ≤ turn < 2π. */
export function turnFromStart(arc: ArcSegment, angle: number): number {
  const turn = arc.sweep < 0 ? arc.startAngle - angle : angle - arc.startAngle;
  const round = 2 * Math.PI;
  return ((turn % round) + round) % round;
}
