/** Angles. Documents and screens hold degrees; only the trigonometry inside a function uses radians. */

/** An angle in degrees. */
export type Degrees = number;

/** An angle in radians. */
export type Radians = number;

/** The angle in radians. */
export function toRadians(angle: Degrees): Radians {
  return (angle * Math.PI) / 180;
}

/** The angle in degrees. */
export function toDegrees(angle: Radians): Degrees {
  return (angle * 180) / Math.PI;
}
