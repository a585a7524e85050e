import { closeProfile, edgeProfile } from '@shared/joint/edge-profile';
import type { JointParameters } from '@shared/joint/parameters';
import type { Millimetres } from '@shared/units/length';

const FLANK_ANGLE = 10;
/** Radii of the new profile are tried from these shares of the old fillet downwards, until one closes. */
const SHARES = [1, 0.8, 0.6, 0.4, 0.2, 0.05];

/**
 * A joint of the other profile with the same reach and about the same neck, for an edge of this length;
 * null when none of those tried closes.
 */
export function otherProfile(
  parameters: JointParameters,
  edgeLength: Millimetres,
  clearance: Millimetres,
): JointParameters | null {
  const tried = SHARES.map((share) =>
    parameters.profile === 'round' ? dovetailLike(parameters, share) : roundLike(parameters, share),
  );
  return tried.find((wished) => closeProfile(wished, edgeLength, clearance).ok) ?? null;
}

function dovetailLike(parameters: JointParameters, share: number): JointParameters {
  const { neck, reach, footRadius } = edgeProfile(parameters);
  const radius = hundredths(footRadius * share);
  return {
    profile: 'dovetail',
    rootWidth: hundredths(neck),
    flankAngle: FLANK_ANGLE,
    reach,
    tipRadius: radius,
    rootRadius: radius,
  };
}

/** The head takes half the dovetail's width; a reach of more than head and fillet together locks it. */
function roundLike(parameters: JointParameters, share: number): JointParameters {
  const { headWidth, reach, footRadius } = edgeProfile(parameters);
  const filletRadius = hundredths(footRadius * share);
  const headRadius = hundredths(Math.min(headWidth / 2, (reach - filletRadius) * 0.62));
  return { profile: 'round', headRadius: Math.max(headRadius, 0.2), filletRadius, reach };
}

function hundredths(length: Millimetres): Millimetres {
  return Math.round(length * 100) / 100;
}
