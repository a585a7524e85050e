import type { Version } from '@shared/api/version';

/** One side of a comparison: a version by its number, or the draft. */
export type Side = number | 'draft';

export interface Pair {
  readonly before: Side;
  readonly after: Side;
}

/**
 * What is worth comparing first, from versions newest first: the draft with the last version; or, while
 * the draft is still that version, the last with the one before. Null before anything is kept.
 */
export function pairAtFirst(
  versions: readonly Version[],
  draft: { readonly revision: number; readonly unsaved: boolean },
): Pair | null {
  const [latest, previous] = versions;
  if (!latest) return null;
  const unchanged = latest.revision === draft.revision && !draft.unsaved;
  if (unchanged && previous) return { before: previous.number, after: latest.number };
  return { before: latest.number, after: 'draft' };
}

/** "Version 7" or "The draft", to begin a sentence with. */
export function sideName(side: Side): string {
  return side === 'draft' ? 'The draft' : `Version ${side}`;
}
