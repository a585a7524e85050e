import { createHash } from 'node:crypto';
import type { Database, Transaction } from '@drizzle/database';
import type { Edit, EditSaved, RecordedEdit } from '@shared/api/layout';
import type { Person } from '@shared/api/session';
import { patchOfWire, wirePatchOf } from '@shared/api/wire-patch';
import type { Patch } from '@shared/layout/patch';
import { archivedRefusal } from '../commissions/archive';
import { ApiError, badInput, notFound, refusalWith } from '../http/errors';
import { ruleOnEdit } from './edit-rules';
import { editsBetween, findEditByKey, lockDraft, recordEdit, type DraftRow } from './layouts-store';

/**
 * Saves an edit in one transaction, the layout's row locked: the new revision and what others changed since
 * the base. A request repeated under its idempotency key gets the same answer and changes nothing.
 */
export function saveEdit(
  database: Database,
  person: Person,
  layoutId: string,
  edit: Edit,
): Promise<EditSaved> {
  return database.transaction(async (transaction) => {
    const draft = await lockDraft(transaction, person.workshop.id, layoutId);
    if (!draft) throw notFound('layout');
    const digest = digestOf(edit);
    const repeated = await answerAgain(transaction, draft, person, edit, digest);
    if (repeated) return repeated;
    if (draft.commission.archived) throw archivedRefusal();
    const others = await editsSince(transaction, draft, edit.baseRevision);
    const accepted = judge(draft, edit, others, person);
    const revision = await recordEdit(transaction, draft, accepted.layout, {
      baseRevision: edit.baseRevision,
      patch: wirePatchOf(accepted.patch),
      authorId: person.id,
      idempotencyKey: edit.idempotencyKey,
      requestDigest: digest,
    });
    return { revision, others };
  });
}

/** What a recorded edit answered follows from the log, which never changes. */
async function answerAgain(
  transaction: Transaction,
  draft: DraftRow,
  person: Person,
  edit: Edit,
  digest: string,
): Promise<EditSaved | null> {
  const earlier = await findEditByKey(transaction, draft.id, edit.idempotencyKey);
  if (!earlier) return null;
  if (earlier.authorId !== person.id || earlier.requestDigest !== digest) {
    throw badInput([{ field: 'idempotencyKey', message: 'was used for another edit' }]);
  }
  const { revision, baseRevision } = earlier;
  return {
    revision,
    others: await editsBetween(transaction, draft.id, baseRevision, revision - 1),
  };
}

async function editsSince(
  transaction: Transaction,
  draft: DraftRow,
  base: number,
): Promise<RecordedEdit[]> {
  if (base > draft.revision) {
    const message = `must not be over the draft's revision, ${draft.revision}`;
    throw badInput([{ field: 'baseRevision', message }]);
  }
  const others = await editsBetween(transaction, draft.id, base, draft.revision);
  if (others.length < draft.revision - base) {
    throw new ApiError(
      'conflict',
      'This edit was made on a draft too old to merge with. Open the layout again.',
    );
  }
  return others;
}

function judge(draft: DraftRow, edit: Edit, others: RecordedEdit[], person: Person) {
  const patch = patchOfWire(edit.patch);
  if (!patch) throw badInput([{ field: 'patch', message: 'must hold its cells as base64' }]);
  const ruling = ruleOnEdit({
    draft: draft.layout,
    patch,
    others: others.flatMap(recordedPatch),
    roles: person.roles,
  });
  switch (ruling.kind) {
    case 'accepted':
      return ruling;
    case 'not-allowed':
      throw new ApiError('not-allowed', ruling.message);
    case 'bad-input':
      throw badInput(ruling.problems);
    case 'conflict':
      throw refusalWith('conflict', 'Somebody else has changed the same place.', {
        conflict: { revision: draft.revision, others },
      });
  }
}

function recordedPatch({ revision, patch }: RecordedEdit): Patch {
  const read = patchOfWire(patch);
  if (!read) throw new Error(`the recorded edit ${revision} cannot be read`);
  return read;
}

function digestOf(edit: Edit): string {
  return createHash('sha256').update(JSON.stringify(edit)).digest('hex');
}
