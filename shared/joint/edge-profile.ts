import { offsetChain } from '../geometry/offset';
import { endOf, startOf, type Segment } from '../geometry/segment';
import type { Millimetres } from '../units/length';
import { dovetailRefusals, dovetailShape } from './dovetail-profile';
import type { JointParameters } from './parameters';
import type { ProfileShape } from './profile-shape';
import type { Refusal } from './refusal';
import { headHeight, roundRefusals, roundShape } from './round-profile';

/** A tab's shape and the inside radii it leaves on both pieces. */
export interface EdgeProfile extends ProfileShape {
  /** Inside radius of the tab piece (its foot) before clearance. */
  readonly insideRadiusOfTab: Millimetres;
  /** Inside radius of the socket piece (where the head lies) before clearance. */
  readonly insideRadiusOfSocket: Millimetres;
}

/** The profile of parameters that close (see `closeProfile`). */
export function edgeProfile(parameters: JointParameters): EdgeProfile {
  const shape = parameters.profile === 'round' ? roundShape(parameters) : dovetailShape(parameters);
  return {
    ...shape,
    insideRadiusOfTab: shape.footRadius,
    insideRadiusOfSocket: shape.headRadius,
  };
}

export type ProfileResult =
  | { readonly ok: true; readonly profile: EdgeProfile }
  | { readonly ok: false; readonly refusals: readonly Refusal[] };

/** The profile on an edge of this length with this clearance, or which parameter breaks which bound. */
export function closeProfile(
  parameters: JointParameters,
  edgeLength: Millimetres,
  clearance: Millimetres,
): ProfileResult {
  const refusals =
    parameters.profile === 'round'
      ? roundRefusals(parameters, edgeLength, clearance)
      : dovetailRefusals(parameters, edgeLength, clearance);
  return refusals.length > 0
    ? { ok: false, refusals }
    : { ok: true, profile: edgeProfile(parameters) };
}

/**
 * The mouth: the opening of the socket at its narrowest, after clearance. Null for a wave, which only gets
 * wider towards its opening. A foot radius under c/2 is a sharp lip after clearance, and the mouth lies
 * between the two lips.
 */
export function mouthOf(parameters: JointParameters, clearance: Millimetres): Millimetres | null {
  const profile = edgeProfile(parameters);
  const inset = clearance / 2;
  const foot = Math.max(profile.footRadius, inset);
  if (parameters.profile === 'round' && headHeight(parameters) <= foot) return null;
  if (profile.footRadius >= inset) return profile.neck + clearance;
  const socket = clearedEdge(profile, 'socket', clearance);
  return socket.to - socket.from;
}

/** One mating edge ready to cut: x along the edge, y outward, shoulders on y = −c/2. */
export interface ClearedEdge {
  readonly segments: readonly Segment[];
  /** Where the left and right shoulders begin, from the middle. */
  readonly from: Millimetres;
  readonly to: Millimetres;
}

/** Long enough for a shoulder to be found by any profile that re-meets it. */
const SHOULDER_REACH: Millimetres = 1000;

/**
 * The tab or the socket moved into its own wood by half the clearance (exact offset; inside radii grow by
 * c/2, outside radii shrink by it, and one smaller than c/2 becomes a sharp corner).
 */
export function clearedEdge(
  profile: ProfileShape,
  kind: 'tab' | 'socket',
  clearance: Millimetres,
): ClearedEdge {
  const outward = kind === 'tab' ? profile.segments : profile.segments.map(turnedInward);
  const far = profile.shoulder + SHOULDER_REACH;
  const left: Segment = {
    kind: 'line',
    from: { x: -far, y: 0 },
    to: { x: -profile.shoulder, y: 0 },
  };
  const right: Segment = {
    kind: 'line',
    from: { x: profile.shoulder, y: 0 },
    to: { x: far, y: 0 },
  };
  const chain = offsetChain([left, ...outward, right], clearance / 2);
  if (!chain) throw new Error('A profile that closes keeps its edges together under clearance.');
  return {
    segments: chain.slice(1, -1),
    from: endOf(chain[0] as Segment).x,
    to: startOf(chain.at(-1) as Segment).x,
  };
}

function turnedInward(segment: Segment): Segment {
  if (segment.kind === 'line') {
    const { from, to } = segment;
    return { kind: 'line', from: { x: from.x, y: -from.y }, to: { x: to.x, y: -to.y } };
  }
  const { centre, radius, startAngle, sweep } = segment;
  const mirrored = { x: centre.x, y: -centre.y };
  return { kind: 'arc', centre: mirrored, radius, startAngle: -startAngle, sweep: -sweep };
}
