import type { Queries, Transaction } from '@drizzle/database';
import { commissions, layouts, people, versions } from '@drizzle/schema/index';
import type { Commission, CommissionChanges } from '@shared/api/commission';
import { summaryOf } from '@shared/api/layout-summary';
import { layoutFileOf } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { and, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';

export interface CommissionFilter {
  /** Only those in the archive, or only those at work; both when left out. */
  readonly archived?: 'only' | 'none';
  readonly id?: string;
}

/** The commissions of a workshop that pass the filter, those touched last first. */
export async function listCommissions(
  queries: Queries,
  workshopId: string,
  filter: CommissionFilter = {},
): Promise<Commission[]> {
  const last = lastVersions(queries);
  const rows = await queries
    .select({
      commission: commissions,
      layout: { id: layouts.id, summary: layouts.summary, updatedAt: layouts.updatedAt },
      last: { number: last.number, keptAt: last.keptAt, keptBy: last.keptBy },
    })
    .from(commissions)
    .innerJoin(layouts, eq(layouts.commissionId, commissions.id))
    .leftJoin(last, eq(last.layoutId, layouts.id))
    .where(
      and(
        eq(commissions.workshopId, workshopId),
        filter.id === undefined ? undefined : eq(commissions.id, filter.id),
        filter.archived === 'only' ? isNotNull(commissions.archivedAt) : undefined,
        filter.archived === 'none' ? isNull(commissions.archivedAt) : undefined,
      ),
    )
    .orderBy(
      desc(sql`greatest(${commissions.updatedAt}, ${layouts.updatedAt})`),
      commissions.title,
      commissions.id,
    );
  return rows.map(commissionOf);
}

/** The last version of every layout, with the name of who kept it. */
function lastVersions(queries: Queries) {
  return queries
    .selectDistinctOn([versions.layoutId], {
      layoutId: versions.layoutId,
      number: versions.number,
      keptAt: versions.keptAt,
      keptBy: people.name,
    })
    .from(versions)
    .innerJoin(people, eq(people.id, versions.keptBy))
    .orderBy(versions.layoutId, desc(versions.number))
    .as('last_versions');
}

interface CommissionRow {
  commission: typeof commissions.$inferSelect;
  layout: Pick<typeof layouts.$inferSelect, 'id' | 'summary' | 'updatedAt'>;
  last: { number: number; keptAt: Date; keptBy: string } | null;
}

function commissionOf({ commission, layout, last }: CommissionRow): Commission {
  const touched = Math.max(commission.updatedAt.getTime(), layout.updatedAt.getTime());
  return {
    id: commission.id,
    layoutId: layout.id,
    title: commission.title,
    client: commission.client,
    due: commission.due,
    stage: commission.stage,
    archived: commission.archivedAt !== null,
    ...layout.summary,
    lastVersion: last && { ...last, keptAt: last.keptAt.toISOString() },
    updatedAt: new Date(touched).toISOString(),
  };
}

export interface CommissionStart {
  readonly title: string;
  readonly client: string | null;
  readonly due: string | null;
  readonly layout: Layout;
}

/** Makes a commission with its layout at revision 0 and returns its id. */
export async function insertCommission(
  transaction: Transaction,
  workshopId: string,
  { layout, ...start }: CommissionStart,
): Promise<string> {
  const [made] = await transaction
    .insert(commissions)
    .values({ workshopId, ...start })
    .returning({ id: commissions.id });
  if (!made) throw new Error('an inserted commission came back without its id');
  await transaction
    .insert(layouts)
    .values({ commissionId: made.id, document: layoutFileOf(layout), summary: summaryOf(layout) });
  return made.id;
}

/** Whether a commission is in the archive, its row locked until the transaction ends; null when unknown. */
export async function lockCommission(
  transaction: Transaction,
  workshopId: string,
  id: string,
): Promise<{ archived: boolean } | null> {
  const [found] = await transaction
    .select({ archivedAt: commissions.archivedAt })
    .from(commissions)
    .where(and(eq(commissions.id, id), eq(commissions.workshopId, workshopId)))
    .for('update');
  return found ? { archived: found.archivedAt !== null } : null;
}

/** Writes the changes that are given; the rest stays. */
export async function updateCommission(
  transaction: Transaction,
  id: string,
  { archived, ...changes }: CommissionChanges,
): Promise<void> {
  await transaction
    .update(commissions)
    .set({
      ...changes,
      ...(archived !== undefined && { archivedAt: archived ? new Date() : null }),
      updatedAt: new Date(),
    })
    .where(eq(commissions.id, id));
}
