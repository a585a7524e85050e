import type { PointMm } from '../units/length';
import type { Segment } from './segment';
import { cross } from './vector';

/** Where a local drawing lies: its origin and its two unit axes, square to each other. May mirror. */
export interface Placement {
  readonly origin: PointMm;
  readonly xAxis: PointMm;
  readonly yAxis: PointMm;
}

/** The local point in the outer coordinates. */
export function placePoint(placement: Placement, point: PointMm): PointMm {
  const { origin, xAxis, yAxis } = placement;
  return {
    x: origin.x + point.x * xAxis.x + point.y * yAxis.x,
    y: origin.y + point.x * xAxis.y + point.y * yAxis.y,
  };
}

/** The local segment in the outer coordinates; a mirroring placement turns arcs the other way. */
export function placeSegment(placement: Placement, segment: Segment): Segment {
  if (segment.kind === 'line') {
    return {
      kind: 'line',
      from: placePoint(placement, segment.from),
      to: placePoint(placement, segment.to),
    };
  }
  const { xAxis, yAxis } = placement;
  const turn = Math.atan2(xAxis.y, xAxis.x);
  const hand = cross(xAxis, yAxis) < 0 ? -1 : 1;
  return {
    kind: 'arc',
    centre: placePoint(placement, segment.centre),
    radius: segment.radius,
    startAngle: turn + hand * segment.startAngle,
    sweep: hand * segment.sweep,
  };
}
