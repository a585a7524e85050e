import { fieldsOf, patchBetween, type Patch } from '@shared/layout/patch';
import { readLayoutText } from '@shared/layout/read-layout';
import type { Layout, Problem } from '@shared/layout/schema';

/** What opening a file in this layout comes to. */
export type OpeningText =
  | { readonly kind: 'patch'; readonly patch: Patch }
  | { readonly kind: 'same' }
  | { readonly kind: 'problems'; readonly problems: readonly Problem[] };

export interface OpeningRights {
  readonly editJoint: boolean;
  readonly editPattern: boolean;
}

/** Reads a layout file and says what it would change here, or what is wrong with it, field by field. */
export function openLayoutText(text: string, here: Layout, rights: OpeningRights): OpeningText {
  const reading = readLayoutText(text);
  if (!reading.ok) return { kind: 'problems', problems: reading.problems };
  const patch = patchBetween(here, reading.layout);
  if (patch.length === 0) return { kind: 'same' };
  const forbidden = forbiddenPart(patch, rights);
  return forbidden ? { kind: 'problems', problems: [forbidden] } : { kind: 'patch', patch };
}

/** A file is opened whole or not at all: half of it might not hold together. */
function forbiddenPart(patch: Patch, rights: OpeningRights): Problem | null {
  const fields = fieldsOf(patch);
  const joint = fields.find((field) => /^(?:joint|cutter|build)\b/.test(field));
  if (joint && !rights.editJoint) {
    return { field: joint, message: 'differs, and only a maker or an owner may change it' };
  }
  const shell = fields.find((field) => /^(?:shell|woods)\b/.test(field));
  const tiles = patch.some((change) => change.kind !== 'field');
  if ((shell || tiles) && !rights.editPattern) {
    const message = 'differs, and only a designer or an owner may change it';
    return { field: shell ?? 'cells', message };
  }
  return null;
}
