/**
 * Taper: a cutter that bends or runs out leaves an edge that leans out by δ over the board. Two tiles cut
 * the same way up close their gap from c on one face to c − 2δ on the other; one cut face up and its
 * neighbour face down keep it even at c − δ.
 */
import type { Millimetres } from '../units/length';

/** δ from a test tab measured on both faces: half of how much wider it is at the deep face. */
export function measuredTaper(
  widthAtDeepFace: Millimetres,
  widthAtShallowFace: Millimetres,
): Millimetres {
  return (widthAtDeepFace - widthAtShallowFace) / 2;
}

/** The gap of a joint at the two faces of the board. */
export interface FaceGaps {
  readonly wide: Millimetres;
  readonly narrow: Millimetres;
}

/** The gaps that a clearance c and a taper δ leave; a negative gap is wood in the way. */
export function gapsWithTaper(
  clearance: Millimetres,
  taper: Millimetres,
  turned: 'turned-over' | 'same-way-up',
): FaceGaps {
  return turned === 'turned-over'
    ? { wide: clearance - taper, narrow: clearance - taper }
    : { wide: clearance, narrow: clearance - 2 * taper };
}

/** The clearance that leaves the wished gap: wished + δ turned over, wished + 2δ not. */
export function recommendedClearance(
  wishedGap: Millimetres,
  taper: Millimetres,
  turned: 'turned-over' | 'same-way-up',
): Millimetres {
  return wishedGap + (turned === 'turned-over' ? taper : 2 * taper);
}
