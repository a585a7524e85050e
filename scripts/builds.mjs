/** Builds the app and the server, and leaves alone what is built from the same sources already. */
import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { runOrRefuse } from './children.mjs';
import { inProject } from './project.mjs';
import { Refusal } from './refusal.mjs';

const common = ['package-lock.json', 'tsconfig.json', 'shared', 'exports', 'scripts/builds.mjs'];

/** Where the built app and the built server lie. */
export const appFolder = inProject('dist', 'app');
export const serverFile = inProject('dist', 'server', 'main.js');

/**
 * @param {string} path within the project
 * @returns {string[]} the files at or under it, without specs, sorted
 */
function filesOf(path) {
  const whole = inProject(path);
  if (!existsSync(whole)) return [];
  if (statSync(whole).isFile()) return [path];
  return readdirSync(whole)
    .sort()
    .flatMap((name) => filesOf(join(path, name)))
    .filter((file) => !file.endsWith('.spec.ts'));
}

/** @param {string[]} sources */
function fingerprint(sources) {
  const hash = createHash('sha256');
  for (const file of sources.flatMap(filesOf)) {
    hash.update(`${file}\0`).update(readFileSync(inProject(file)));
  }
  return hash.digest('hex');
}

/**
 * @param {{ name: string, sources: string[], result: string, build: () => Promise<void> }} part
 */
async function buildWhenChanged({ name, sources, result, build }) {
  const note = inProject('dist', `${name}.built-from`);
  const now = fingerprint([...common, ...sources]);
  if (existsSync(result) && existsSync(note) && readFileSync(note, 'utf8') === now) {
    console.log(`The ${name} is built from these sources already.`);
    return;
  }
  console.log(`Building the ${name} …`);
  rmSync(note, { force: true });
  await build();
  mkdirSync(inProject('dist'), { recursive: true });
  writeFileSync(note, now);
}

/** The Angular app; a bundle over its budget is a failure. */
export function buildApp() {
  return buildWhenChanged({
    name: 'app',
    sources: ['src', 'public', 'angular.json', 'tsconfig.app.json'],
    result: join(appFolder, 'index.html'),
    build: () =>
      runOrRefuse('ng build', process.execPath, ['node_modules/@angular/cli/bin/ng.js', 'build'], {
        environment: { NG_CLI_ANALYTICS: 'false', CI: 'true' },
      }),
  });
}

/** The server, with packages left where npm put them. */
export function buildServer() {
  return buildWhenChanged({
    name: 'server',
    sources: ['server', 'drizzle'],
    result: serverFile,
    build: async () => {
      const esbuild = await import('esbuild');
      const building = esbuild.build({
        absWorkingDir: inProject(),
        entryPoints: ['server/main.ts'],
        outfile: serverFile,
        bundle: true,
        packages: 'external',
        format: 'esm',
        platform: 'node',
        target: 'node20',
        sourcemap: true,
        logLevel: 'warning',
      });
      await building.catch(() => {
        throw new Refusal('Building the server failed; the reasons stand above.');
      });
      // Its worker process would stay for as long as we run.
      await esbuild.stop();
    },
  });
}
