/**
 * The smallest round joint a cutter can make: the inverse of the cutter fit. Inside radii after clearance
 * are r_f + c/2 and r_h + c/2 and the mouth is neck + c; each is held to the cutter with the finishing
 * margin, and the reach follows from the wished undercut by the tangency of round-profile.ts.
 */
import type { Millimetres } from '../units/length';
import type { RoundParameters, Scheme } from './parameters';
import { LEAST_WOOD } from './refusal';
import { roundShape } from './round-profile';

export interface SmallestJointWish {
  readonly cutterDiameter: Millimetres;
  /** Share by which inside radii and the mouth exceed the cutter. */
  readonly finishingMargin: number;
  readonly clearance: Millimetres;
  /** How far the head is to be wider than the neck on each side. */
  readonly undercut: Millimetres;
  readonly scheme: Scheme;
  /** Least wood between two sockets. */
  readonly webMinimum: Millimetres;
}

export interface SmallestJoint {
  /** The exact least figures. */
  readonly filletRadius: Millimetres;
  readonly neck: Millimetres;
  readonly headRadius: Millimetres;
  readonly reach: Millimetres;
  /** Least side of a square tile that holds this joint on all its sides. */
  readonly tileLeast: Millimetres;
  /** The same joint in hundredths of a millimetre, none of its figures under the least. */
  readonly parameters: RoundParameters;
}

/** The least joint for a cutter, and the least tile it allows. */
export function smallestJoint(wish: SmallestJointWish): SmallestJoint {
  const insideLeast = (wish.cutterDiameter / 2) * (1 + wish.finishingMargin);
  const filletRadius = Math.max(0, insideLeast - wish.clearance / 2);
  // the mouth takes the cutter, and the clearance leaves some neck
  const neck = Math.max(2 * insideLeast - wish.clearance, wish.clearance + LEAST_WOOD);
  const headRadius = neck / 2 + wish.undercut;
  const reach = reachFor(headRadius, filletRadius, neck);
  return {
    filletRadius,
    neck,
    headRadius,
    reach,
    tileLeast: tileLeast({ profile: 'round', headRadius, filletRadius, reach }, wish),
    parameters: roundedJoint(filletRadius, headRadius, neck, wish.undercut),
  };
}

/** Reach at which a head on these fillets leaves this neck: h = r_f + √((r_h + r_f)² − (neck/2 + r_f)²). */
function reachFor(
  headRadius: Millimetres,
  filletRadius: Millimetres,
  neck: Millimetres,
): Millimetres {
  const between = headRadius + filletRadius;
  return between + Math.sqrt(Math.max(0, between ** 2 - (neck / 2 + filletRadius) ** 2));
}

const STEP: Millimetres = 0.01;

function roundedJoint(
  filletLeast: Millimetres,
  headLeast: Millimetres,
  neckLeast: Millimetres,
  undercut: Millimetres,
): RoundParameters {
  const filletRadius = roundedUp(filletLeast);
  for (let headRadius = roundedUp(headLeast); ; headRadius = roundedUp(headRadius + STEP)) {
    const reach = roundedUp(reachFor(headRadius, filletRadius, 2 * (headRadius - undercut)));
    const parameters: RoundParameters = { profile: 'round', headRadius, filletRadius, reach };
    // rounding the reach up narrows the neck a little; a hundredth more of head makes up for it
    if (roundShape(parameters).neck >= neckLeast) return parameters;
  }
}

function roundedUp(length: Millimetres): Millimetres {
  return Number((Math.ceil(length / STEP - 1e-6) * STEP).toFixed(2));
}

/** Least square tile: shoulders meet, and the webs between the sockets and beside their heads hold. */
function tileLeast(parameters: RoundParameters, wish: SmallestJointWish): Millimetres {
  const { headRadius, reach } = parameters;
  const { clearance, webMinimum } = wish;
  // a fillet under c/2 becomes a sharp lip where one of c/2 would end
  const filletRadius = Math.max(parameters.filletRadius, clearance / 2);
  const shoulders = 2 * roundShape({ ...parameters, filletRadius }).shoulder + clearance;
  const head = 2 * headRadius + clearance;
  // the sides beside a socket stand back by c/2 each
  const besideHead = head + clearance + 2 * webMinimum;
  const betweenOpposite = 2 * reach + clearance + webMinimum;
  if (wish.scheme === 'alternating') return Math.max(shoulders, besideHead, betweenOpposite);
  // one-way: the sockets lie on neighbouring sides; their heads' centres are √2 · (tile/2 − h) apart
  const height = reach - headRadius;
  const betweenNeighbours = 2 * height + Math.SQRT2 * (head + webMinimum);
  return Math.max(shoulders, besideHead, betweenNeighbours);
}
