import type { Database } from '@drizzle/database';
import { rateLimits } from '@drizzle/schema/index';
import { eq, inArray, lt, sql } from 'drizzle-orm';
import type { Store } from 'express-rate-limit';

/** Counts in PostgreSQL, so that several server processes count together. */
export function rateLimitStore(database: Database, prefix: string, windowMs: number): Store {
  const keyed = (key: string) => `${prefix} ${key}`;
  return {
    increment: async (key) => {
      await forgetExpired(database);
      const [count] = await database
        .insert(rateLimits)
        .values({ key: keyed(key), hits: 1, resetsAt: new Date(Date.now() + windowMs) })
        .onConflictDoUpdate({
          target: rateLimits.key,
          set: {
            hits: sql`CASE WHEN ${rateLimits.resetsAt} < now() THEN 1 ELSE ${rateLimits.hits} + 1 END`,
            resetsAt: sql`CASE WHEN ${rateLimits.resetsAt} < now() THEN excluded.resets_at ELSE ${rateLimits.resetsAt} END`,
          },
        })
        .returning();
      return { totalHits: count?.hits ?? 1, resetTime: count?.resetsAt };
    },
    decrement: async (key) => {
      await database
        .update(rateLimits)
        .set({ hits: sql`greatest(${rateLimits.hits} - 1, 0)` })
        .where(eq(rateLimits.key, keyed(key)));
    },
    resetKey: async (key) => {
      await database.delete(rateLimits).where(eq(rateLimits.key, keyed(key)));
    },
  };
}

/** Takes out counts whose time is over; rows another process is busy with are left to it. */
async function forgetExpired(database: Database): Promise<void> {
  const expired = database
    .select({ key: rateLimits.key })
    .from(rateLimits)
    .where(lt(rateLimits.resetsAt, sql`now()`))
    .for('update', { skipLocked: true });
  await database.delete(rateLimits).where(inArray(rateLimits.key, expired));
}
