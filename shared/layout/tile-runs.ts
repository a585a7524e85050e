/** Many tiles in few words: "A: every other from 1 to 31". */
import { courseLetters, tileOf, type Grid } from './cells';

/** Staves of one course, numbered from 1: from `from` to `to`, each `step` apart. */
export interface TileRun {
  readonly from: number;
  readonly to: number;
  readonly step: number;
}

export interface CourseRuns {
  /** The course's letters. */
  readonly course: string;
  readonly runs: readonly TileRun[];
}

/** Fewer staves than this, so far apart, are listed one by one: "1, 3, 5" reads more easily than a run. */
const STEPS: readonly { readonly step: number; readonly least: number }[] = [
  { step: 1, least: 3 },
  { step: 2, least: 5 },
];

/** The tiles at ascending positions, course by course, gathered into runs of neighbours or of every other. */
export function tileRuns(grid: Grid, positions: readonly number[]): CourseRuns[] {
  const staves = new Map<number, number[]>();
  for (const position of positions) {
    const { stave, course } = tileOf(grid, position);
    const known = staves.get(course);
    if (known) known.push(stave + 1);
    else staves.set(course, [stave + 1]);
  }
  return [...staves].map(([course, numbers]) => ({
    course: courseLetters(course),
    runs: runsOf(numbers),
  }));
}

/** The runs in words: "1 to 5, 8, every other from 11 to 31". */
export function runWords(runs: readonly TileRun[]): string {
  return runs.map(wordsOf).join(', ');
}

function wordsOf({ from, to, step }: TileRun): string {
  if (from === to) return `${from}`;
  return step === 1 ? `${from} to ${to}` : `every other from ${from} to ${to}`;
}

function runsOf(numbers: readonly number[]): TileRun[] {
  const runs: TileRun[] = [];
  let at = 0;
  while (at < numbers.length) {
    const run = longestRun(numbers, at);
    runs.push(run);
    at += (run.to - run.from) / run.step + 1;
  }
  return runs;
}

function longestRun(numbers: readonly number[], at: number): TileRun {
  const from = numbers[at] ?? 0;
  for (const { step, least } of STEPS) {
    let length = 1;
    while (numbers[at + length] === from + length * step) length++;
    if (length >= least) return { from, to: from + (length - 1) * step, step };
  }
  return { from, to: from, step: 1 };
}
