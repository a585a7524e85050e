/**
 * One line of the table `npm run bench` prints. Every file of tests/bench that measures something
 * default-exports `async function (): Promise<BenchRow[]>`; ours and the baseline are measured in the same
 * run, so the ratio says something on any machine.
 */
export interface BenchRow {
  /** What was measured, e.g. "panning 200 × 100, median frame". */
  readonly what: string;
  /** Our figure with its unit. */
  readonly ours: string;
  /** What it is held against, with its unit. */
  readonly baseline: string;
  /** Ours divided by the baseline, or the other way round where `note` says so. */
  readonly ratio: number;
  readonly note?: string;
}
