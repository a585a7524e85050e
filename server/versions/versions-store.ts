import type { Queries, Transaction } from '@drizzle/database';
import { people, versions } from '@drizzle/schema/index';
import type { Version } from '@shared/api/version';
import { layoutFileOf } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { thumbnailOf } from '@shared/layout/thumbnail';
import { and, desc, eq, max } from 'drizzle-orm';
import { storedLayout } from '../layouts/layouts-store';

const SHOWN = {
  number: versions.number,
  note: versions.note,
  keptAt: versions.keptAt,
  keptBy: people.name,
  revision: versions.revision,
  restoredFrom: versions.restoredFrom,
  thumbnail: versions.thumbnail,
};

type ShownRow = Omit<Version, 'keptAt'> & { keptAt: Date };

function versionOf({ keptAt, ...row }: ShownRow): Version {
  return { ...row, keptAt: keptAt.toISOString() };
}

/** The versions of a layout without their documents, newest first. */
export async function listVersions(queries: Queries, layoutId: string): Promise<Version[]> {
  const rows = await queries
    .select(SHOWN)
    .from(versions)
    .innerJoin(people, eq(people.id, versions.keptBy))
    .where(eq(versions.layoutId, layoutId))
    .orderBy(desc(versions.number));
  return rows.map(versionOf);
}

/** One version with its layout, or null. */
export async function findVersion(
  queries: Queries,
  layoutId: string,
  number: number,
): Promise<{ version: Version; layout: Layout } | null> {
  const [row] = await queries
    .select({ shown: SHOWN, document: versions.document })
    .from(versions)
    .innerJoin(people, eq(people.id, versions.keptBy))
    .where(and(eq(versions.layoutId, layoutId), eq(versions.number, number)));
  return row ? { version: versionOf(row.shown), layout: storedLayout(row.document) } : null;
}

export interface VersionStart {
  readonly layout: Layout;
  readonly revision: number;
  readonly note: string;
  readonly keptBy: { readonly id: string; readonly name: string };
  readonly restoredFrom: number | null;
}

/** Keeps the next version of a layout. The caller holds the lock of the layout's row. */
export async function insertVersion(
  transaction: Transaction,
  layoutId: string,
  { layout, revision, note, keptBy, restoredFrom }: VersionStart,
): Promise<Version> {
  const [last] = await transaction
    .select({ number: max(versions.number) })
    .from(versions)
    .where(eq(versions.layoutId, layoutId));
  const thumbnail = thumbnailOf(layout);
  const number = (last?.number ?? 0) + 1;
  const keptAt = new Date();
  await transaction.insert(versions).values({
    ...{ layoutId, number, note, keptAt, revision, restoredFrom, thumbnail },
    document: layoutFileOf(layout),
    keptBy: keptBy.id,
  });
  return versionOf({
    number,
    note,
    keptAt,
    keptBy: keptBy.name,
    revision,
    restoredFrom,
    thumbnail,
  });
}
