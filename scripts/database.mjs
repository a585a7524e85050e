/** The database the programs use: DATABASE_URL when it is set, else the copy's own PostgreSQL. */
import { installDebianPackages, postgresql } from './debian-packages.mjs';
import { runOrRefuse } from './children.mjs';
import { usePrivatePostgres } from './postgres/private.mjs';
import { nodeParameters, typescriptEnvironment } from './typescript.mjs';

/** @returns {Promise<string>} the address; what was started for it is stopped at the end */
export async function useDatabase() {
  const given = process.env['DATABASE_URL'];
  if (given !== undefined && given !== '') return given;
  await installDebianPackages([postgresql]);
  return usePrivatePostgres();
}

/** @param {string} databaseUrl */
export function migrate(databaseUrl) {
  return runOrRefuse(
    'Migrating the database',
    process.execPath,
    nodeParameters('drizzle/migrate.ts'),
    {
      environment: { ...typescriptEnvironment, DATABASE_URL: databaseUrl },
    },
  );
}

/**
 * Adds the demonstration workshops; a database that has them stays as it is.
 * @param {string} databaseUrl
 */
export function seed(databaseUrl) {
  return runOrRefuse(
    'Adding the demonstration',
    process.execPath,
    nodeParameters('seeds/seed.ts'),
    {
      environment: { ...typescriptEnvironment, DATABASE_URL: databaseUrl },
    },
  );
}
