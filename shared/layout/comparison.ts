import { patchBetween, type FieldChange, type ResizeChange } from './patch';
import type { Layout } from './schema';

/** What changed between two versions of a layout. */
export interface Comparison {
  readonly fields: readonly FieldChange[];
  /** Another number of staves or courses, or null. */
  readonly resize: ResizeChange | null;
  /** Positions of tiles that changed wood, on a grid of the same size; empty when resized. */
  readonly tiles: readonly number[];
}

/** Everything that differs between two layouts; tiles are compared by the wood they show, not its index. */
export function compareLayouts(before: Layout, after: Layout): Comparison {
  const patch = patchBetween(before, after);
  const fields = patch.filter((change): change is FieldChange => change.kind === 'field');
  const resize = patch.find((change): change is ResizeChange => change.kind === 'resize') ?? null;
  return { fields, resize, tiles: resize ? [] : changedTiles(before, after) };
}

function changedTiles(before: Layout, after: Layout): number[] {
  const keyBefore = before.woods.map((wood) => wood.key);
  const keyAfter = after.woods.map((wood) => wood.key);
  return [...after.cells.keys()].filter(
    (p) => keyBefore[before.cells[p] ?? 0] !== keyAfter[after.cells[p] ?? 0],
  );
}
