import type { Queries, Transaction } from '@drizzle/database';
import { commissions, layoutEdits, layouts, people, versions } from '@drizzle/schema/index';
import type { OpenLayout, RecordedEdit, WirePatch } from '@shared/api/layout';
import { summaryOf } from '@shared/api/layout-summary';
import { layoutFileOf, readLayout } from '@shared/layout/read-layout';
import type { Layout, LayoutFile } from '@shared/layout/schema';
import { and, asc, desc, eq, gt, lte, type SQL } from 'drizzle-orm';

/** A layout's draft with what stands around it. */
export interface DraftRow {
  readonly id: string;
  readonly revision: number;
  readonly layout: Layout;
  readonly commission: OpenLayout['commission'];
}

/** The draft of one of the workshop's layouts, or null. */
export async function findDraft(
  queries: Queries,
  workshopId: string,
  layoutId: string,
): Promise<DraftRow | null> {
  const [row] = await draftQuery(queries, workshopId, layoutId);
  return row ? draftOf(row) : null;
}

/**
 * The same with its rows locked until the transaction ends: edits of a layout come one by one, and nobody
 * archives its commission meanwhile.
 */
export async function lockDraft(
  transaction: Transaction,
  workshopId: string,
  layoutId: string,
): Promise<DraftRow | null> {
  const [row] = await draftQuery(transaction, workshopId, layoutId).for('update', {
    of: [layouts, commissions],
  });
  return row ? draftOf(row) : null;
}

function draftQuery(queries: Queries, workshopId: string, layoutId: string) {
  return queries
    .select({ layout: layouts, commission: commissions })
    .from(layouts)
    .innerJoin(commissions, eq(commissions.id, layouts.commissionId))
    .where(and(eq(layouts.id, layoutId), eq(commissions.workshopId, workshopId)));
}

function draftOf(row: {
  layout: typeof layouts.$inferSelect;
  commission: typeof commissions.$inferSelect;
}): DraftRow {
  const { id, title, client, archivedAt } = row.commission;
  return {
    id: row.layout.id,
    revision: row.layout.revision,
    layout: storedLayout(row.layout.document),
    commission: { id, title, client, archived: archivedAt !== null },
  };
}

/** The layout in a stored document. Throws when the row does not hold one: then the database is damaged. */
export function storedLayout(document: LayoutFile): Layout {
  const reading = readLayout(document);
  if (reading.ok) return reading.layout;
  const [problem] = reading.problems;
  throw new Error(`a stored layout cannot be read: ${problem?.field} ${problem?.message}`);
}

/** Number and revision of the layout's last version, or null. */
export async function findLastVersion(
  queries: Queries,
  layoutId: string,
): Promise<OpenLayout['lastVersion']> {
  const [last] = await queries
    .select({ number: versions.number, revision: versions.revision })
    .from(versions)
    .where(eq(versions.layoutId, layoutId))
    .orderBy(desc(versions.number))
    .limit(1);
  return last ?? null;
}

/** The edits that led from one revision to a later one, in order. */
export async function editsBetween(
  queries: Queries,
  layoutId: string,
  after: number,
  upTo: number,
): Promise<RecordedEdit[]> {
  return recordedEdits(
    queries,
    and(
      eq(layoutEdits.layoutId, layoutId),
      gt(layoutEdits.revision, after),
      lte(layoutEdits.revision, upTo),
    ),
  );
}

/** The next edits after a revision, in order, at most so many. */
export async function nextEdits(
  queries: Queries,
  layoutId: string,
  after: number,
  most: number,
): Promise<RecordedEdit[]> {
  return recordedEdits(
    queries,
    and(eq(layoutEdits.layoutId, layoutId), gt(layoutEdits.revision, after)),
  ).limit(most);
}

function recordedEdits(queries: Queries, which: SQL | undefined) {
  return queries
    .select({
      revision: layoutEdits.revision,
      patch: layoutEdits.patch,
      by: { id: people.id, name: people.name },
      idempotencyKey: layoutEdits.idempotencyKey,
    })
    .from(layoutEdits)
    .innerJoin(people, eq(people.id, layoutEdits.authorId))
    .where(which)
    .orderBy(asc(layoutEdits.revision));
}

/** What is known of the edit saved under an idempotency key, or null. */
export async function findEditByKey(queries: Queries, layoutId: string, idempotencyKey: string) {
  const [found] = await queries
    .select({
      revision: layoutEdits.revision,
      baseRevision: layoutEdits.baseRevision,
      authorId: layoutEdits.authorId,
      requestDigest: layoutEdits.requestDigest,
    })
    .from(layoutEdits)
    .where(and(eq(layoutEdits.layoutId, layoutId), eq(layoutEdits.idempotencyKey, idempotencyKey)));
  return found ?? null;
}

export interface EditEntry {
  readonly baseRevision: number;
  readonly patch: WirePatch;
  readonly authorId: string;
  readonly idempotencyKey: string;
  readonly requestDigest: string;
}

/** Writes the draft as it is after an edit, and the edit into the log; returns the new revision. */
export async function recordEdit(
  transaction: Transaction,
  draft: DraftRow,
  after: Layout,
  entry: EditEntry,
): Promise<number> {
  const revision = draft.revision + 1;
  await transaction
    .update(layouts)
    .set({
      document: layoutFileOf(after),
      summary: summaryOf(after),
      revision,
      updatedAt: new Date(),
    })
    .where(eq(layouts.id, draft.id));
  await transaction.insert(layoutEdits).values({ layoutId: draft.id, revision, ...entry });
  return revision;
}

/** True when the workshop has this layout. */
export async function isLayoutOf(
  queries: Queries,
  workshopId: string,
  layoutId: string,
): Promise<boolean> {
  const [found] = await queries
    .select({ id: layouts.id })
    .from(layouts)
    .innerJoin(commissions, eq(commissions.id, layouts.commissionId))
    .where(and(eq(layouts.id, layoutId), eq(commissions.workshopId, workshopId)));
  return found !== undefined;
}
