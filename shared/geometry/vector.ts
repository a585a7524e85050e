import type { PointMm } from '../units/length';

/** a + b. */
export function add(a: PointMm, b: PointMm): PointMm {
  return { x: a.x + b.x, y: a.y + b.y };
}

/** a − b. */
export function subtract(a: PointMm, b: PointMm): PointMm {
  return { x: a.x - b.x, y: a.y - b.y };
}

/** The vector times a number. */
export function scale(a: PointMm, factor: number): PointMm {
  return { x: a.x * factor, y: a.y * factor };
}

/** Dot product. */
export function dot(a: PointMm, b: PointMm): number {
  return a.x * b.x + a.y * b.y;
}

/** z of the cross product: positive when b turns left from a. */
export function cross(a: PointMm, b: PointMm): number {
  return a.x * b.y - a.y * b.x;
}

/** Distance of two points. */
export function distance(a: PointMm, b: PointMm): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}

/** The vector with length 1; a zero vector stays zero. */
export function unit(a: PointMm): PointMm {
  const size = Math.hypot(a.x, a.y);
  return size === 0 ? a : scale(a, 1 / size);
}
