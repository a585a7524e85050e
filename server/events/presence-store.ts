import type { Database } from '@drizzle/database';
import { people, presence } from '@drizzle/schema/index';
import type { Present, Whereabouts } from '@shared/api/live';
import { and, asc, eq, inArray, lt, sql } from 'drizzle-orm';

/** A tab that has not been renewed for this long went without a word. */
export const GONE_AFTER_SECONDS = 25;

const stillHere = sql`${presence.seenAt} > now() - make_interval(secs => ${GONE_AFTER_SECONDS})`;

/** Everybody who has the layout open, in the order of their names. */
export async function peopleAt(database: Database, layoutId: string): Promise<Present[]> {
  return database
    .select({
      connection: presence.connection,
      station: presence.station,
      tile: presence.tile,
      person: { id: people.id, name: people.name },
    })
    .from(presence)
    .innerJoin(people, eq(people.id, presence.personId))
    .where(and(eq(presence.layoutId, layoutId), stillHere))
    .orderBy(asc(people.name), asc(presence.connection));
}

/** Writes where a tab is and tells the other processes. A tab keeps to its person and layout. */
export async function putPresence(
  database: Database,
  layoutId: string,
  personId: string,
  { connection, station, tile }: Whereabouts,
): Promise<void> {
  await database
    .insert(presence)
    .values({ connection, layoutId, personId, station, tile })
    .onConflictDoUpdate({
      target: presence.connection,
      set: { station, tile, seenAt: sql`now()` },
      setWhere: and(eq(presence.layoutId, layoutId), eq(presence.personId, personId)),
    });
  await tellOfPeople(database, layoutId);
}

/** The tab is gone. Others see its connection's name, so it also takes the person who opened it. */
export async function removePresence(
  database: Database,
  layoutId: string,
  personId: string,
  connection: string,
): Promise<void> {
  await database
    .delete(presence)
    .where(
      and(
        eq(presence.connection, connection),
        eq(presence.layoutId, layoutId),
        eq(presence.personId, personId),
      ),
    );
  await tellOfPeople(database, layoutId);
}

/** These tabs are still open; tabs nobody renews are forgotten, and their layouts told. */
export async function renewPresence(
  database: Database,
  connections: readonly string[],
): Promise<void> {
  if (connections.length > 0) {
    await database
      .update(presence)
      .set({ seenAt: sql`now()` })
      .where(inArray(presence.connection, [...connections]));
  }
  const gone = await database
    .delete(presence)
    .where(lt(presence.seenAt, sql`now() - make_interval(secs => ${GONE_AFTER_SECONDS})`))
    .returning({ layoutId: presence.layoutId });
  for (const layoutId of new Set(gone.map((row) => row.layoutId))) {
    await tellOfPeople(database, layoutId);
  }
}

async function tellOfPeople(database: Database, layoutId: string): Promise<void> {
  await database.execute(sql`select pg_notify('layout_people', ${layoutId})`);
}
