/**
 * The open draft as the browser holds it: what the server confirmed, the one save under way, finished edits
 * that wait, and the gesture under the hand. Every function returns a new draft; nothing here knows about
 * time or the network, so two of them can be played against a simulated server in a test.
 */
import type { EditSaved, RecordedEdit } from '@shared/api/layout';
import { patchOfWire } from '@shared/api/wire-patch';
import {
  applyPatch,
  invertPatch,
  squashPatches,
  type Change,
  type Patch,
} from '@shared/layout/patch';
import { rebase, type Contest } from '@shared/layout/rebase';
import type { Layout } from '@shared/layout/schema';

export interface Draft {
  /** The document as the server has it at `revision`. */
  readonly confirmed: Layout;
  readonly revision: number;
  readonly inFlight: Save | null;
  readonly waiting: readonly Patch[];
  /** Moves of the gesture under the hand, or null when there is none. */
  readonly gesture: readonly Patch[] | null;
  /** The document with everything above: what the person sees. */
  readonly local: Layout;
}

/** One save; sent again unchanged, key and all, until the server answers. */
export interface Save {
  readonly key: string;
  readonly baseRevision: number;
  readonly patch: Patch;
  /** What it comes to on the document as confirmed by now: others' edits may have come in since it was sent. */
  readonly standing: Patch;
}

/** A draft after others' edits came in. */
export interface Met {
  readonly draft: Draft;
  readonly theirs: Patch;
  /** Positions where their edit met mine. */
  readonly overlaid: readonly number[];
  readonly contests: readonly Contest[];
}

/** As many changes as one save may carry. */
const CHANGES_MOST = 200;

export function openDraft(layout: Layout, revision: number): Draft {
  return {
    confirmed: layout,
    revision,
    inFlight: null,
    waiting: [],
    gesture: null,
    local: layout,
  };
}

/** The draft with a finished edit. */
export function withEdit(draft: Draft, patch: Patch): Draft {
  return {
    ...draft,
    waiting: [...draft.waiting, patch],
    local: applyPatch(draft.local, patch),
  };
}

/** The draft with one more move of the gesture under the hand. */
export function withMove(draft: Draft, patch: Patch): Draft {
  return {
    ...draft,
    gesture: [...(draft.gesture ?? []), patch],
    local: applyPatch(draft.local, patch),
  };
}

/** The draft with the gesture finished, and what it did as one patch (empty when it did nothing in the end). */
export function withGestureFinished(draft: Draft): { draft: Draft; patch: Patch } {
  const patch = squashAll(draft.gesture ?? []);
  const waiting = patch.length > 0 ? [...draft.waiting, patch] : draft.waiting;
  return { draft: { ...draft, gesture: null, waiting }, patch };
}

/** The draft as it was before the gesture began, and the patch that took it back. */
export function withGestureTakenBack(draft: Draft): { draft: Draft; patch: Patch } {
  const patch = invertPatch(squashAll(draft.gesture ?? []));
  return { draft: { ...draft, gesture: null, local: applyPatch(draft.local, patch) }, patch };
}

/** The draft with everything that waits put into one save. The same draft when nothing waits or a save is under way. */
export function withSave(draft: Draft, key: string): Draft {
  if (draft.inFlight || draft.waiting.length === 0) return draft;
  const all = squashAll(draft.waiting);
  if (all.length === 0) return { ...draft, waiting: [] };
  const rest = all.slice(CHANGES_MOST);
  const patch = all.slice(0, CHANGES_MOST);
  return {
    ...draft,
    inFlight: { key, baseRevision: draft.revision, patch, standing: patch },
    waiting: rest.length > 0 ? [rest] : [],
  };
}

/** True when the server has everything. */
export function isSaved(draft: Draft): boolean {
  return !draft.inFlight && draft.waiting.length === 0 && !draft.gesture?.length;
}

/** The draft after the server took the save; others' edits it merged with come first. */
export function withAnswer(draft: Draft, saved: EditSaved): Met {
  const inFlight = draft.inFlight?.standing ?? [];
  const theirs = theirPatch(draft, saved);
  const { mine, ...met } = rebase(draft.confirmed, theirs, [inFlight, ...unsent(draft)]);
  const [confirmedMine = [], ...rest] = mine;
  const confirmed = applyPatch(applyPatch(draft.confirmed, theirs), confirmedMine);
  return { ...met, theirs, draft: settled(draft, confirmed, saved.revision, rest, met.layout) };
}

/** The draft after the server refused the save because others' edits overlap it: mine goes on top of theirs. */
export function withTheirs(draft: Draft, conflict: EditSaved): Met {
  const theirs = theirPatch(draft, conflict);
  const returned = draft.inFlight ? [draft.inFlight.standing] : [];
  const { mine, ...met } = rebase(draft.confirmed, theirs, [...returned, ...unsent(draft)]);
  const confirmed = applyPatch(draft.confirmed, theirs);
  return { ...met, theirs, draft: settled(draft, confirmed, conflict.revision, mine, met.layout) };
}

/**
 * The draft after an edit came in live, between saves. My own comes back this way too, perhaps before its
 * answer. Null when the edit is known already, or when one before it is missing.
 */
export function withLive(draft: Draft, edit: RecordedEdit): Met | null {
  if (edit.revision !== draft.revision + 1) return null;
  const { inFlight } = draft;
  if (inFlight?.key === edit.idempotencyKey) {
    return withAnswer(draft, { revision: edit.revision, others: [] });
  }
  const theirs = patchOfWire(edit.patch) ?? [];
  const sent = inFlight ? [inFlight.standing] : [];
  const { mine, ...met } = rebase(draft.confirmed, theirs, [...sent, ...unsent(draft)]);
  const confirmed = applyPatch(draft.confirmed, theirs);
  const rest = mine.slice(sent.length);
  const next = settled(draft, confirmed, edit.revision, rest, met.layout);
  const standing = mine[0] ?? [];
  return {
    ...met,
    theirs,
    draft: inFlight ? { ...next, inFlight: { ...inFlight, standing } } : next,
  };
}

/** The draft with the save under way taken back, because the server will never take it; later edits stay. */
export function withSaveTakenBack(draft: Draft): Draft {
  const refused = draft.inFlight?.standing ?? [];
  const base = applyPatch(draft.confirmed, refused);
  const { mine, layout, contests } = rebase(base, invertPatch(refused), unsent(draft));
  const taken = settled(draft, draft.confirmed, draft.revision, mine, layout);
  const later = contests.flatMap((contest) => (contest.kind === 'field' ? [contest.mine] : []));
  return later.length > 0 ? withEdit(taken, later) : taken;
}

function unsent(draft: Draft): readonly Patch[] {
  return [...draft.waiting, ...(draft.gesture ?? [])];
}

function settled(
  draft: Draft,
  confirmed: Layout,
  revision: number,
  mine: readonly Patch[],
  local: Layout,
): Draft {
  const moves = draft.gesture?.length ?? 0;
  const finished = mine.slice(0, mine.length - moves).filter((patch) => patch.length > 0);
  return {
    confirmed,
    revision,
    inFlight: null,
    waiting: finished,
    gesture: draft.gesture && mine.slice(mine.length - moves),
    local,
  };
}

/** Others' edits in an answer, without those that came in live before it. */
function theirPatch(draft: Draft, answer: EditSaved): Patch {
  const news = answer.others.filter((edit) => edit.revision > draft.revision);
  return news.flatMap((edit) => patchOfWire(edit.patch) ?? []);
}

/** One patch with the effect of all in turn. Halves first, so that a long stroke costs n log n, not n². */
export function squashAll(patches: readonly Patch[]): Patch {
  if (patches.length <= 1) return patches[0] ?? [];
  const middle = patches.length >> 1;
  return squashPatches(squashAll(patches.slice(0, middle)), squashAll(patches.slice(middle)));
}

/** The changes worth making: nulls stand for "already so". */
export function madeChanges(changes: readonly (Change | null)[]): Patch {
  return changes.filter((change) => change !== null);
}
