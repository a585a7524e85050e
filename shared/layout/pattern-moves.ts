/** The whole pattern moved: turned round the shell, or two of its woods in each other's place. */
import { cellAt, tileOf, type Grid } from './cells';
import { relayChange, type CellsChange } from './patch';

/** The pattern turned round the shell by whole staves, to the right; negative turns to the left. */
export function turnedCells(grid: Grid, cells: Uint8Array, by: number): Uint8Array {
  return cells.map((_, position) => {
    const { stave, course } = tileOf(grid, position);
    return cells[cellAt(grid, stave - by, course)] ?? 0;
  });
}

/** The change that lays each of two woods where the other was, or null when neither is laid. */
export function swapWoods(cells: Uint8Array, one: number, other: number): CellsChange | null {
  const swapped = cells.map((wood) => (wood === one ? other : wood === other ? one : wood));
  return relayChange(cells, swapped);
}
