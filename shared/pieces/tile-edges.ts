import type { Scheme } from '../joint/parameters';
import type { Grid } from '../layout/cells';

export type EdgeKind = 'tab' | 'socket' | 'flat';
export type Side = 'left' | 'right' | 'bottom' | 'top';

/** What each side of a tile carries, as seen from outside. */
export interface TileEdges {
  readonly left: EdgeKind;
  readonly right: EdgeKind;
  readonly bottom: EdgeKind;
  readonly top: EdgeKind;
}

/**
 * The edges of the tile at a stave and course (both from 0). Alternating: an even tile has tabs on its two
 * stave joints and sockets on its two course joints, an odd one the reverse. One-way: tabs right and up.
 * The two ends of the shell are flat.
 */
export function tileEdges(scheme: Scheme, grid: Grid, stave: number, course: number): TileEdges {
  const inner = scheme === 'one-way' ? ONE_WAY : (stave + course) % 2 === 0 ? EVEN : ODD;
  return {
    ...inner,
    bottom: course === 0 ? 'flat' : inner.bottom,
    top: course === grid.courses - 1 ? 'flat' : inner.top,
  };
}

const ONE_WAY: TileEdges = { left: 'socket', right: 'tab', bottom: 'socket', top: 'tab' };
const EVEN: TileEdges = { left: 'tab', right: 'tab', bottom: 'socket', top: 'socket' };
const ODD: TileEdges = { left: 'socket', right: 'socket', bottom: 'tab', top: 'tab' };

/** The edges after half a turn in the plane: the grain still runs along the stave. */
export function halfTurned(edges: TileEdges): TileEdges {
  return { left: edges.right, right: edges.left, bottom: edges.top, top: edges.bottom };
}

/** The edges of the piece lying face down: left and right change places. */
export function faceDown(edges: TileEdges): TileEdges {
  return { ...edges, left: edges.right, right: edges.left };
}
