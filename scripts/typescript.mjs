/** Runs TypeScript files of the project under Node, from whatever folder we were called. */
import { createRequire } from 'node:module';
import { pathToFileURL } from 'node:url';
import { inProject } from './project.mjs';

/**
 * What to pass to `node` for one of our TypeScript files.
 * @param {string} file
 * @param {string[]} [parameters] the file's own
 */
export function nodeParameters(file, parameters = []) {
  const tsx = createRequire(import.meta.url).resolve('tsx');
  return ['--import', pathToFileURL(tsx).href, inProject(file), ...parameters];
}

/** tsx looks for the path aliases in the folder it is called from, unless told. */
export const typescriptEnvironment = { TSX_TSCONFIG_PATH: inProject('tsconfig.json') };
