/** How long cutting takes, from the minutes a maker has measured. */

/** A number of minutes. */
export type Minutes = number;

/** What is cut, and the maker's own minutes for one of each. */
export interface CuttingWork {
  readonly blanks: number;
  readonly minutesPerBlank: Minutes;
  readonly staves: number;
  /** Both long edges of one stave. */
  readonly minutesPerStave: Minutes;
}

export interface CuttingTime {
  readonly blanks: Minutes;
  readonly staveEdges: Minutes;
  readonly total: Minutes;
}

/** Blanks × minutes a blank, and staves × minutes for the pair of edges of one. */
export function cuttingTime(work: CuttingWork): CuttingTime {
  const blanks = work.blanks * work.minutesPerBlank;
  const staveEdges = work.staves * work.minutesPerStave;
  return { blanks, staveEdges, total: blanks + staveEdges };
}
