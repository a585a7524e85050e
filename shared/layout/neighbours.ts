/** Which woods lie side by side on the shell, across a stave joint, a course joint or the seam. */
import type { Grid } from './cells';
import { BOUNDS } from './schema';

/** Two woods by their index, the lower first. */
export interface WoodPair {
  readonly wood: number;
  readonly other: number;
}

/**
 * Every pair of different woods with a joint between them, each once, in the order of the woods. One pass
 * over the cells, so that it can be asked for at every touch.
 */
export function woodsSideBySide({ staves, courses }: Grid, cells: Uint8Array): WoodPair[] {
  // one bit for each wood that lies beside another
  const beside = new Uint32Array(BOUNDS.woods.most);
  const meet = (a: number, b: number): void => {
    if (a < b) beside[a] = (beside[a] ?? 0) | (1 << b);
    else if (b < a) beside[b] = (beside[b] ?? 0) | (1 << a);
  };
  for (let course = 0; course < courses; course++) {
    const first = course * staves;
    let left = cells[first + staves - 1] ?? 0;
    for (let at = first; at < first + staves; at++) {
      const wood = cells[at] ?? 0;
      meet(left, wood);
      if (course > 0) meet(cells[at - staves] ?? 0, wood);
      left = wood;
    }
  }
  return pairsOf(beside);
}

function pairsOf(beside: Uint32Array): WoodPair[] {
  return [...beside.keys()].flatMap((wood) =>
    [...beside.keys()]
      .filter((other) => ((beside[wood] ?? 0) >>> other) & 1)
      .map((other) => ({ wood, other })),
  );
}
