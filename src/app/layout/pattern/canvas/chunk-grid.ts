/**
 * The sheet cut into square chunks of tiles, each drawn once into a bitmap. The last column and row may be
 * smaller. A chunk is drawn with every tile whose tabs can reach into it, so a laid tile repaints all
 * chunks its tabs reach, across the seam too.
 */
import { roundStave, tileOf, type Grid } from '@shared/layout/cells';

/** Tiles along each side of a chunk, at scales where its bitmap stays small enough. */
export const CHUNK_SPAN = 16;

/** How many tiles a tab can reach beyond its own square. */
export interface ReachTiles {
  readonly staves: number;
  readonly courses: number;
}

export interface ChunkGrid {
  readonly grid: Grid;
  readonly span: number;
  readonly columns: number;
  readonly rows: number;
  readonly reach: ReachTiles;
}

/** Tiles of a chunk: from (included) to (not included). */
export interface TileRange {
  readonly staveFrom: number;
  readonly staveTo: number;
  readonly courseFrom: number;
  readonly courseTo: number;
}

/** The sheet cut into chunks of `span` tiles a side. */
export function chunkGrid(grid: Grid, span: number, reach: ReachTiles): ChunkGrid {
  return {
    grid,
    span,
    columns: Math.ceil(grid.staves / span),
    rows: Math.ceil(grid.courses / span),
    reach,
  };
}

/** The tiles of a chunk; chunks are numbered row by row from the seam at the bottom. */
export function tilesOfChunk({ grid, span, columns }: ChunkGrid, chunk: number): TileRange {
  const column = chunk % columns;
  const row = Math.floor(chunk / columns);
  return {
    staveFrom: column * span,
    staveTo: Math.min(grid.staves, (column + 1) * span),
    courseFrom: row * span,
    courseTo: Math.min(grid.courses, (row + 1) * span),
  };
}

/** The tiles to draw for a chunk: its own and those that reach in; staves may lie beyond the seam. */
export function tilesDrawnFor(chunks: ChunkGrid, chunk: number): TileRange {
  const own = tilesOfChunk(chunks, chunk);
  return {
    staveFrom: own.staveFrom - chunks.reach.staves,
    staveTo: own.staveTo + chunks.reach.staves,
    courseFrom: Math.max(0, own.courseFrom - chunks.reach.courses),
    courseTo: Math.min(chunks.grid.courses, own.courseTo + chunks.reach.courses),
  };
}

/** The chunks on which a tile or one of its tabs shows. */
export function chunksTouchedBy(chunks: ChunkGrid, position: number): Set<number> {
  const { grid, span, columns, reach } = chunks;
  const { stave, course } = tileOf(grid, position);
  const touched = new Set<number>();
  for (let dc = -reach.courses; dc <= reach.courses; dc++) {
    if (course + dc < 0 || course + dc >= grid.courses) continue;
    const row = Math.floor((course + dc) / span);
    for (let ds = -reach.staves; ds <= reach.staves; ds++) {
      touched.add(row * columns + Math.floor(roundStave(grid, stave + ds) / span));
    }
  }
  return touched;
}
