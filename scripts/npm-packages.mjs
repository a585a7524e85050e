/** Installs the npm packages when they are missing or are not those of package-lock.json. */
import { existsSync, readFileSync } from 'node:fs';
import { runOrRefuse } from './children.mjs';
import { inProject } from './project.mjs';

/** @typedef {Record<string, { version?: string, optional?: boolean, link?: boolean }>} Packages */

/**
 * @param {string} path
 * @returns {Packages | null}
 */
function packagesOf(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')).packages : null;
}

/** npm writes node_modules/.package-lock.json last, so an interrupted install is found out too. */
function areInstalled() {
  const wanted = packagesOf(inProject('package-lock.json')) ?? {};
  const present = packagesOf(inProject('node_modules', '.package-lock.json'));
  if (present === null) return false;
  return Object.entries(wanted).every(
    // Optional packages are for other machines as often as not; npm leaves those out.
    ([path, { version, optional }]) =>
      path === '' || optional === true || present[path]?.version === version,
  );
}

/** Refuses with npm's own words when the packages cannot be installed. */
export async function installNpmPackages() {
  if (areInstalled()) return;
  console.log('Installing the npm packages, about a minute …');
  await runOrRefuse('npm ci', 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
}
