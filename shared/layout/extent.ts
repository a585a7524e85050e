/** How far one touch reaches: the tiles that change when a tile is pointed at. */
import { cellAt, roundStave, tileOf, type Grid } from './cells';

export const EXTENTS = ['tile', 'course', 'stave', 'patch', 'wood', 'connected'] as const;
export type Extent = (typeof EXTENTS)[number];

/** A tile by stave and course, both from 0; the stave may lie beyond the seam. */
export interface Tile {
  readonly stave: number;
  readonly course: number;
}

/** The laid pattern a touch lands on. */
export interface LaidGrid extends Grid {
  readonly cells: Uint8Array;
}

/** A tile touched; for a patch also the corner it was dragged out from. */
export interface Touch {
  readonly extent: Extent;
  readonly tile: Tile;
  readonly corner?: Tile;
}

/** Positions of the tiles a touch covers, none twice; none when it is off the shell. */
export function positionsWithin(grid: LaidGrid, { extent, tile, corner }: Touch): number[] {
  if (extent === 'patch') return patchPositions(grid, corner ?? tile, tile);
  if (tile.course < 0 || tile.course >= grid.courses) return [];
  switch (extent) {
    case 'tile':
      return [cellAt(grid, tile.stave, tile.course)];
    case 'course':
      return Array.from({ length: grid.staves }, (_, stave) => cellAt(grid, stave, tile.course));
    case 'stave': {
      const stave = roundStave(grid, tile.stave);
      return Array.from({ length: grid.courses }, (_, course) => cellAt(grid, stave, course));
    }
    case 'wood':
      return positionsOfWood(grid, grid.cells[cellAt(grid, tile.stave, tile.course)]);
    case 'connected':
      return connectedPositions(grid, tile);
  }
}

/** A rectangle of tiles: where its lower left corner lies and how far it reaches. */
export interface TileBox extends Tile {
  readonly staves: number;
  readonly courses: number;
}

/**
 * The rectangle between two corners, as far as it lies on the shell; null when it lies beside it. Staves are
 * counted on past the seam, so a rectangle dragged over the seam stays in one piece; one as wide as the
 * shell is the whole ring and no more.
 */
export function boxBetween(grid: Grid, a: Tile, b: Tile): TileBox | null {
  const stave = Math.min(a.stave, b.stave);
  const staves = Math.min(Math.abs(a.stave - b.stave) + 1, grid.staves);
  const course = Math.max(0, Math.min(a.course, b.course));
  const top = Math.min(grid.courses - 1, Math.max(a.course, b.course));
  return top < course
    ? null
    : { stave: roundStave(grid, stave), course, staves, courses: top - course + 1 };
}

/** Positions of a rectangle's tiles, course by course from the bottom. */
export function positionsInBox(grid: Grid, box: TileBox): number[] {
  return Array.from({ length: box.staves * box.courses }, (_, i) =>
    cellAt(grid, box.stave + (i % box.staves), box.course + Math.floor(i / box.staves)),
  );
}

function patchPositions(grid: Grid, a: Tile, b: Tile): number[] {
  const box = boxBetween(grid, a, b);
  return box ? positionsInBox(grid, box) : [];
}

function positionsOfWood({ cells }: LaidGrid, wood: number | undefined): number[] {
  return [...cells.keys()].filter((position) => cells[position] === wood);
}

/** The tiles of one wood that hang together over stave joints, course joints and the seam. */
function connectedPositions(grid: LaidGrid, tile: Tile): number[] {
  const start = cellAt(grid, tile.stave, tile.course);
  const met = new Set([start]);
  // a set is walked in the order it grows in, so it is its own queue
  for (const position of met) {
    for (const next of neighboursOf(grid, position)) {
      if (grid.cells[next] === grid.cells[start]) met.add(next);
    }
  }
  return [...met];
}

/** The up to four tiles joined to one. */
function neighboursOf(grid: Grid, position: number): number[] {
  const { stave, course } = tileOf(grid, position);
  const beside = [cellAt(grid, stave - 1, course), cellAt(grid, stave + 1, course)];
  if (course > 0) beside.push(position - grid.staves);
  if (course < grid.courses - 1) beside.push(position + grid.staves);
  return beside;
}
