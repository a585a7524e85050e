import type { Millimetres, PointMm } from '../units/length';
import { startOf, endOf, pointOnCircle, type Segment } from './segment';

/** A closed chain of segments, each starting where the one before ends; counter-clockwise around wood. */
export interface Outline {
  readonly segments: readonly Segment[];
}

/** The least box that holds an outline. */
export interface Bounds {
  readonly minX: Millimetres;
  readonly minY: Millimetres;
  readonly maxX: Millimetres;
  readonly maxY: Millimetres;
}

/** Signed area in mm², positive when counter-clockwise; exact (Green's theorem, arcs included). */
export function areaOf(outline: Outline): number {
  return outline.segments.reduce((sum, segment) => sum + areaUnder(segment), 0);
}

function areaUnder(segment: Segment): number {
  const from = startOf(segment);
  const to = endOf(segment);
  const chord = (from.x * to.y - to.x * from.y) / 2;
  if (segment.kind === 'line') return chord;
  return chord + (segment.radius ** 2 * (segment.sweep - Math.sin(segment.sweep))) / 2;
}

/** The box of a chain of segments, exact for arcs. */
export function boundsOf(segments: readonly Segment[]): Bounds {
  // plain loops: every search for crossings asks for the box of each segment
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const segment of segments) {
    for (const { x, y } of extremesOf(segment)) {
      if (x < minX) minX = x;
      if (x > maxX) maxX = x;
      if (y < minY) minY = y;
      if (y > maxY) maxY = y;
    }
  }
  return { minX, minY, maxX, maxY };
}

const QUARTER = Math.PI / 2;

function extremesOf(segment: Segment): PointMm[] {
  const points = [startOf(segment), endOf(segment)];
  if (segment.kind === 'line') return points;
  const low = Math.min(segment.startAngle, segment.startAngle + segment.sweep);
  const high = Math.max(segment.startAngle, segment.startAngle + segment.sweep);
  for (let k = Math.ceil(low / QUARTER); k * QUARTER <= high; k++) {
    points.push(pointOnCircle(segment.centre, segment.radius, k * QUARTER));
  }
  return points;
}
