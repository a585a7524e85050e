/** A PostgreSQL for one test run: made fresh, careless about power cuts, removed afterwards. */
import { randomBytes } from 'node:crypto';
import { readdirSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { projectKey } from '../project.mjs';
import { isRunning, ownMark } from '../process-mark.mjs';
import { startCluster, stopCluster } from './cluster.mjs';
import { postgresAccount } from './programs.mjs';

const place = '/var/tmp';
const prefix = `staveloom-test-${projectKey}-`;
const settings = [
  'fsync = off',
  'synchronous_commit = off',
  'full_page_writes = off',
  'max_connections = 200',
  'shared_buffers = 64MB',
];

/**
 * @typedef {object} ThrowawayPostgres
 * @property {string} url the address of its first database
 * @property {() => Promise<void>} interrupt stops the server and keeps the data
 * @property {() => Promise<void>} resume starts it again at the same address
 * @property {() => Promise<void>} remove stops it and removes its folder
 */

/**
 * Starts a fresh cluster outside the project, where any account can enter.
 * @returns {Promise<ThrowawayPostgres>}
 */
export async function startThrowawayPostgres() {
  await sweep();
  const name = `${prefix}${ownMark()}-${randomBytes(4).toString('hex')}`;
  const cluster = { folder: join(place, name), account: postgresAccount(), settings };
  const { url, port } = await startCluster(cluster);
  return {
    url,
    interrupt: () => stopCluster(cluster),
    resume: async () => {
      const again = await startCluster({ ...cluster, port });
      if (again.port !== port)
        throw new Error(`Port ${port} was taken while PostgreSQL was stopped.`);
    },
    remove: async () => {
      await stopCluster(cluster);
      rmSync(cluster.folder, { recursive: true, force: true });
    },
  };
}

/** Ends and removes what a killed test run of this copy has left. */
async function sweep() {
  const account = postgresAccount();
  for (const name of readdirSync(place).filter((entry) => entry.startsWith(prefix))) {
    const folder = join(place, name);
    if (isRunning(name.slice(prefix.length).split('-')[0] ?? '')) continue;
    if (statSync(folder).uid !== account.uid) continue;
    await stopCluster({ folder, account, settings: [] });
    rmSync(folder, { recursive: true, force: true });
  }
}
