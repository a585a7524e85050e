/**
 * The outline of a tile: four edges set on the sides of a rectangle whose centre is the origin, y up, as
 * seen from outside, counter-clockwise from the bottom left corner. Shoulders of neighbouring sides meet
 * square at the corner, each moved in by its own half clearance; a flat end does not move.
 */
import type { Outline } from '../geometry/outline';
import { placeSegment, type Placement } from '../geometry/placement';
import { lengthOf, type LineSegment, type Segment } from '../geometry/segment';
import { POINT_TOLERANCE } from '../geometry/tolerance';
import { matingEdges, type MatingEdges } from '../joint/mating-edges';
import type { Joint, Shell } from '../layout/schema';
import type { Millimetres } from '../units/length';
import type { EdgeKind, Side, TileEdges } from './tile-edges';

/** An outline that still knows which side of the tile each of its segments belongs to. */
export interface TileOutline extends Outline {
  /** One side a segment, in the order of `segments`. */
  readonly sides: readonly Side[];
}

/** The parts of a layout that shape its tiles. */
export interface TileShape {
  readonly shell: Pick<Shell, 'tileWidth' | 'tileHeight'>;
  readonly joint: Joint;
}

/** The outline to cut: with clearance. */
export function tileOutline(layout: TileShape, edges: TileEdges): TileOutline {
  return outlineWithClearance(layout, edges, layout.joint.clearance);
}

/** The outline before clearance: neighbours share their edges exactly. */
export function nominalTileOutline(layout: TileShape, edges: TileEdges): TileOutline {
  return outlineWithClearance(layout, edges, 0);
}

/** What makes two tiles of one layout the same outline. */
export function edgesKey(edges: TileEdges): string {
  return `${edges.left} ${edges.right} ${edges.bottom} ${edges.top}`;
}

function outlineWithClearance(
  layout: TileShape,
  edges: TileEdges,
  clearance: Millimetres,
): TileOutline {
  const staveJoint = matingEdges(layout.joint.staveJoint, clearance);
  const courseJoint = matingEdges(layout.joint.courseJoint, clearance);
  const insetOf = (side: Side) => (edges[side] === 'flat' ? 0 : clearance / 2);
  const segments: Segment[] = [];
  const sides: Side[] = [];
  for (const { side, before, after } of WALK) {
    const along = side === 'bottom' || side === 'top';
    const half = (along ? layout.shell.tileWidth : layout.shell.tileHeight) / 2;
    const chain = sideChain(
      edges[side],
      along ? courseJoint : staveJoint,
      -half + insetOf(before),
      half - insetOf(after),
    );
    const placement = sidePlacement(layout, side);
    for (const segment of chain) {
      segments.push(placeSegment(placement, segment));
      sides.push(side);
    }
  }
  return { segments, sides };
}

/** The sides in counter-clockwise order, each with its neighbours. */
const WALK: readonly { side: Side; before: Side; after: Side }[] = [
  { side: 'bottom', before: 'left', after: 'right' },
  { side: 'right', before: 'bottom', after: 'top' },
  { side: 'top', before: 'right', after: 'left' },
  { side: 'left', before: 'top', after: 'bottom' },
];

/** One side in its own coordinates: x along the walk, y outward. */
function sideChain(
  kind: EdgeKind,
  joint: MatingEdges,
  from: Millimetres,
  to: Millimetres,
): Segment[] {
  if (kind === 'flat') return [line(from, to, 0)];
  const edge = joint[kind];
  const chain = [
    line(from, edge.from, -joint.inset),
    ...edge.segments,
    line(edge.to, to, -joint.inset),
  ];
  return chain.filter((segment) => segment.kind === 'arc' || lengthOf(segment) > POINT_TOLERANCE);
}

function line(from: Millimetres, to: Millimetres, y: Millimetres): LineSegment {
  return { kind: 'line', from: { x: from, y }, to: { x: to, y } };
}

function sidePlacement(layout: TileShape, side: Side): Placement {
  const { tileWidth, tileHeight } = layout.shell;
  switch (side) {
    case 'bottom':
      return place(0, -tileHeight / 2, { x: 1, y: 0 }, { x: 0, y: -1 });
    case 'right':
      return place(tileWidth / 2, 0, { x: 0, y: 1 }, { x: 1, y: 0 });
    case 'top':
      return place(0, tileHeight / 2, { x: -1, y: 0 }, { x: 0, y: 1 });
    case 'left':
      return place(-tileWidth / 2, 0, { x: 0, y: -1 }, { x: -1, y: 0 });
  }
}

function place(
  x: Millimetres,
  y: Millimetres,
  xAxis: Placement['xAxis'],
  yAxis: Placement['yAxis'],
): Placement {
  return { origin: { x, y }, xAxis, yAxis };
}
