/**
 * What the largest shell costs to export, beside a usual one. Outlines grow with the number of piece kinds,
 * which is the same for both; the whole bundle also holds the map and the lists of tile names.
 */
import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { pieceFiles } from '@exports/piece-files';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import type { BenchRow } from './bench-row';
import { BENCH_OPTIONS, bundleZipOf } from './bundle-zip';
import { checkerLayout } from './checker-layout';

/** Median milliseconds of each of two runs, taken in turn after as many to warm up. */
function mediansOf(times: number, runs: readonly [() => unknown, () => unknown]): [number, number] {
  for (let i = 0; i < times; i++) for (const run of runs) run();
  const took: [number[], number[]] = [[], []];
  for (let i = 0; i < times; i++) {
    runs.forEach((run, which) => {
      const start = performance.now();
      run();
      took[which]?.push(performance.now() - start);
    });
  }
  return [medianOf(took[0]), medianOf(took[1])];
}

function medianOf(figures: readonly number[]): number {
  return [...figures].sort((a, b) => a - b)[figures.length >> 1] ?? NaN;
}

function peakOf(staves: number, courses: number): number {
  const program = fileURLToPath(new URL('bundle-peak.ts', import.meta.url));
  const parameters = [...process.execArgv, program, String(staves), String(courses)];
  return Number(execFileSync(process.execPath, parameters, { encoding: 'utf8' }));
}

function row(
  what: string,
  [ours, baseline]: readonly [number, number],
  unit: string,
  note: string,
): BenchRow {
  const said = (figure: number) => `${figure.toPrecision(3)} ${unit}`;
  return { what, ours: said(ours), baseline: said(baseline), ratio: ours / baseline, note };
}

/** The rows about the files that leave the program. */
export default function bundleBench(): Promise<BenchRow[]> {
  const [large, small, usual] = [
    checkerLayout(240, 120),
    checkerLayout(40, 8),
    checkerLayout(32, 9),
  ];
  const [largeKinds, smallKinds] = [pieceKinds(large), pieceKinds(small)];
  const outlines = mediansOf(300, [
    () => pieceFiles(large, largeKinds, BENCH_OPTIONS),
    () => pieceFiles(small, smallKinds, BENCH_OPTIONS),
  ]);
  const bundles = mediansOf(9, [() => bundleZipOf(large), () => bundleZipOf(usual)]);
  const kinds = `${largeKinds.length} kinds beside ${smallKinds.length}, 90 times the tiles`;
  return Promise.resolve([
    row('outline files, 240 × 120 beside 40 × 8', outlines, 'ms', kinds),
    row('bundle as ZIP, 240 × 120 beside 32 × 9', bundles, 'ms', '100 times the tiles'),
    row(
      'peak memory of that bundle',
      [peakOf(240, 120), peakOf(32, 9)],
      'MB',
      'resident, above the program itself',
    ),
  ]);
}
