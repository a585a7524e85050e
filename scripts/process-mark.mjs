/**
 * A process number alone is not enough to know a process again: numbers are used anew, in containers
 * very soon. A mark is the number and the moment the kernel started it.
 */
import { readFileSync } from 'node:fs';

/**
 * @param {number} pid
 * @returns {string | null} the mark, or null when no such process runs
 */
export function markOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name in brackets may hold spaces; what follows it does not. Start time is field 22.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? null : `${pid}@${fields[19]}`;
  } catch {
    return null;
  }
}

/**
 * @param {string} mark
 */
export function isRunning(mark) {
  const pid = Number.parseInt(mark, 10);
  return Number.isInteger(pid) && pid > 0 && markOf(pid) === mark;
}

/** The mark of this process. */
export function ownMark() {
  return markOf(process.pid) ?? `${process.pid}@`;
}
