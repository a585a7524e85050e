/** Where things are in this copy of the project. */
import { createHash } from 'node:crypto';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of this copy, without a slash at its end. */
export const projectFolder = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '');

/** What running programs leave for each other: locks, the session secret, the address in use. */
export const runFolder = join(projectFolder, '.run');

/** A short name for this copy, so that two copies never share a folder outside the project. */
export const projectKey = createHash('sha256').update(projectFolder).digest('hex').slice(0, 12);

/**
 * The path of a file of the project.
 * @param {string[]} parts
 */
export function inProject(...parts) {
  return join(projectFolder, ...parts);
}
