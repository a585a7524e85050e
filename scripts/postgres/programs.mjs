/** Debian's PostgreSQL programs, which are not on PATH, and the account they run under. */
import { spawn } from 'node:child_process';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from '../refusal.mjs';

const versionsFolder = '/usr/lib/postgresql';

/** The folder of the newest installed server, or null when there is none. */
export function programFolder() {
  if (!existsSync(versionsFolder)) return null;
  const newest = readdirSync(versionsFolder)
    .map(Number)
    .filter((version) => existsSync(join(versionsFolder, String(version), 'bin', 'initdb')))
    .sort((a, b) => b - a)[0];
  return newest === undefined ? null : join(versionsFolder, String(newest), 'bin');
}

/**
 * The account that owns and runs a cluster.
 * @typedef {{ uid: number, gid: number }} Account
 */

/**
 * The account to run PostgreSQL under: one's own, but root may not run it and lends it Debian's
 * `postgres`.
 * @returns {Account}
 */
export function postgresAccount() {
  const uid = process.getuid?.() ?? 0;
  if (uid !== 0) return { uid, gid: process.getgid?.() ?? 0 };
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  const fields = line?.split(':') ?? [];
  if (fields[2] === undefined || fields[3] === undefined) {
    throw new Refusal(
      'There is no account "postgres". Install it with: apt-get install postgresql',
    );
  }
  return { uid: Number(fields[2]), gid: Number(fields[3]) };
}

/**
 * The environment without the reader's own PG… settings, which would lead the programs elsewhere.
 * @param {Record<string, string>} extra
 */
function cleanEnvironment(extra) {
  const own = Object.entries(process.env).filter(([name]) => !name.startsWith('PG'));
  return { ...Object.fromEntries(own), LC_ALL: 'C.UTF-8', ...extra };
}

/**
 * Runs a program to its end as the account.
 * @param {string} path
 * @param {string[]} parameters
 * @param {{ account: Account, environment?: Record<string, string>, output?: 'kept' | 'none' }} options
 *   output 'none' gives the program no pipe: a server started through it would hold a pipe open for good
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runAs(path, parameters, { account, environment = {}, output = 'kept' }) {
  const root = process.getuid?.() === 0;
  return new Promise((resolve, reject) => {
    const child = spawn(path, parameters, {
      cwd: '/',
      // Ctrl-C must not tear an initdb or a stop in two: we see to the end ourselves.
      detached: true,
      env: cleanEnvironment(environment),
      stdio: output === 'none' ? 'ignore' : ['ignore', 'pipe', 'pipe'],
      ...(root ? { uid: account.uid, gid: account.gid } : {}),
    });
    let said = '';
    child.stdout?.on('data', (chunk) => (said += chunk));
    child.stderr?.on('data', (chunk) => (said += chunk));
    child.once('error', reject);
    child.once('close', (code) => resolve({ code: code ?? 1, output: said }));
  });
}

/**
 * Runs one of PostgreSQL's programs.
 * @param {string} name
 * @param {string[]} parameters
 * @param {Parameters<typeof runAs>[2]} options
 */
export function runPostgres(name, parameters, options) {
  const folder = programFolder();
  if (folder === null) {
    throw new Refusal('PostgreSQL is not installed. Install it with: apt-get install postgresql');
  }
  return runAs(join(folder, name), parameters, options);
}
