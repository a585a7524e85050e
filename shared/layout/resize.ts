import { cellAt, type Grid } from './cells';
import type { ResizeChange } from './patch';
import type { Layout } from './schema';

/** The pattern on another grid: a tile keeps its wood where stave and course still exist, new tiles get the first wood. */
export function resizedCells(cells: Uint8Array, from: Grid, to: Grid): Uint8Array {
  const resized = new Uint8Array(to.staves * to.courses);
  const staves = Math.min(from.staves, to.staves);
  for (let course = 0; course < Math.min(from.courses, to.courses); course++) {
    const start = cellAt(from, 0, course);
    resized.set(cells.subarray(start, start + staves), cellAt(to, 0, course));
  }
  return resized;
}

/** The change to another number of staves or courses, or null when the grid already has that size. */
export function resizeChange(layout: Layout, to: Grid): ResizeChange | null {
  const { staves, courses } = layout.shell;
  if (staves === to.staves && courses === to.courses) return null;
  const cells = resizedCells(layout.cells, { staves, courses }, to);
  return {
    kind: 'resize',
    before: { staves, courses, cells: layout.cells },
    after: { staves: to.staves, courses: to.courses, cells },
  };
}
