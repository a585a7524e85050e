/** Starts the built server and waits until it answers. */
import { readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { appFolder, serverFile } from './builds.mjs';
import { startChild } from './children.mjs';
import { inProject } from './project.mjs';
import { Refusal } from './refusal.mjs';

/**
 * @typedef {object} ServerOptions
 * @property {number} port
 * @property {string} databaseUrl
 * @property {string} sessionSecret
 * @property {string} log path of the file that takes the server's log
 * @property {Record<string, string>} [environment]
 */

/**
 * @param {ServerOptions} options
 * @returns {Promise<{ child: import('./children.mjs').ChildProcess, address: string }>}
 */
export async function startServer({ port, databaseUrl, sessionSecret, log, environment = {} }) {
  const tied = inProject('scripts', 'end-with-parent.mjs');
  const child = startChild(
    process.execPath,
    ['--enable-source-maps', '--import', tied, serverFile],
    {
      output: log,
      tie: 'line',
      environment: {
        NODE_ENV: 'production',
        PORT: String(port),
        DATABASE_URL: databaseUrl,
        SESSION_SECRET: sessionSecret,
        APP_FOLDER: appFolder,
        ...environment,
      },
    },
  );
  const host = environment['HOST'] ?? process.env['HOST'] ?? '127.0.0.1';
  const address = `http://${host === '0.0.0.0' ? '127.0.0.1' : host}:${port}`;
  await untilHealthy(child, address, log);
  return { child, address };
}

/**
 * @param {import('./children.mjs').ChildProcess} child
 * @param {string} address
 * @param {string} log
 */
async function untilHealthy(child, address, log) {
  for (let waited = 0; waited < 30_000; waited += 100) {
    if (child.exitCode !== null || child.signalCode !== null) break;
    const answer = await fetch(`${address}/api/health`).catch(() => null);
    if (answer?.ok === true) return;
    await pause(100);
  }
  const said = readFileSync(log, 'utf8').trim().slice(-3000);
  throw new Refusal(`The server does not answer at ${address}. It said:\n${said}`);
}
