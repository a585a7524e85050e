/** Offsets of fine chords by clipper2-ts 2.0.1 (BSL), which knows nothing of arcs. */
import { areaPathsD, EndType, inflatePathsD, JoinType, type PathsD } from 'clipper2-ts';
import type { Segment } from '@shared/geometry/segment';
import { chordsOf } from './true-arcs';

/** Decimals of a millimetre that clipper keeps. */
const DECIMALS = 6;

/** The outline as one path of chords. */
export function pathOf(segments: readonly Segment[], chordTolerance: number): PathsD {
  return [chordsOf(segments, chordTolerance).map(({ x, y }) => ({ x, y }))];
}

/** The paths grown (or, below nothing, shrunk), outside corners rounded. */
export function inflated(paths: PathsD, outward: number, chordTolerance: number): PathsD {
  return inflatePathsD(
    paths,
    outward,
    JoinType.Round,
    EndType.Polygon,
    2,
    DECIMALS,
    chordTolerance,
  );
}

/** Area of paths in mm². */
export function areaWithin(paths: PathsD): number {
  return areaPathsD(paths);
}
