/** What every program of the project needs before it can do its own work. */
import { join } from 'node:path';
import { buildApp, buildServer } from './builds.mjs';
import { installDebianPackages } from './debian-packages.mjs';
import { withLock } from './lock.mjs';
import { installNpmPackages } from './npm-packages.mjs';
import { runFolder } from './project.mjs';
import { Refusal } from './refusal.mjs';

/** `npm start` and `npm test` of one copy may run at once; they install and build in turn. */
const lock = join(runFolder, 'set-up.lock');

/** Angular's build and the test runner want at least this. */
const leastNode = [20, 19];

function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  const [leastMajor = 0, leastMinor = 0] = leastNode;
  if (major > leastMajor || (major === leastMajor && minor >= leastMinor)) return;
  throw new Refusal(`Node ${leastNode.join('.')} or newer is needed; this is ${process.version}.`);
}

/** @param {import('./debian-packages.mjs').DebianPackage[]} debianPackages */
export async function installAll(debianPackages) {
  checkNode();
  await withLock(lock, async () => {
    await installDebianPackages(debianPackages);
    await installNpmPackages();
  });
}

export async function buildAll() {
  await withLock(lock, async () => {
    await buildServer();
    await buildApp();
  });
}
