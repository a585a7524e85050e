/** What the canvas needs to know of a layout's tiles to draw and pick them; made anew when shell or joint change. */
import { pathData } from '@exports/svg/path-data';
import type { Segment } from '@shared/geometry/segment';
import { closeProfile } from '@shared/joint/edge-profile';
import { roundStave, type Grid } from '@shared/layout/cells';
import type { Joint, Layout, Shell } from '@shared/layout/schema';
import { tileEdges, type EdgeKind, type Side, type TileEdges } from '@shared/pieces/tile-edges';
import { nominalTileOutline, type TileOutline } from '@shared/pieces/tile-outline';
import type { Millimetres } from '@shared/units/length';
import type { ReachTiles } from './chunk-grid';
import { tilePicker, type TabChain, type TilePicker } from './tile-picking';
import type { SheetMm } from './viewport';

/** Paths about the tile's centre, y down, in millimetres. */
export interface TilePaths {
  readonly whole: Path2D;
  /** The sides a tile draws for itself and its neighbours: left and bottom, at the top end the top too. */
  readonly joints: Path2D;
}

export interface SheetDrawing {
  readonly grid: Grid;
  readonly size: SheetMm;
  readonly tileWidth: Millimetres;
  readonly tileHeight: Millimetres;
  readonly reach: ReachTiles;
  readonly pick: TilePicker;
  /** Paths of the tile at a stave, which may lie beyond the seam, and a course. */
  readonly pathsAt: (stave: number, course: number) => TilePaths;
}

/** The drawing of a shell with its joint; a joint that does not close is drawn as a straight edge. */
export function sheetDrawing(shell: Shell, joint: Joint): SheetDrawing {
  const { staves, courses, tileWidth, tileHeight } = shell;
  const grid = { staves, courses };
  const staveTab = tabOf(joint.staveJoint, tileHeight, joint.clearance);
  const courseTab = tabOf(joint.courseJoint, tileWidth, joint.clearance);
  const shape = { shell, joint };
  const outlineOf = (edges: TileEdges): TileOutline =>
    nominalTileOutline(shape, {
      left: staveTab ? edges.left : 'flat',
      right: staveTab ? edges.right : 'flat',
      bottom: courseTab ? edges.bottom : 'flat',
      top: courseTab ? edges.top : 'flat',
    });
  return {
    grid,
    size: { circumference: staves * tileWidth, height: courses * tileHeight },
    tileWidth,
    tileHeight,
    reach: {
      staves: Math.max(1, Math.ceil((staveTab ? joint.staveJoint.reach : 0) / tileWidth)),
      courses: Math.max(1, Math.ceil((courseTab ? joint.courseJoint.reach : 0) / tileHeight)),
    },
    pick: tilePicker({ grid, tileWidth, tileHeight, scheme: joint.scheme, staveTab, courseTab }),
    pathsAt: pathBook(grid, joint.scheme, outlineOf),
  };
}

function tabOf(
  parameters: Layout['joint']['staveJoint'],
  edgeLength: Millimetres,
  clearance: Millimetres,
): TabChain | null {
  const closed = closeProfile(parameters, edgeLength, clearance);
  return closed.ok ? closed.profile.segments : null;
}

/** Looks up a tile's paths, making those of each kind of outline the first time they are asked for. */
function pathBook(
  grid: Grid,
  scheme: Joint['scheme'],
  outlineOf: (edges: TileEdges) => TileOutline,
): SheetDrawing['pathsAt'] {
  const paths = new Map<number, TilePaths>();
  return (stave, course) => {
    const edges = tileEdges(scheme, grid, roundStave(grid, stave), course);
    const key = edgesNumber(edges);
    const known = paths.get(key);
    if (known) return known;
    const made = pathsOf(outlineOf(edges), course === grid.courses - 1 ? ENDS : INNER);
    paths.set(key, made);
    return made;
  };
}

const INNER: readonly Side[] = ['left', 'bottom'];
const ENDS: readonly Side[] = ['left', 'bottom', 'top'];

function pathsOf(outline: TileOutline, drawn: readonly Side[]): TilePaths {
  const bySide = (side: Side): Segment[] =>
    outline.segments.filter((_, i) => outline.sides[i] === side);
  const joints = drawn.map((side) => pathData(bySide(side), { flipY: true })).join('');
  return {
    whole: new Path2D(pathData(outline.segments, { flipY: true })),
    joints: new Path2D(joints),
  };
}

const KIND_NUMBER: Record<EdgeKind, number> = { flat: 0, tab: 1, socket: 2 };

function edgesNumber({ left, right, bottom, top }: TileEdges): number {
  return (
    KIND_NUMBER[left] + 3 * KIND_NUMBER[right] + 9 * KIND_NUMBER[bottom] + 27 * KIND_NUMBER[top]
  );
}
