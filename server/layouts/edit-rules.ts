/**
 * What becomes of an edit that was made on an earlier revision of the draft.
 *
 * Edits made elsewhere since then merge with it when both touch different places; otherwise the client is
 * told what changed and lays its own edit on top again. What a change says was there before is not believed
 * but taken from the draft, so that the log always tells the truth to those who invert it.
 */
import { may, type Right } from '@shared/api/rights';
import type { Role } from '@shared/api/session';
import { problemsOf } from '@shared/layout/consistency';
import {
  applyPatch,
  gridStateOf,
  overlapOf,
  patchBetween,
  readField,
  type Change,
  type FieldChange,
  type Patch,
} from '@shared/layout/patch';
import type { Layout, Problem } from '@shared/layout/schema';

export interface ProposedEdit {
  readonly draft: Layout;
  readonly patch: Patch;
  /** What others changed since the revision the patch was made on, in order. */
  readonly others: Patch;
  readonly roles: readonly Role[];
}

export type EditRuling =
  | { readonly kind: 'accepted'; readonly layout: Layout; readonly patch: Patch }
  | { readonly kind: 'conflict' }
  | { readonly kind: 'not-allowed'; readonly message: string }
  | { readonly kind: 'bad-input'; readonly problems: readonly Problem[] };

/** The draft after the edit with the patch as it is recorded, or why the edit cannot be taken. */
export function ruleOnEdit({ draft, patch, others, roles }: ProposedEdit): EditRuling {
  if (overlapOf(patch, others)) return { kind: 'conflict' };
  const grounded = groundPatch(draft, patch);
  if (!grounded.ok) return { kind: 'bad-input', problems: grounded.problems };
  const refusal = rightsRefusal(draft, grounded.layout, roles);
  if (refusal !== null) return { kind: 'not-allowed', message: refusal };
  const problems = problemsOf(grounded.layout);
  if (problems.length === 0) {
    return { kind: 'accepted', layout: grounded.layout, patch: grounded.patch };
  }
  // two edits may each be good and together not, e.g. a wood taken away and laid: the later one thinks again
  return others.length > 0 ? { kind: 'conflict' } : { kind: 'bad-input', problems };
}

type Grounded =
  | { readonly ok: true; readonly layout: Layout; readonly patch: Patch }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Applies the changes one by one, each with what is really there as its "before". */
function groundPatch(draft: Layout, patch: Patch): Grounded {
  const grounded: Change[] = [];
  let layout = draft;
  for (const [i, change] of patch.entries()) {
    const message = misfit(layout, change);
    if (message !== null) return { ok: false, problems: [{ field: `patch.${i}`, message }] };
    const truthful = withTrueBefore(layout, change);
    grounded.push(truthful);
    layout = applyPatch(layout, [truthful]);
  }
  return { ok: true, layout, patch: grounded };
}

/** Why a change does not fit the grid it is laid on, or null. */
function misfit(layout: Layout, change: Change): string | null {
  if (change.kind === 'field') return null;
  if (change.kind === 'resize') {
    const { staves, courses, cells } = change.after;
    const tiles = staves * courses;
    return cells.length === tiles ? null : `must bring ${tiles} cells, not ${cells.length}`;
  }
  const { positions, before, after } = change;
  if (before.length !== positions.length || after.length !== positions.length) {
    return `must name as many woods before and after as positions, ${positions.length}`;
  }
  const tiles = layout.cells.length;
  const outside = positions.find((position) => position >= tiles);
  return outside === undefined ? null : `names tile ${outside}, but the last one is ${tiles - 1}`;
}

function withTrueBefore(layout: Layout, change: Change): Change {
  switch (change.kind) {
    case 'cells':
      return { ...change, before: change.positions.map((p) => layout.cells[p] ?? 0) };
    case 'field':
      return { ...change, before: readField(layout, change.path) } as FieldChange;
    case 'resize':
      return { ...change, before: gridStateOf(layout) };
  }
}

/** The sentence that refuses what really changed to somebody of these roles, or null. */
function rightsRefusal(before: Layout, after: Layout, roles: readonly Role[]): string | null {
  const needed = new Set(patchBetween(before, after).map(rightFor));
  if (needed.has('edit-pattern') && !may(roles, 'edit-pattern')) {
    return 'Shell size, pattern and woods are changed by a designer or the owner.';
  }
  if (needed.has('edit-joint') && !may(roles, 'edit-joint')) {
    return 'Joints, clearance, cutter and the way of building are changed by a maker or the owner.';
  }
  return null;
}

/** The right a change takes; null where either of the two will do. */
function rightFor(change: Change): Right | null {
  if (change.kind !== 'field') return 'edit-pattern';
  const [group] = change.path.split('.');
  if (group === 'name' || group === 'lengthUnit') return null;
  return group === 'shell' || group === 'woods' ? 'edit-pattern' : 'edit-joint';
}
