import type { Database } from '@drizzle/database';
import type { Health } from '@shared/api/health';
import { sql } from 'drizzle-orm';

/** Whether the database answers now. */
export async function healthOf(database: Database): Promise<Health> {
  try {
    await database.execute(sql`SELECT 1`);
    return { status: 'ok', database: 'up' };
  } catch {
    return { status: 'unavailable', database: 'down' };
  }
}
