import type { Segment } from '../geometry/segment';
import type { Millimetres } from '../units/length';

/**
 * A tab drawn on its edge line: x along the edge, y outward, symmetric about x = 0, travelling towards +x
 * from (−shoulder, 0) to (shoulder, 0), before clearance.
 */
export interface ProfileShape {
  readonly segments: readonly Segment[];
  /** Where the straight shoulder begins, from the middle. */
  readonly shoulder: Millimetres;
  readonly reach: Millimetres;
  /** Width of the tab at its narrowest. */
  readonly neck: Millimetres;
  /** Width of the head at its widest. */
  readonly headWidth: Millimetres;
  /** How far the head is wider than the neck on each side; 0 for a wave, which does not lock. */
  readonly undercut: Millimetres;
  /** Radius of the inside arc at the tab's foot: fillet or root. */
  readonly footRadius: Millimetres;
  /** Radius of the tab's outside arc, which is the inside arc of the socket: head or tip. */
  readonly headRadius: Millimetres;
}
