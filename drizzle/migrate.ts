/**
 * Brings a database to the newest tables: `tsx drizzle/migrate.ts` with DATABASE_URL set. An advisory lock
 * lets several processes start at once: one migrates, the rest wait and find nothing to do.
 */
import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Client } from 'pg';

const MIGRATIONS_FOLDER = fileURLToPath(new URL('./migrations', import.meta.url));

/** Any number will do, as long as nothing else in the database uses it. */
const MIGRATION_LOCK = 7_412_026;

/** Runs the migrations this database has not seen. Throws what PostgreSQL says when one fails. */
export async function migrateDatabase(databaseUrl: string): Promise<void> {
  const client = new Client({ connectionString: databaseUrl, connectionTimeoutMillis: 5_000 });
  await client.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await migrate(drizzle(client), { migrationsFolder: MIGRATIONS_FOLDER });
  } finally {
    await client.end();
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const databaseUrl = process.env['DATABASE_URL'];
  if (!databaseUrl) {
    console.error('DATABASE_URL must name the PostgreSQL database to migrate.');
    process.exit(1);
  }
  await migrateDatabase(databaseUrl);
}
