/** How far one touch reaches: the tiles that change when a tile is pointed at. */
import { cellAt, roundStave, type Grid } from './cells';

export const EXTENTS = ['tile', 'course', 'stave'] as const;
export type Extent = (typeof EXTENTS)[number];

/** A tile by stave and course, both from 0; the stave may lie beyond the seam. */
export interface Tile {
  readonly stave: number;
  readonly course: number;
}

/** Positions of the tiles an extent covers around a tile; none when the course is off the shell. */
export function positionsWithin(grid: Grid, extent: Extent, tile: Tile): number[] {
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
  }
}
