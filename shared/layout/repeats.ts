/**
 * One touch repeated round the shell. The k-th repeat lies k sectors further round and k steps higher; what
 * steps over an end of the shell is left out. A mirrored touch lays the whole set a second time, reflected
 * at the seam (stave s ↔ N + 1 − s) or at mid-height, so it comes out symmetric wherever it began.
 */
import type { Grid } from './cells';
import { positionsWithin, type Extent, type Tile } from './extent';

export const MIRRORS = ['none', 'at-seam', 'at-mid-height', 'both'] as const;
export type Mirror = (typeof MIRRORS)[number];

export interface Repeats {
  /** How often round the shell; divides the number of staves. */
  readonly times: number;
  /** Courses up (or, negative, down) from one repeat to the next. */
  readonly step: number;
  readonly mirror: Mirror;
}

export const ONCE: Repeats = { times: 1, step: 0, mirror: 'none' };

/** The counts that divide a number of staves, least first. */
export function timesRound(staves: number): number[] {
  return Array.from({ length: staves }, (_, i) => i + 1).filter((times) => staves % times === 0);
}

/** Positions one touch lays: the extent around the tile, repeated and mirrored; ascending, none twice. */
export function positionsTouched(
  grid: Grid,
  extent: Extent,
  tile: Tile,
  repeats: Repeats = ONCE,
): number[] {
  const touched = repeatedTiles(grid, tile, repeats).flatMap((repeat) =>
    mirroredTiles(grid, repeat, repeats.mirror),
  );
  const positions = touched.flatMap((one) => positionsWithin(grid, extent, one));
  return [...new Set(positions)].sort((a, b) => a - b);
}

function repeatedTiles(grid: Grid, tile: Tile, { times, step }: Repeats): Tile[] {
  const sector = grid.staves / times;
  return Array.from({ length: times }, (_, k) => ({
    stave: tile.stave + Math.round(k * sector),
    course: tile.course + k * step,
  }));
}

function mirroredTiles(grid: Grid, tile: Tile, mirror: Mirror): Tile[] {
  const staves = [tile.stave];
  const courses = [tile.course];
  if (mirror === 'at-seam' || mirror === 'both') staves.push(grid.staves - 1 - tile.stave);
  if (mirror === 'at-mid-height' || mirror === 'both') courses.push(grid.courses - 1 - tile.course);
  return staves.flatMap((stave) => courses.map((course) => ({ stave, course })));
}
