import type { Shell } from '../layout/schema';
import type { Millimetres } from '../units/length';

export interface Trim {
  /** Height of all courses before trimming. */
  readonly untrimmedHeight: Millimetres;
  /** What is cut off each end; negative when the courses do not make the height. */
  readonly eachEnd: Millimetres;
  /** Heights of the two trim lines over the untrimmed bottom. */
  readonly lower: Millimetres;
  readonly upper: Millimetres;
}

/** What is cut off the two ends of the shell after glue-up, the same at both. */
export function trimOf(shell: Pick<Shell, 'courses' | 'tileHeight' | 'finishedHeight'>): Trim {
  const untrimmedHeight = shell.courses * shell.tileHeight;
  const eachEnd = (untrimmedHeight - shell.finishedHeight) / 2;
  return { untrimmedHeight, eachEnd, lower: eachEnd, upper: untrimmedHeight - eachEnd };
}
