/** Our outlines in @flatten-js/core, arc for arc, and as fine chords for libraries without arcs. */
import Flatten from '@flatten-js/core';
import { placeSegment } from '@shared/geometry/placement';
import { endOf, lengthOf, startOf, type Segment } from '@shared/geometry/segment';
import type { PointMm } from '@shared/units/length';

/** Segments moved sideways and up. */
export function movedBy(segments: readonly Segment[], x: number, y: number): Segment[] {
  const placement = { origin: { x, y }, xAxis: { x: 1, y: 0 }, yAxis: { x: 0, y: 1 } };
  return segments.map((segment) => placeSegment(placement, segment));
}

function flattenEdge(segment: Segment): Flatten.Segment | Flatten.Arc {
  if (segment.kind === 'line') {
    const { from, to } = segment;
    return new Flatten.Segment(new Flatten.Point(from.x, from.y), new Flatten.Point(to.x, to.y));
  }
  const { centre, radius, startAngle, sweep } = segment;
  return new Flatten.Arc(
    new Flatten.Point(centre.x, centre.y),
    radius,
    startAngle,
    startAngle + sweep,
    sweep > 0,
  );
}

/** The closed outline as a polygon with true arcs; pieces of no length are left out. */
export function truePolygon(segments: readonly Segment[]): Flatten.Polygon {
  const polygon = new Flatten.Polygon();
  polygon.addFace(segments.filter((segment) => lengthOf(segment) > 1e-9).map(flattenEdge));
  return polygon;
}

/** Points along a closed outline, arcs in chords that leave the arc by at most `tolerance`. */
export function chordsOf(segments: readonly Segment[], tolerance: number): PointMm[] {
  return segments.flatMap((segment) => {
    if (segment.kind === 'line') return [segment.from];
    if (segment.radius <= tolerance) return [startOf(segment)];
    const widest = 2 * Math.acos(1 - tolerance / segment.radius);
    const chords = Math.ceil(Math.abs(segment.sweep) / widest);
    return pointsAlong(segment, chords).slice(0, -1);
  });
}

/** Points along a segment at equal steps, both ends included. */
export function pointsAlong(segment: Segment, steps: number): PointMm[] {
  if (segment.kind === 'line') {
    const [from, to] = [startOf(segment), endOf(segment)];
    return Array.from({ length: steps + 1 }, (_, i) => ({
      x: from.x + ((to.x - from.x) * i) / steps,
      y: from.y + ((to.y - from.y) * i) / steps,
    }));
  }
  const { centre, radius, startAngle, sweep } = segment;
  return Array.from({ length: steps + 1 }, (_, i) => {
    const angle = startAngle + (sweep * i) / steps;
    return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) };
  });
}
