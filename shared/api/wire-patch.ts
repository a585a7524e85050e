/** Patches as they travel: the same changes, with the cells of a resize as base64. */
import { decodeCells, encodeCells } from '../layout/cells';
import type { Change, GridState, Patch } from '../layout/patch';
import type { WirePatch } from './layout';

type WireChange = WirePatch[number];
type WireGridState = Extract<WireChange, { kind: 'resize' }>['after'];

/** The patch as it travels. */
export function wirePatchOf(patch: Patch): WirePatch {
  return patch.map((change) =>
    change.kind === 'resize'
      ? { kind: 'resize', before: wireGridOf(change.before), after: wireGridOf(change.after) }
      : (structuredClone(change) as WireChange),
  );
}

/** The patch of one that travelled and passed `patchSchema`, or null when its cells are not base64. */
export function patchOfWire(wire: WirePatch): Patch | null {
  const changes: Change[] = [];
  for (const change of wire) {
    const read = change.kind === 'resize' ? resizeOf(change) : (change as Change);
    if (read === null) return null;
    changes.push(read);
  }
  return changes;
}

function resizeOf(change: Extract<WireChange, { kind: 'resize' }>): Change | null {
  const before = gridOf(change.before);
  const after = gridOf(change.after);
  return before && after ? { kind: 'resize', before, after } : null;
}

function wireGridOf({ staves, courses, cells }: GridState): WireGridState {
  return { staves, courses, cells: encodeCells(cells) };
}

function gridOf({ staves, courses, cells }: WireGridState): GridState | null {
  const bytes = decodeCells(cells);
  return bytes && { staves, courses, cells: bytes };
}
