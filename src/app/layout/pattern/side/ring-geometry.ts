/**
 * The ring seen from above, y down, the seam at the top. Staves are numbered left to right as seen from
 * outside, so seen from above they run against the clock.
 */
import type { Radians } from '@shared/units/angle';

interface Point {
  readonly x: number;
  readonly y: number;
}

/** Angle of a place counted in staves from the seam; 0 is to the right, growing clockwise on the screen. */
export function staveAngle(place: number, staves: number): Radians {
  return -Math.PI / 2 - (place / staves) * 2 * Math.PI;
}

/** How far round, as a share of the ring in the sense of the staves, it is from one point to another. */
export function stavesTurned(from: Point, to: Point): number {
  const turn = Math.atan2(from.y, from.x) - Math.atan2(to.y, to.x);
  return Math.atan2(Math.sin(turn), Math.cos(turn)) / (2 * Math.PI);
}

/** An arc between two angles; the second comes after the first against the clock. */
export function arcPath(from: Radians, to: Radians, radius: number): string {
  return `M${at(from, radius)}${arcTo(from, to, radius)}`;
}

/** One stave of the ring, between its two joints and two radii. */
export function wedgePath(from: Radians, to: Radians, inner: number, outer: number): string {
  return `M${at(from, outer)}${arcTo(from, to, outer)}L${at(to, inner)}${arcTo(to, from, inner)}Z`;
}

function arcTo(from: Radians, to: Radians, radius: number): string {
  const large = Math.abs(to - from) > Math.PI ? 1 : 0;
  return `A${radius} ${radius} 0 ${large} ${to < from ? 0 : 1} ${at(to, radius)}`;
}

function at(angle: Radians, radius: number): string {
  return `${(radius * Math.cos(angle)).toFixed(2)} ${(radius * Math.sin(angle)).toFixed(2)}`;
}
