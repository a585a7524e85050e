/**
 * Global set-up of the test projects that need PostgreSQL: one throwaway cluster (the one `npm test` has
 * started, or its own) with one migrated database, which the specs copy.
 */
import { spawnSync } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import type { TestProject } from 'vitest/node';
import { projectFolder } from '../scripts/project.mjs';
import { startThrowawayPostgres } from '../scripts/postgres/throwaway.mjs';
import { databaseAddress, runAsAdministrator } from './database-address';

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env['TEST_DATABASE_URL'];
  const own = given === undefined ? await startThrowawayPostgres() : null;
  const administrator = given ?? own?.url ?? '';
  const name = `template_${randomBytes(4).toString('hex')}`;
  const url = databaseAddress(administrator, name);
  await runAsAdministrator(administrator, `CREATE DATABASE ${name}`);
  migrate(url);
  project.provide('templateDatabaseUrl', url);
  return async () => {
    await runAsAdministrator(administrator, `DROP DATABASE ${name} WITH (FORCE)`);
    await own?.remove();
  };
}

function migrate(url: string): void {
  const result = spawnSync(process.execPath, ['--import', 'tsx', 'drizzle/migrate.ts'], {
    cwd: projectFolder,
    env: { ...process.env, DATABASE_URL: url },
    encoding: 'utf8',
  });
  if (result.status !== 0) throw new Error(`drizzle/migrate.ts failed:\n${result.stderr}`);
}
