/** Outlines drawn by hand, with the radii a reader must find in them. */
import type { Outline } from '@shared/geometry/outline';
import type { Segment } from '@shared/geometry/segment';

export interface SampleOutline {
  readonly name: string;
  readonly outline: Outline;
}

const degrees = (angle: number) => (angle * Math.PI) / 180;

const arc = (x: number, y: number, radius: number, start: number, sweep: number): Segment => ({
  kind: 'arc',
  centre: { x, y },
  radius,
  startAngle: degrees(start),
  sweep: degrees(sweep),
});

const line = (x1: number, y1: number, x2: number, y2: number): Segment => ({
  kind: 'line',
  from: { x: x1, y: y1 },
  to: { x: x2, y: y2 },
});

/** 20 × 10 with corners of radius 2, centred; area 200 − (4 − π) · 4 = 196.566371. */
const roundedRectangle: Outline = {
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

/** A 20 × 20 square with a semicircular notch of radius 3 in its top edge: an arc that runs clockwise. */
const notchedSquare: Outline = {
  segments: [
    line(-10, -10, 10, -10),
    line(10, -10, 10, 10),
    line(10, 10, 3, 10),
    arc(0, 10, 3, 0, -180),
    line(-3, 10, -10, 10),
    line(-10, 10, -10, -10),
  ],
};

/**
 * A 28 × 28 square with a round tab on top, by the worked values of the round profile: head 3.6, fillet
 * 1.8, reach 7.6, hence fillet centres at ±4.931531 and a head of more than half a turn. A sharp corner
 * (radius 0) and a line of no length are mixed in.
 */
function tabbedSquare(): Outline {
  const [head, fillet, reach] = [3.6, 1.8, 7.6];
  const height = reach - head;
  const filletX = Math.sqrt((head + fillet) ** 2 - (height - fillet) ** 2);
  const rise = (Math.atan2(height - fillet, filletX) * 180) / Math.PI;
  return {
    segments: [
      line(-14, -14, 14, -14),
      arc(14, -14, 0, -90, 90),
      line(14, -14, 14, 14),
      line(14, 14, 14, 14),
      line(14, 14, filletX, 14),
      arc(filletX, 14 + fillet, fillet, 270, -(90 + rise)),
      arc(0, 14 + height, head, -rise, 180 + 2 * rise),
      arc(-filletX, 14 + fillet, fillet, rise, -(90 + rise)),
      line(-filletX, 14, -14, 14),
      line(-14, 14, -14, -14),
    ],
  };
}

/** A disc, one full turn. */
const disc: Outline = { segments: [arc(2, -1, 7.25, 30, 360)] };

/** A flat arc of a large radius on a short chord, where a careless number of decimals loses the radius. */
function flatArc(): Outline {
  const half = (Math.asin(0.005 / 150) * 180) / Math.PI;
  const bottom = 150 * Math.cos(degrees(half));
  return {
    segments: [
      line(-0.005, -4, 0.005, -4),
      line(0.005, -4, 0.005, 0),
      arc(0, -bottom, 150, 90 - half, 2 * half),
      line(-0.005, 0, -0.005, -4),
    ],
  };
}

export const SAMPLE_OUTLINES: readonly SampleOutline[] = [
  { name: 'rounded rectangle', outline: roundedRectangle },
  { name: 'square with a notch', outline: notchedSquare },
  { name: 'square with a tab', outline: tabbedSquare() },
  { name: 'disc', outline: disc },
  { name: 'flat arc', outline: flatArc() },
];
