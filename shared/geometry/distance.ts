import type { Millimetres, PointMm } from '../units/length';
import { intersections, withinSweep } from './intersect';
import { endOf, pointOnCircle, startOf, type ArcSegment, type Segment } from './segment';
import { add, distance, dot, scale, subtract } from './vector';

/** Two points, one on each chain, and how far they are apart. */
export interface Gap {
  readonly distance: Millimetres;
  readonly from: PointMm;
  readonly to: PointMm;
}

/**
 * The least gap between two chains of segments, exact for arcs; 0 where they touch or cross, Infinity when
 * one is empty. The least distance of two curves lies at an end of one of them or square to both, so only
 * those places are looked at.
 */
export function leastGap(a: readonly Segment[], b: readonly Segment[]): Gap {
  let least: Gap = { distance: Infinity, from: { x: 0, y: 0 }, to: { x: 0, y: 0 } };
  for (const segmentA of a) {
    for (const segmentB of b) {
      const gap = gapOfSegments(segmentA, segmentB);
      if (gap.distance < least.distance) least = gap;
    }
  }
  return least;
}

function gapOfSegments(a: Segment, b: Segment): Gap {
  const [meeting] = intersections(a, b);
  if (meeting) return { distance: 0, from: meeting, to: meeting };
  const fromA = candidates(a, b).map((point) => gapTo(point, b));
  const fromB = candidates(b, a).map((point) => swapped(gapTo(point, a)));
  return [...fromA, ...fromB].reduce((x, y) => (y.distance < x.distance ? y : x));
}

function swapped(gap: Gap): Gap {
  return { distance: gap.distance, from: gap.to, to: gap.from };
}

function gapTo(point: PointMm, segment: Segment): Gap {
  const to = nearestPoint(segment, point);
  return { distance: distance(point, to), from: point, to };
}

/** Points of `segment` that may be the nearest to `other`: its ends, and where it is square to the other. */
function candidates(segment: Segment, other: Segment): PointMm[] {
  const ends = [startOf(segment), endOf(segment)];
  if (segment.kind === 'line') {
    return other.kind === 'arc' ? [...ends, nearestPoint(segment, other.centre)] : ends;
  }
  const towards =
    other.kind === 'arc' ? other.centre : footOn(other.from, other.to, segment.centre);
  return [...ends, ...pointsInLine(segment, towards)];
}

function pointsInLine(arc: ArcSegment, towards: PointMm): PointMm[] {
  const angle = Math.atan2(towards.y - arc.centre.y, towards.x - arc.centre.x);
  return [angle, angle + Math.PI]
    .map((a) => pointOnCircle(arc.centre, arc.radius, a))
    .filter((point) => withinSweep(arc, point));
}

function footOn(from: PointMm, to: PointMm, point: PointMm): PointMm {
  const along = subtract(to, from);
  const size = dot(along, along);
  return size === 0 ? from : add(from, scale(along, dot(subtract(point, from), along) / size));
}

/** The point of a segment nearest to a point. */
export function nearestPoint(segment: Segment, point: PointMm): PointMm {
  const ends = [startOf(segment), endOf(segment)];
  if (segment.kind === 'line') {
    const along = subtract(segment.to, segment.from);
    const size = dot(along, along);
    const share = size === 0 ? 0 : dot(subtract(point, segment.from), along) / size;
    return share >= 0 && share <= 1 ? add(segment.from, scale(along, share)) : nearer(ends, point);
  }
  const facing = pointsInLine(segment, point);
  return nearer([...ends, ...facing], point);
}

function nearer(points: readonly PointMm[], point: PointMm): PointMm {
  return points.reduce((a, b) => (distance(b, point) < distance(a, point) ? b : a));
}
