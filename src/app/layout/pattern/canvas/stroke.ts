/**
 * The tiles under the way of the pointer from one sample to the next. The way is walked square by square
 * (Amanatides and Woo, "A fast voxel traversal algorithm for ray tracing", 1987), so a fast stroke has no
 * gaps; in each square the owner is asked a few times, so a tab the way passes over is laid too.
 */
import type { Tile } from '@shared/layout/extent';
import type { Millimetres, PointMm } from '@shared/units/length';
import type { TilePicker } from './tile-picking';

/** How often a square's width is asked for its owner: tabs are wider than an eighth of a tile. */
const SAMPLES_ACROSS = 8;

interface SquareSize {
  readonly tileWidth: Millimetres;
  readonly tileHeight: Millimetres;
}

/** The tiles from one point to another in the order met, both ends' tiles included, none twice in a row. */
export function tilesBetween(
  pick: TilePicker,
  size: SquareSize,
  from: PointMm,
  to: PointMm,
): Tile[] {
  const tiles: Tile[] = [];
  const add = (share: number): void => {
    const tile = pick(pointBetween(from, to, share));
    const last = tiles[tiles.length - 1];
    if (tile && !(last && last.stave === tile.stave && last.course === tile.course))
      tiles.push(tile);
  };
  const step = Math.min(size.tileWidth, size.tileHeight) / SAMPLES_ACROSS;
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  add(0);
  for (const [enter, leave] of squareSpans(size, from, to)) {
    const samples = Math.max(1, Math.ceil(((leave - enter) * length) / step));
    for (let i = 0; i < samples; i++) add(enter + ((leave - enter) * (i + 0.5)) / samples);
  }
  add(1);
  return tiles;
}

/** Shares of the way at which it enters and leaves each square it crosses. */
function squareSpans(size: SquareSize, from: PointMm, to: PointMm): [number, number][] {
  const crossings = [
    ...gridCrossings(from.x / size.tileWidth, to.x / size.tileWidth),
    ...gridCrossings(from.y / size.tileHeight, to.y / size.tileHeight),
  ].sort((a, b) => a - b);
  const bounds = [0, ...crossings, 1];
  return bounds
    .slice(1)
    .map((leave, i): [number, number] => [bounds[i] ?? 0, leave])
    .filter(([enter, leave]) => leave > enter);
}

function gridCrossings(from: number, to: number): number[] {
  const low = Math.min(from, to);
  const high = Math.max(from, to);
  const shares: number[] = [];
  for (let line = Math.floor(low) + 1; line < high; line++) {
    shares.push((line - from) / (to - from));
  }
  return shares;
}

function pointBetween(from: PointMm, to: PointMm, share: number): PointMm {
  return { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
}
