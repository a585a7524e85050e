/**
 * Exact geometry beside the sizes it does not depend on, and beside a library of chords. Outlines cost by
 * kind, not by tile; an exact offset of one outline is held against clipper2-ts on chords of 1e-3 mm.
 */
import { areaPathsD, EndType, inflatePathsD, JoinType, type PathsD } from 'clipper2-ts';
import { offsetOutline } from '@shared/geometry/offset';
import { areaOf, type Outline } from '@shared/geometry/outline';
import { notchedSquare } from '@shared/geometry/shapes.fixture';
import { runChecks } from '@shared/checks/run-checks';
import type { Layout } from '@shared/layout/schema';
import { printLayout, readLayoutText } from '@shared/layout/read-layout';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { tileOutline } from '@shared/pieces/tile-outline';
import { chordsOf } from '../reference/true-arcs';
import type { BenchRow } from './bench-row';
import { checkerLayout } from './checker-layout';

/** Milliseconds of one run, the median of batches taken in turn with the other's. */
function timed(runs: readonly [() => unknown, () => unknown], batch: number): [number, number] {
  const took: [number[], number[]] = [[], []];
  for (let i = 0; i < 21; i++) {
    runs.forEach((run, which) => {
      const start = performance.now();
      for (let j = 0; j < batch; j++) run();
      if (i > 5) took[which]?.push((performance.now() - start) / batch);
    });
  }
  const median = (figures: readonly number[]) =>
    [...figures].sort((a, b) => a - b)[figures.length >> 1] ?? NaN;
  return [median(took[0]), median(took[1])];
}

const said = (milliseconds: number) => `${milliseconds.toPrecision(3)} ms`;

const RADIUS = 1.5875;
const CHORD = 1e-3;

function clipperOffset(path: PathsD): PathsD {
  return inflatePathsD(path, RADIUS, JoinType.Round, EndType.Polygon, 2, 6, CHORD);
}

function exactOffset(outline: Outline): Outline {
  const result = offsetOutline(outline, RADIUS);
  if (!result.ok) throw new Error(result.reason);
  return result.outline;
}

function outlinesOf(layout: Layout): Outline[] {
  return pieceKinds(layout).map(({ edges }) => tileOutline(layout, edges));
}

function sizeRow(what: string, run: (layout: Layout) => unknown, batch: number): BenchRow {
  const [large, small] = [checkerLayout(240, 120), checkerLayout(40, 8)];
  const [ours, baseline] = timed([() => run(large), () => run(small)], batch);
  return {
    what: `${what}, 240 × 120 beside 40 × 8`,
    ours: said(ours),
    baseline: said(baseline),
    ratio: ours / baseline,
    note: '90 times the tiles',
  };
}

function offsetRow(): BenchRow {
  const outline = outlinesOf(checkerLayout(40, 8)).at(-1) as Outline;
  const path = [chordsOf(outline.segments, CHORD)];
  const [ours, baseline] = timed([() => exactOffset(outline), () => clipperOffset(path)], 20);
  return {
    what: 'offset of an outline beside clipper2-ts, chords of 1e-3 mm',
    ours: said(ours),
    baseline: said(baseline),
    ratio: baseline / ours,
    note: `times as fast; ${errorNote()}`,
  };
}

/** Both against the closed form of a 20 × 20 square with a notch of radius 3 (mathematics). */
function errorNote(): string {
  const [d, { PI }] = [RADIUS, Math];
  const exact = 400 + 80 * d + PI * d ** 2 - (6 * d - (PI * d ** 2) / 2) - (PI * (3 - d) ** 2) / 2;
  const chords = areaPathsD(clipperOffset([chordsOf(notchedSquare.segments, CHORD)]));
  const off = (area: number) => Math.abs(area - exact).toExponential(0);
  return `area off by ${off(areaOf(exactOffset(notchedSquare)))} and ${off(chords)} mm²`;
}

/** The rows about geometry and what is worked out from a document. */
export default function geometryBench(): Promise<BenchRow[]> {
  return Promise.resolve([
    offsetRow(),
    sizeRow('piece kinds and their outlines', outlinesOf, 5),
    sizeRow('all checks', (layout) => runChecks(layout), 3),
    sizeRow('printing and reading the file', (layout) => readLayoutText(printLayout(layout)), 3),
  ]);
}
