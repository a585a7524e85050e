/** `npm start`: everything from a bare clone to a running program, and its end with Ctrl-C. */
import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { migrate, seed, useDatabase } from './database.mjs';
import { atEnd, isEnding, runProgram } from './ending.mjs';
import { holderOf, tryLock } from './lock.mjs';
import { runFolder } from './project.mjs';
import { Refusal } from './refusal.mjs';
import { startServer } from './server.mjs';
import { sessionSecret } from './session-secret.mjs';
import { buildAll, installAll } from './set-up.mjs';

const usualPort = 4300;
const lock = join(runFolder, 'start.lock');
const addressFile = join(runFolder, 'address');

/** @returns {Promise<number>} */
async function start() {
  const release = tryLock(lock);
  if (release === null) return sayItRuns();
  atEnd(release);
  await installAll([]);
  const databaseUrl = await useDatabase();
  await buildAll();
  await migrate(databaseUrl);
  await seed(databaseUrl);
  const log = join(runFolder, 'server.log');
  const server = await startServer({
    port: wishedPort(),
    databaseUrl,
    sessionSecret: sessionSecret(),
    log,
  });
  writeFileSync(addressFile, server.address);
  atEnd(() => rmSync(addressFile, { force: true }));
  greet(server.address, log);
  return untilItEnds(server.child, log);
}

function sayItRuns() {
  const pid = Number.parseInt(holderOf(lock) ?? '', 10);
  let where = 'is being started';
  try {
    where = `runs at ${readFileSync(addressFile, 'utf8')}`;
  } catch {
    // The other one has not got so far yet.
  }
  console.log(
    `Staveloom of this folder ${where} (process ${pid}). End that one first to start anew.`,
  );
  return 0;
}

function wishedPort() {
  const text = process.env['PORT'] ?? '';
  if (text === '') return usualPort;
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new Refusal(`PORT is "${text}"; it must be a whole number from 1 to 65535.`);
}

/**
 * @param {string} address
 * @param {string} log
 */
function greet(address, log) {
  console.log(`
Staveloom runs at ${address}

  Sign in with the password ring-of-staves as
    runa@quarrylane.example       owner
    ines@quarrylane.example       designer and maker
    bela@quarrylane.example       designer
    tomas@quarrylane.example      maker
    harriet@harbourtrust.example  client
    jonah@saltmarsh.example       owner of another workshop

  The server's log: ${log}
  Ctrl-C ends everything.
`);
}

/**
 * @param {import('./children.mjs').ChildProcess} child
 * @param {string} log
 * @returns {Promise<number>}
 */
function untilItEnds(child, log) {
  return new Promise((resolve, reject) => {
    const ended = () =>
      isEnding()
        ? resolve(0)
        : reject(new Refusal(`The server ended by itself. Its last words are in ${log}`));
    if (child.exitCode !== null || child.signalCode !== null) ended();
    child.once('exit', ended);
  });
}

await runProgram(start, { exitCodeOnSignal: 0 });
