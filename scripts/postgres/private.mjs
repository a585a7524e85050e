/**
 * The copy's own PostgreSQL, shared by every program of the copy that runs at the moment: each leaves a
 * note while it needs the server, and the last to go stops it.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { atEnd } from '../ending.mjs';
import { withLock } from '../lock.mjs';
import { isRunning, ownMark } from '../process-mark.mjs';
import { inProject, projectFolder, projectKey, runFolder } from '../project.mjs';
import { startCluster, stopCluster } from './cluster.mjs';
import { postgresAccount } from './programs.mjs';

/** @typedef {import('./programs.mjs').Account} Account */

const notes = join(runFolder, 'needs-postgres');
const lock = join(runFolder, 'postgres.lock');

/**
 * `.postgres/` of the project, or a folder in /var/tmp when root's stand-in account cannot enter the
 * project (it may lie in root's home).
 * @param {Account} account
 */
function placeFor(account) {
  const inside = inProject('.postgres');
  if (process.getuid?.() !== 0) return inside;
  const probe = spawnSync('/bin/sh', ['-c', 'test -x "$1"', 'sh', projectFolder], {
    uid: account.uid,
    gid: account.gid,
    cwd: '/',
  });
  return probe.status === 0 ? inside : join('/var/tmp', `staveloom-${projectKey}`);
}

/**
 * Starts the copy's server, or joins those already using it, until the program ends.
 * @returns {Promise<string>} the address of its database
 */
export async function usePrivatePostgres() {
  const account = postgresAccount();
  const cluster = { folder: placeFor(account), account, settings: [] };
  const note = join(notes, ownMark());
  // Before the start, so that a signal in the middle of it still finds something to undo.
  atEnd(() => withLock(lock, () => leave(note, cluster)));
  return withLock(lock, async () => {
    mkdirSync(notes, { recursive: true });
    writeFileSync(note, '');
    return (await startCluster(cluster)).url;
  });
}

/**
 * @param {string} note
 * @param {import('./cluster.mjs').Cluster} cluster
 */
async function leave(note, cluster) {
  rmSync(note, { force: true });
  for (const other of existsSync(notes) ? readdirSync(notes) : []) {
    if (isRunning(other)) return;
    rmSync(join(notes, other), { force: true });
  }
  await stopCluster(cluster);
}
