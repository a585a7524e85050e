/**
 * One touch repeated round the shell. The k-th repeat lies k sectors further round and k steps higher; what
 * steps over an end of the shell stops there, or wraps and comes in again at the other end. A mirrored touch
 * lays the whole set a second time, reflected at the seam (stave s ↔ N + 1 − s) or at mid-height, so it comes
 * out symmetric wherever it began.
 */
import { cellAt, tileOf, type Grid } from './cells';
import { positionsWithin, type LaidGrid, type Tile, type Touch } from './extent';

export const MIRRORS = ['none', 'at-seam', 'at-mid-height', 'both'] as const;
export type Mirror = (typeof MIRRORS)[number];

export const AT_THE_END = ['stop', 'wrap'] as const;
/** What repeats do that step over the upper or the lower end. */
export type AtTheEnd = (typeof AT_THE_END)[number];

export interface Repeats {
  /** How often round the shell; divides the number of staves. */
  readonly times: number;
  /** Courses up (or, negative, down) from one repeat to the next. */
  readonly step: number;
  /** Only matters where the repeats step. */
  readonly atTheEnd: AtTheEnd;
  readonly mirror: Mirror;
}

export const ONCE: Repeats = { times: 1, step: 0, atTheEnd: 'stop', mirror: 'none' };

/** The counts that divide a number of staves, least first. */
export function timesRound(staves: number): number[] {
  return Array.from({ length: staves }, (_, i) => i + 1).filter((times) => staves % times === 0);
}

/** Positions one touch lays: what it covers, repeated and mirrored; ascending, none twice. */
export function positionsTouched(grid: LaidGrid, touch: Touch, repeats: Repeats = ONCE): number[] {
  const whole = touch.extent === 'course' || touch.extent === 'stave';
  const positions = whole
    ? imagesOf(grid, touch.tile, repeats).flatMap((tile) =>
        positionsWithin(grid, { ...touch, tile }),
      )
    : positionsWithin(grid, touch).flatMap((position) =>
        imagesOf(grid, tileOf(grid, position), repeats).map(({ stave, course }) =>
          cellAt(grid, stave, course),
        ),
      );
  return [...new Set(positions)].sort((a, b) => a - b);
}

/** A tile and its repeats, each with its mirror images, as far as they lie on the shell. */
export function imagesOf(grid: Grid, tile: Tile, repeats: Repeats): Tile[] {
  return repeatedTiles(grid, tile, repeats)
    .flatMap((repeat) => mirroredTiles(grid, repeat, repeats.mirror))
    .filter(({ course }) => course >= 0 && course < grid.courses);
}

function repeatedTiles(grid: Grid, tile: Tile, { times, step, atTheEnd }: Repeats): Tile[] {
  const sector = grid.staves / times;
  const wraps = atTheEnd === 'wrap' && step !== 0;
  return Array.from({ length: times }, (_, k) => {
    const course = tile.course + k * step;
    return {
      stave: tile.stave + Math.round(k * sector),
      course: wraps ? roundCourse(grid, course) : course,
    };
  });
}

function roundCourse({ courses }: Grid, course: number): number {
  return ((course % courses) + courses) % courses;
}

function mirroredTiles(grid: Grid, tile: Tile, mirror: Mirror): Tile[] {
  const staves = [tile.stave];
  const courses = [tile.course];
  if (mirror === 'at-seam' || mirror === 'both') staves.push(grid.staves - 1 - tile.stave);
  if (mirror === 'at-mid-height' || mirror === 'both') courses.push(grid.courses - 1 - tile.course);
  return staves.flatMap((stave) => courses.map((course) => ({ stave, course })));
}
