/**
 * A scatter without clumps. Tiles are ranked one after another, each where the ones before leave the most
 * room on the cylinder (after the void-filling half of Ulichney's void-and-cluster, Proc. SPIE 1913, 1993;
 * from memory), so the seam is no edge to it. Each wood then takes a run of ranks as long as its share. A
 * tile is felt with the cube of its nearness, which has no scale of its own: few tiles spread as evenly as
 * many. Only the courses a tile is felt in are searched again, so 28 800 tiles take well under a second.
 */
import { roundStave, type Grid } from '../cells';
import type { LaidPattern, Scatter } from './starting-pattern';

/** How far a laid tile is felt, in tiles; beyond, its effect is under 1/200. */
const REACH = 6;

/** What a tile feels of its own reflection in the ends: found by eye, so that ends are neither full nor bare. */
const EDGE_SHARE = 0.1;

/** The scatter laid: counts are exact to the tile (largest remainder), any seed meets at the seam. */
export function layScatter(pattern: Scatter, grid: Grid): LaidPattern {
  const order = evenOrder(grid, pattern.seed);
  const counts = countsOf(pattern, order.length);
  const cells = new Uint8Array(order.length);
  let next = 0;
  pattern.shares.forEach(({ wood }, i) => {
    for (let n = counts[i] ?? 0; n > 0; n--) cells[order[next++] ?? 0] = wood;
  });
  return { meets: true, cells, period: grid.staves };
}

/** How many tiles each wood gets: shares of the total, remainders to the largest. */
function countsOf(pattern: Scatter, tiles: number): number[] {
  const sum = pattern.shares.reduce((total, { share }) => total + share, 0);
  const exact = pattern.shares.map(({ share }) => (sum > 0 ? (share / sum) * tiles : 0));
  const counts = exact.map(Math.floor);
  const byRemainder = [...exact.keys()].sort(
    (a, b) => ((exact[b] ?? 0) % 1) - ((exact[a] ?? 0) % 1) || a - b,
  );
  let missing = tiles - counts.reduce((total, n) => total + n, 0);
  for (const i of byRemainder) {
    if (missing-- <= 0) break;
    counts[i] = (counts[i] ?? 0) + 1;
  }
  return counts;
}

/** Every tile once, each next one where the ones before leave the most room. */
function evenOrder(grid: Grid, seed: number): Int32Array {
  const { staves, courses } = grid;
  const random = seededRandom(seed);
  const crowding = Float64Array.from({ length: staves * courses }, (_, tile) => {
    const course = Math.floor(tile / staves);
    const ownReflections = EDGE_SHARE * (felt(2 * course + 1) + felt(2 * (courses - course) - 1));
    // the rest is less than any tile's effect: it decides ties and makes each seed its own scatter
    return ownReflections + random() * 1e-3;
  });
  const emptiest = Int32Array.from({ length: courses }, (_, course) =>
    emptiestOf(crowding, course * staves, staves),
  );
  return Int32Array.from({ length: staves * courses }, () => {
    const tile = emptiest.reduce((a, b) =>
      (crowding[b] as number) < (crowding[a] as number) ? b : a,
    );
    crowd(crowding, grid, tile);
    crowding[tile] = Infinity;
    const course = Math.floor(tile / staves);
    for (let c = Math.max(0, course - REACH); c <= Math.min(courses - 1, course + REACH); c++) {
      emptiest[c] = emptiestOf(crowding, c * staves, staves);
    }
    return tile;
  });
}

function emptiestOf(crowding: Float64Array, from: number, length: number): number {
  let emptiest = from;
  for (let i = from + 1; i < from + length; i++) {
    if ((crowding[i] as number) < (crowding[emptiest] as number)) emptiest = i;
  }
  return emptiest;
}

function crowd(crowding: Float64Array, grid: Grid, tile: number): void {
  const { staves, courses } = grid;
  const [stave, course] = [tile % staves, Math.floor(tile / staves)];
  for (let up = -REACH; up <= REACH; up++) {
    const row = mirrored(course + up, courses) * staves;
    for (let across = -REACH; across <= REACH; across++) {
      const index = row + roundStave(grid, stave + across);
      crowding[index] = (crowding[index] as number) + felt(Math.hypot(across, up));
    }
  }
}

/** How much of a tile is felt at a distance, in tiles. */
function felt(distance: number): number {
  return 1 / Math.max(1, distance) ** 3;
}

/** The ends of the shell reflect: without it tiles would gather where nothing crowds them from outside. */
function mirrored(course: number, courses: number): number {
  const lap = ((course % (2 * courses)) + 2 * courses) % (2 * courses);
  return lap < courses ? lap : 2 * courses - 1 - lap;
}

/** Repeatable numbers from 0 to 1 (mulberry32, public domain, Tommy Ettinger). */
function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
