import { toRadians } from '../units/angle';
import type { Outline } from './outline';
import type { ArcSegment, LineSegment } from './segment';

/** A line by the coordinates of its ends. */
export function line(x1: number, y1: number, x2: number, y2: number): LineSegment {
  return { kind: 'line', from: { x: x1, y: y1 }, to: { x: x2, y: y2 } };
}

/** An arc by centre, radius, and start and sweep in degrees. */
export function arc(x: number, y: number, radius: number, start: number, sweep: number) {
  return {
    kind: 'arc',
    centre: { x, y },
    radius,
    startAngle: toRadians(start),
    sweep: toRadians(sweep),
  } satisfies ArcSegment;
}

export const square: Outline = {
  segments: [line(-5, -5, 5, -5), line(5, -5, 5, 5), line(5, 5, -5, 5), line(-5, 5, -5, -5)],
};

/** 20 × 20 with a semicircular notch of radius 3 in its top edge. */
export const notchedSquare: Outline = {
  segments: [
    line(-10, -10, 10, -10),
    line(10, -10, 10, 10),
    line(10, 10, 3, 10),
    arc(0, 10, 3, 0, -180),
    line(-3, 10, -10, 10),
    line(-10, 10, -10, -10),
  ],
};

/** 20 × 10 with corners of radius 2. */
export const roundedRectangle: Outline = {
  segments: [
    line(-8, -5, 8, -5),
    arc(8, -3, 2, -90, 90),
    line(10, -3, 10, 3),
    arc(8, 3, 2, 0, 90),
    line(8, 5, -8, 5),
    arc(-8, 3, 2, 90, 90),
    line(-10, 3, -10, -3),
    arc(-8, -3, 2, 180, 90),
  ],
};
