/**
 * Everything cut is a closed chain of straight lines and circular arcs. An arc is kept as centre, radius,
 * start angle and signed sweep, so an arc of radius 0 still knows which way it turns: a sharp inside
 * corner is a fillet of radius 0, and offsetting it gives the exact round corner.
 */
import type { Radians } from '../units/angle';
import type { Millimetres, PointMm } from '../units/length';
import { subtract, unit } from './vector';

/** A straight piece of an outline. */
export interface LineSegment {
  readonly kind: 'line';
  readonly from: PointMm;
  readonly to: PointMm;
}

/** A circular piece of an outline; `sweep` > 0 runs counter-clockwise. */
export interface ArcSegment {
  readonly kind: 'arc';
  readonly centre: PointMm;
  readonly radius: Millimetres;
  readonly startAngle: Radians;
  readonly sweep: Radians;
}

export type Segment = LineSegment | ArcSegment;

/** The point of a circle at an angle. */
export function pointOnCircle(centre: PointMm, radius: Millimetres, angle: Radians): PointMm {
  return { x: centre.x + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) };
}

/** Where the segment starts. */
export function startOf(segment: Segment): PointMm {
  return segment.kind === 'line'
    ? segment.from
    : pointOnCircle(segment.centre, segment.radius, segment.startAngle);
}

/** Where the segment ends. */
export function endOf(segment: Segment): PointMm {
  return segment.kind === 'line'
    ? segment.to
    : pointOnCircle(segment.centre, segment.radius, segment.startAngle + segment.sweep);
}

/** The point halfway along the segment. */
export function middleOf(segment: Segment): PointMm {
  return segment.kind === 'line'
    ? { x: (segment.from.x + segment.to.x) / 2, y: (segment.from.y + segment.to.y) / 2 }
    : pointOnCircle(segment.centre, segment.radius, segment.startAngle + segment.sweep / 2);
}

/** Length along the segment. */
export function lengthOf(segment: Segment): Millimetres {
  return segment.kind === 'line'
    ? Math.hypot(segment.to.x - segment.from.x, segment.to.y - segment.from.y)
    : segment.radius * Math.abs(segment.sweep);
}

/**
 * DXF bulge: tan(included angle / 4), negative when clockwise, 0 for a line
 * (Autodesk DXF Reference, group code 42).
 */
export function bulgeOf(segment: Segment): number {
  return segment.kind === 'line' ? 0 : Math.tan(segment.sweep / 4);
}

/** Direction of travel where the segment starts, length 1. */
export function directionAtStart(segment: Segment): PointMm {
  return segment.kind === 'line'
    ? unit(subtract(segment.to, segment.from))
    : directionOnArc(segment.startAngle, segment.sweep);
}

/** Direction of travel where the segment ends, length 1. */
export function directionAtEnd(segment: Segment): PointMm {
  return segment.kind === 'line'
    ? unit(subtract(segment.to, segment.from))
    : directionOnArc(segment.startAngle + segment.sweep, segment.sweep);
}

function directionOnArc(angle: Radians, sweep: Radians): PointMm {
  const hand = sweep < 0 ? -1 : 1;
  return { x: -hand * Math.sin(angle), y: hand * Math.cos(angle) };
}
