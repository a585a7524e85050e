/**
 * Which tile owns a point of the unrolled shell. Arithmetic gives the square; then at most four edges are
 * asked, exactly, whether a neighbour's tab reaches over the point. Joints are taken without clearance: on
 * the screen every point belongs to a tile.
 */
import { insideTest } from '@shared/geometry/contains';
import type { Segment } from '@shared/geometry/segment';
import type { Scheme } from '@shared/joint/parameters';
import { roundStave, type Grid } from '@shared/layout/cells';
import type { Tile } from '@shared/layout/extent';
import { tileEdges, type Side } from '@shared/pieces/tile-edges';
import type { Millimetres, PointMm } from '@shared/units/length';

/** A tab standing on the x axis towards +y, its chain running between its two feet on the axis. */
export type TabChain = readonly Segment[];

export interface PickedSheet {
  readonly grid: Grid;
  readonly tileWidth: Millimetres;
  readonly tileHeight: Millimetres;
  readonly scheme: Scheme;
  /** Tabs of the stave joints and of the course joints; null where no joint closes: straight edges. */
  readonly staveTab: TabChain | null;
  readonly courseTab: TabChain | null;
}

/** The tile that owns a point, its stave unrounded when beyond the seam; null off the ends of the shell. */
export type TilePicker = (patternPoint: PointMm) => Tile | null;

interface Neighbour {
  readonly stave: number;
  readonly course: number;
  /** The side of the neighbour that faces the square. */
  readonly facing: Side;
}

const NEIGHBOURS: readonly Neighbour[] = [
  { stave: -1, course: 0, facing: 'right' },
  { stave: 1, course: 0, facing: 'left' },
  { stave: 0, course: -1, facing: 'top' },
  { stave: 0, course: 1, facing: 'bottom' },
];

/** A picker for a sheet; the joints' sides are worked out once. */
export function tilePicker(sheet: PickedSheet): TilePicker {
  const { grid, tileWidth, tileHeight, scheme } = sheet;
  const onStaveTab = tabTest(sheet.staveTab);
  const onCourseTab = tabTest(sheet.courseTab);

  const reaches = (square: Tile, { stave, course, facing }: Neighbour, local: PointMm): boolean => {
    const neighbour = { stave: square.stave + stave, course: square.course + course };
    if (neighbour.course < 0 || neighbour.course >= grid.courses) return false;
    const edges = tileEdges(scheme, grid, roundStave(grid, neighbour.stave), neighbour.course);
    if (edges[facing] !== 'tab') return false;
    return stave === 0
      ? onCourseTab({ x: local.x, y: tileHeight / 2 - course * local.y })
      : onStaveTab({ x: local.y, y: tileWidth / 2 - stave * local.x });
  };

  return (point) => {
    const square = {
      stave: Math.floor(point.x / tileWidth),
      course: Math.floor(point.y / tileHeight),
    };
    if (square.course < 0 || square.course >= grid.courses) return null;
    const local = {
      x: point.x - (square.stave + 0.5) * tileWidth,
      y: point.y - (square.course + 0.5) * tileHeight,
    };
    const over = NEIGHBOURS.find((neighbour) => reaches(square, neighbour, local));
    if (over === undefined) return square;
    return { stave: square.stave + over.stave, course: square.course + over.course };
  };
}

function tabTest(tab: TabChain | null): (point: PointMm) => boolean {
  return tab === null ? () => false : insideTest(tab);
}
