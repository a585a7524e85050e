/** Locks between programs of one copy of the project: a file that names the process holding it. */
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { isRunning, ownMark } from './process-mark.mjs';

/**
 * @param {string} path
 * @returns {boolean}
 */
function create(path) {
  try {
    writeFileSync(path, ownMark(), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw error;
  }
}

/**
 * @param {string} path
 * @returns {string | null} the mark of the living holder
 */
export function holderOf(path) {
  try {
    const mark = readFileSync(path, 'utf8');
    return isRunning(mark) ? mark : null;
  } catch {
    return null;
  }
}

/**
 * Takes the lock unless a living process holds it; a lock left by a dead one is taken over.
 * @param {string} path
 * @returns {(() => void) | null} what gives the lock back, or null when it is held
 */
export function tryLock(path) {
  mkdirSync(dirname(path), { recursive: true });
  if (!create(path)) {
    if (holderOf(path) !== null) return null;
    rmSync(path, { force: true });
    if (!create(path)) return null;
  }
  return () => rmSync(path, { force: true });
}

/**
 * Waits for the lock and holds it while the work runs.
 * @template T
 * @param {string} path
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withLock(path, work) {
  let release = tryLock(path);
  while (release === null) {
    await pause(200);
    release = tryLock(path);
  }
  try {
    return await work();
  } finally {
    release();
  }
}
