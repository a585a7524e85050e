/** Starts the built server and waits until it listens and answers. */
import { readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { appFolder, serverFile } from './builds.mjs';
import { startChild } from './children.mjs';
import { freePortFrom } from './free-port.mjs';
import { inProject } from './project.mjs';
import { Refusal } from './refusal.mjs';

/** @typedef {import('./children.mjs').ChildProcess} ChildProcess */

/**
 * @typedef {object} ServerOptions
 * @property {number} port the wished one; when it is taken, the next free one is used
 * @property {string} databaseUrl
 * @property {string} sessionSecret
 * @property {string} log path of the file that takes the server's log
 * @property {Record<string, string>} [environment]
 */

/**
 * @param {ServerOptions} options
 * @returns {Promise<{ child: ChildProcess, address: string }>}
 */
export async function startServer(options) {
  let port = await freePortFrom(options.port);
  for (let attempt = 1; attempt <= 5; attempt += 1) {
    const child = startOn(port, options);
    const address = await addressFrom(child);
    if (address !== null) {
      await untilHealthy(child, address, options.log);
      return { child, address };
    }
    // Another program took the port after we had found it free.
    if (!readFileSync(options.log, 'utf8').includes('EADDRINUSE')) break;
    port = await freePortFrom(port + 1);
  }
  throw new Refusal(`The server does not start. It said:\n${lastWords(options.log)}`);
}

/**
 * @param {number} port
 * @param {ServerOptions} options
 */
function startOn(port, { databaseUrl, sessionSecret, log, environment = {} }) {
  const tied = inProject('scripts', 'end-with-parent.mjs');
  const parameters = ['--enable-source-maps', '--import', tied, serverFile];
  return startChild(process.execPath, parameters, {
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
  });
}

/**
 * Where the server says it listens. Only its own word counts: on a port lost to another program, that
 * program would answer.
 * @param {ChildProcess} child
 * @returns {Promise<string | null>} null when it ended without listening
 */
function addressFrom(child) {
  return new Promise((resolve) => {
    child.once('exit', () => resolve(null));
    child.on('message', (message) => {
      const said = /** @type {{ listening?: string }} */ (message);
      if (said.listening === undefined) return;
      const everywhere = /\/\/(0\.0\.0\.0|\[::\]):/;
      resolve(said.listening.replace(everywhere, '//127.0.0.1:'));
    });
  });
}

/**
 * @param {ChildProcess} child
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
  throw new Refusal(`The server at ${address} is not well. It said:\n${lastWords(log)}`);
}

/** @param {string} log */
function lastWords(log) {
  return readFileSync(log, 'utf8').trim().slice(-3000);
}
