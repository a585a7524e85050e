import type { Grid } from '../cells';
import { layBands, layChecker, layDiamonds, layHelix, layZigzag } from './patterns';
import { layScatter } from './scatter';
import type { LaidPattern, StartingPattern } from './starting-pattern';

/** A starting pattern laid on a grid; says whether it meets itself at the seam. */
export function layStartingPattern(pattern: StartingPattern, grid: Grid): LaidPattern {
  switch (pattern.kind) {
    case 'checker':
      return layChecker(pattern, grid);
    case 'bands':
      return layBands(pattern, grid);
    case 'helix':
      return layHelix(pattern, grid);
    case 'diamonds':
      return layDiamonds(pattern, grid);
    case 'zigzag':
      return layZigzag(pattern, grid);
    case 'scatter':
      return layScatter(pattern, grid);
  }
}
