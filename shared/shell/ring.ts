/**
 * The ring of staves as a regular polygon of N flat sides: β = 180°/N, apothem of the outer faces
 * a_o = tileWidth / (2 tan β) (regular polygons; Machinery's Handbook, "Formulas and Table for Regular
 * Polygons", from memory).
 */
import type { Shell } from '../layout/schema';
import { toRadians, type Degrees } from '../units/angle';
import type { Millimetres } from '../units/length';

/** What staves, their width and the joint make of the ring. */
export interface Ring {
  /** Tilt of each long edge of a stave, 180°/N. */
  readonly bevel: Degrees;
  /** By how much the wall turns at each stave joint, 360°/N. */
  readonly jointTurn: Degrees;
  /** From the axis to the middle of a stave's outer face. */
  readonly apothem: Millimetres;
  readonly acrossFlats: Millimetres;
  readonly acrossCorners: Millimetres;
  /** Once round the outer faces: N tile widths. */
  readonly girth: Millimetres;
  /** What turning takes off the middle of each stave's outer face; negative when there is no wood for it. */
  readonly turnedAway: Millimetres;
  /** Wall after turning. */
  readonly wall: Millimetres;
  /** Least board thickness, tabs included; and what it would be without them. */
  readonly boardLeast: Millimetres;
  readonly boardLeastWithoutTabs: Millimetres;
  /** How far a tab's outer face stands proud of the next stave before turning: 2 H tan β. */
  readonly tabProud: Millimetres;
  /** Least half width of a blank for the bevelled edge with its tab, without side allowance. */
  readonly blankHalfWidthLeast: Millimetres;
}

/** The sizes a ring is computed from. */
export type RingSizes = Pick<
  Shell,
  'staves' | 'tileWidth' | 'finishedOuterDiameter' | 'finishedInnerDiameter' | 'skimAllowance'
>;

/** The ring of a shell whose stave joint stands out by `reach` (0 for plain edges). */
export function ringOf(shell: RingSizes, reach: Millimetres): Ring {
  const bevel = 180 / shell.staves;
  const beta = toRadians(bevel);
  const apothem = shell.tileWidth / (2 * Math.tan(beta));
  return {
    bevel,
    jointTurn: 2 * bevel,
    apothem,
    acrossFlats: 2 * apothem,
    acrossCorners: (2 * apothem) / Math.cos(beta),
    girth: shell.staves * shell.tileWidth,
    turnedAway: apothem - shell.finishedOuterDiameter / 2,
    wall: (shell.finishedOuterDiameter - shell.finishedInnerDiameter) / 2,
    boardLeast: apothem - innerFace(shell, reach),
    boardLeastWithoutTabs: apothem - innerFace(shell, 0),
    tabProud: 2 * reach * Math.tan(beta),
    blankHalfWidthLeast: apothem * Math.tan(beta) + reach / Math.cos(beta),
  };
}

/**
 * The greatest distance from the axis at which a stave's inner face leaves no hollow after boring to R_i
 * with skim s: cos β · √((R_i − s)² − H²) − H sin β. A tab lies in its own stave's plane, so H beyond the
 * joint line it lifts off the circle; its far end must still reach inside R_i − s. NaN when the bore is
 * smaller than the tab (R_i − s < H), which no accepted layout has.
 */
function innerFace(shell: RingSizes, reach: Millimetres): Millimetres {
  const beta = toRadians(180 / shell.staves);
  const bored = shell.finishedInnerDiameter / 2 - shell.skimAllowance;
  return Math.cos(beta) * Math.sqrt(bored ** 2 - reach ** 2) - reach * Math.sin(beta);
}
