import type { Queries } from '@drizzle/database';
import { sessions } from '@drizzle/schema/index';
import { and, gt, inArray, sql } from 'drizzle-orm';

/** Those of the sessions that have neither been ended nor run out. */
export async function openSessions(queries: Queries, ids: readonly string[]): Promise<Set<string>> {
  if (ids.length === 0) return new Set();
  const open = await queries
    .select({ id: sessions.sid })
    .from(sessions)
    .where(and(inArray(sessions.sid, [...ids]), gt(sessions.expire, sql`now()`)));
  return new Set(open.map(({ id }) => id));
}
