import type { JointParameters } from '@shared/joint/parameters';
import type { JointName } from '../../drawing/joint-frame';
import type { Wishes } from '../layout-proposal';

/** Which joint is being shaped: one of the two, or both alike. */
export type JointTarget = 'both' | JointName;

/** The joint that stands for the target: its parameters are shown and drawn. */
export function jointShown(target: JointTarget): JointName {
  return target === 'both' ? 'courseJoint' : target;
}

/** The fields that shaping the target sets. */
export function wishesFor(target: JointTarget, parameters: JointParameters): Wishes {
  switch (target) {
    case 'both':
      return { 'joint.staveJoint': parameters, 'joint.courseJoint': parameters };
    case 'staveJoint':
      return { 'joint.staveJoint': parameters };
    case 'courseJoint':
      return { 'joint.courseJoint': parameters };
  }
}

/** The length of the edge the joint lies on: a stave joint on the tile's height, a course joint on its width. */
export function edgeLengthOf(
  joint: JointName,
  tile: { readonly tileWidth: number; readonly tileHeight: number },
): number {
  return joint === 'staveJoint' ? tile.tileHeight : tile.tileWidth;
}
