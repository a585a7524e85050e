import type { Millimetres } from '../units/length';
import { clearedEdge, edgeProfile, type ClearedEdge, type EdgeProfile } from './edge-profile';
import type { JointParameters } from './parameters';

/** Both halves of one joint, ready to be set on the sides of tiles. */
export interface MatingEdges {
  readonly profile: EdgeProfile;
  readonly tab: ClearedEdge;
  readonly socket: ClearedEdge;
  /** How far shoulders stand back from the edge line: c/2. */
  readonly inset: Millimetres;
}

/** The halves of a joint whose parameters close, each moved into its own wood by half the clearance. */
export function matingEdges(parameters: JointParameters, clearance: Millimetres): MatingEdges {
  const profile = edgeProfile(parameters);
  return {
    profile,
    tab: clearedEdge(profile, 'tab', clearance),
    socket: clearedEdge(profile, 'socket', clearance),
    inset: clearance / 2,
  };
}
