/**
 * What has to be undone when an entry program ends, by itself or by a signal: last begun, first ended.
 */

import { Refusal } from './refusal.mjs';

/** @type {(() => Promise<void> | void)[]} */
const works = [];

/** @type {Promise<void> | null} */
let ending = null;

/**
 * Remembers work for the end of the program.
 * @param {() => Promise<void> | void} work
 */
export function atEnd(work) {
  works.push(work);
}

/** Whether the end has begun, so that a child that dies now is no news. */
export function isEnding() {
  return ending !== null;
}

/** Does all the remembered work; later calls wait for the first. */
export function endAll() {
  ending ??= doAll();
  return ending;
}

async function doAll() {
  for (let work = works.pop(); work !== undefined; work = works.pop()) {
    try {
      await work();
    } catch (error) {
      console.error(error);
    }
  }
}

/**
 * Ends everything on Ctrl-C, SIGTERM and a closed terminal, then leaves with the code. Also when npm,
 * which started us, was killed outright: it could then pass no signal on.
 * @param {number} exitCode
 */
function endOnSignals(exitCode) {
  const leave = () => void endAll().then(() => process.exit(exitCode));
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, leave);
  if (process.env['npm_lifecycle_event'] === undefined) return;
  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent) leave();
  }, 1000).unref();
}

/**
 * Runs an entry program: ends what it started whatever happens, and turns a refusal into a sentence and
 * exit code 1.
 * @param {() => Promise<number>} program returns the exit code
 * @param {{ exitCodeOnSignal: number }} [options]
 */
export async function runProgram(program, { exitCodeOnSignal } = { exitCodeOnSignal: 130 }) {
  endOnSignals(exitCodeOnSignal);
  let exitCode = 1;
  try {
    exitCode = await program();
  } catch (error) {
    // What fails once the end has begun fails because of it.
    if (!isEnding()) console.error(error instanceof Refusal ? `\n${error.message}` : error);
  }
  await endAll();
  process.exit(exitCode);
}
