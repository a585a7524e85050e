/** Debian packages the project needs, and how to see that each is there. */
import { existsSync } from 'node:fs';
import { runChild, runOrRefuse } from './children.mjs';
import { programFolder } from './postgres/programs.mjs';
import { Refusal } from './refusal.mjs';

/** @typedef {{ name: string, isThere: () => boolean }} DebianPackage */

/** @type {DebianPackage} */
export const postgresql = { name: 'postgresql', isThere: () => programFolder() !== null };

/**
 * The browser the end-to-end specs drive, and the programs the reference tests read our files with.
 * @type {DebianPackage[]}
 */
export const testTools = [
  { name: 'chromium', isThere: () => existsSync('/usr/bin/chromium') },
  { name: 'python3-ezdxf', isThere: () => existsSync('/usr/lib/python3/dist-packages/ezdxf') },
];

const aptOptions = ['-o', 'DPkg::Lock::Timeout=300'];

/**
 * Installs what is missing as root. Anyone else is told what to install, and we stop.
 * @param {DebianPackage[]} packages
 */
export async function installDebianPackages(packages) {
  const missing = packages.filter(({ isThere }) => !isThere()).map(({ name }) => name);
  if (missing.length === 0) return;
  const install = [...aptOptions, 'install', '-y', '--no-install-recommends', ...missing];
  if (process.getuid?.() !== 0) {
    throw new Refusal(
      `Missing on this machine: ${missing.join(', ')}. Install and start again:\n` +
        `  sudo apt-get update && sudo apt-get install -y --no-install-recommends ${missing.join(' ')}`,
    );
  }
  console.log(`Installing Debian packages: ${missing.join(', ')} …`);
  const options = { environment: { DEBIAN_FRONTEND: 'noninteractive' } };
  const first = await runChild('apt-get', install, { ...options, output: 'kept' });
  if (first.code === 0) return;
  await runOrRefuse('apt-get update', 'apt-get', [...aptOptions, 'update'], options);
  await runOrRefuse('apt-get install', 'apt-get', install, options);
}
