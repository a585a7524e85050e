/**
 * Programs we start, each in a process group of its own. Ctrl-C in a terminal then reaches only us, and
 * ending a program ends its children with it.
 */
import { spawn } from 'node:child_process';
import { openSync, closeSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { atEnd, isEnding } from './ending.mjs';
import { projectFolder } from './project.mjs';
import { Refusal } from './refusal.mjs';

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

/**
 * @typedef {object} ChildOptions
 * @property {Record<string, string | undefined>} [environment] added to ours
 * @property {'shown' | 'kept' | string} [output] shown here, kept in memory, or the path of a log file
 * @property {'none' | 'line'} [tie] 'line' opens a channel whose closing tells the child that we died
 * @property {string} [folder]
 */

/**
 * @param {string} command
 * @param {string[]} parameters
 * @param {ChildOptions} [options]
 */
export function startChild(command, parameters, options = {}) {
  const { environment = {}, output = 'shown', tie = 'none', folder = projectFolder } = options;
  if (isEnding()) throw new Error(`${command} was not started: the program is ending.`);
  const log = output === 'shown' || output === 'kept' ? null : openSync(output, 'w', 0o600);
  const sink = log ?? (output === 'kept' ? 'pipe' : 'inherit');
  const child = spawn(command, parameters, {
    cwd: folder,
    env: { ...process.env, ...environment },
    detached: true,
    stdio: ['ignore', sink, sink, ...(tie === 'line' ? [/** @type {const} */ ('ipc')] : [])],
  });
  if (log !== null) closeSync(log);
  atEnd(() => endChild(child));
  return child;
}

/**
 * Ends the child's whole group: asks, waits five seconds, then insists.
 * @param {ChildProcess} child
 */
export async function endChild(child) {
  if (child.pid === undefined) return;
  signalGroup(child.pid, 'SIGTERM');
  for (let waited = 0; waited < 5000 && groupRuns(child); waited += 50) await pause(50);
  signalGroup(child.pid, 'SIGKILL');
}

/** @param {ChildProcess} child */
function groupRuns(child) {
  return child.pid !== undefined && child.exitCode === null && child.signalCode === null;
}

/**
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 */
function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch {
    // The group is gone already.
  }
}

/**
 * Runs a program to its end.
 * @param {string} command
 * @param {string[]} parameters
 * @param {ChildOptions} [options]
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runChild(command, parameters, options = {}) {
  return new Promise((resolve, reject) => {
    const child = startChild(command, parameters, options);
    let said = '';
    child.stdout?.on('data', (chunk) => (said += chunk));
    child.stderr?.on('data', (chunk) => (said += chunk));
    child.once('error', reject);
    child.once('close', (code) => resolve({ code: code ?? 1, output: said }));
  });
}

/**
 * Runs a program whose failure ends ours, and shows what it said only then.
 * @param {string} purpose begins the sentence "… failed"
 * @param {string} command
 * @param {string[]} parameters
 * @param {ChildOptions} [options]
 */
export async function runOrRefuse(purpose, command, parameters, options = {}) {
  const { code, output } = await runChild(command, parameters, { output: 'kept', ...options });
  if (code !== 0) {
    throw new Refusal(`${purpose} failed (exit code ${code}):\n${output.trim().slice(-6000)}`);
  }
}
