import { randomUUID } from 'node:crypto';
import type { Database, Transaction } from '@drizzle/database';
import type { Person } from '@shared/api/session';
import type { VersionKept } from '@shared/api/version';
import { wirePatchOf } from '@shared/api/wire-patch';
import { patchBetween } from '@shared/layout/patch';
import type { Layout } from '@shared/layout/schema';
import { archivedRefusal } from '../commissions/archive';
import { ApiError, notFound } from '../http/errors';
import { lockDraft, recordEdit, type DraftRow } from '../layouts/layouts-store';
import { findVersion, insertVersion } from './versions-store';

/** Keeps the draft as the next version, if it still is what the person saw. */
export function keepVersion(
  database: Database,
  person: Person,
  layoutId: string,
  seen: { readonly revision: number; readonly note: string },
): Promise<VersionKept> {
  return database.transaction(async (transaction) => {
    const draft = await lockForChange(transaction, person, layoutId);
    if (draft.revision !== seen.revision) {
      throw new ApiError(
        'conflict',
        'The draft has changed since you saw it. Look at what changed, then keep it.',
      );
    }
    const version = await insertVersion(transaction, layoutId, {
      layout: draft.layout,
      revision: draft.revision,
      note: seen.note,
      keptBy: person,
      restoredFrom: null,
    });
    return { version, draft: { revision: draft.revision } };
  });
}

/**
 * Sets the draft to a version, as an edit like any other, so that open browsers merge with it or are told;
 * and keeps the result as the next version.
 */
export function restoreVersion(
  database: Database,
  person: Person,
  layoutId: string,
  { number, note }: { readonly number: number; readonly note: string },
): Promise<VersionKept> {
  return database.transaction(async (transaction) => {
    const draft = await lockForChange(transaction, person, layoutId);
    const kept = await findVersion(transaction, layoutId, number);
    if (!kept) throw notFound('version');
    const revision = await setDraft(transaction, draft, kept.layout, person);
    const version = await insertVersion(transaction, layoutId, {
      layout: kept.layout,
      revision,
      note,
      keptBy: person,
      restoredFrom: number,
    });
    return { version, draft: { revision } };
  });
}

async function lockForChange(
  transaction: Transaction,
  person: Person,
  layoutId: string,
): Promise<DraftRow> {
  const draft = await lockDraft(transaction, person.workshop.id, layoutId);
  if (!draft) throw notFound('layout');
  if (draft.commission.archived) throw archivedRefusal();
  return draft;
}

/** The revision of the draft after setting it to a layout; the same one when nothing differs. */
async function setDraft(
  transaction: Transaction,
  draft: DraftRow,
  layout: Layout,
  person: Person,
): Promise<number> {
  const patch = patchBetween(draft.layout, layout);
  if (patch.length === 0) return draft.revision;
  return recordEdit(transaction, draft, layout, {
    baseRevision: draft.revision,
    patch: wirePatchOf(patch),
    authorId: person.id,
    idempotencyKey: randomUUID(),
    requestDigest: `restore`,
  });
}
