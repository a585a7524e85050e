import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { Pool } from 'pg';
import * as schema from './schema/index';

export type Database = NodePgDatabase<typeof schema>;
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];

/** What a store reads and writes through: the database, or a transaction the caller holds. */
export type Queries = Database | Transaction;

/** A pool of connections and the typed queries on it. */
export interface OpenDatabase {
  readonly database: Database;
  readonly pool: Pool;
  readonly close: () => Promise<void>;
}

export interface DatabaseOptions {
  readonly connections?: number;
  /** Told when an idle connection breaks; without a listener the process would end with it. */
  readonly onConnectionLost: (error: Error) => void;
}

/**
 * A pool on the database; connects when first asked. A server that is away is noticed within three seconds,
 * one that hangs within fifteen, so that nobody waits at a page for a dead database.
 */
export function openDatabase(databaseUrl: string, options: DatabaseOptions): OpenDatabase {
  const pool = new Pool({
    connectionString: databaseUrl,
    max: options.connections ?? 10,
    connectionTimeoutMillis: 3_000,
    idleTimeoutMillis: 30_000,
    statement_timeout: 12_000,
    query_timeout: 15_000,
    keepAlive: true,
  });
  pool.on('error', options.onConnectionLost);
  return { database: drizzle(pool, { schema }), pool, close: () => pool.end() };
}
