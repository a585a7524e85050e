/** The gates of `npm test`, in order. Each either passes or ends the run. */
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { runChild } from './children.mjs';
import { inProject } from './project.mjs';
import { buildAll } from './set-up.mjs';

/** @typedef {{ databaseUrl: string }} GateContext */
/** @typedef {{ passed: number, failed: number }} TestCount */
/**
 * @typedef {object} Gate
 * @property {string} name
 * @property {(context: GateContext) => Promise<TestCount | null>} run null when the gate counts no tests;
 *   throws GateFailure when it does not pass
 */

export class GateFailure extends Error {
  /** @param {TestCount | null} count */
  constructor(count) {
    super('The gate did not pass.');
    this.count = count;
  }
}

const codeFolders = ['shared', 'exports', 'drizzle', 'server', 'seeds', 'src', 'tests'];

/**
 * @param {string} script path of a program in node_modules
 * @param {string[]} parameters
 * @param {Record<string, string>} [environment]
 */
async function passes(script, parameters, environment = {}) {
  const options = { environment: { CI: 'true', ...environment } };
  const program = [inProject('node_modules', script), ...parameters];
  return (await runChild(process.execPath, program, options)).code === 0;
}

/**
 * A gate that is one program.
 * @param {string} name
 * @param {[string, ...string[]][]} programs
 * @returns {Gate}
 */
function programGate(name, ...programs) {
  const run = async () => {
    for (const [script, ...parameters] of programs) {
      if (!(await passes(script, parameters))) throw new GateFailure(null);
    }
    return null;
  };
  return { name, run };
}

/**
 * What a JSON report counts; null when the run ended before it wrote one.
 * @param {string} report
 * @returns {TestCount | null}
 */
function countOf(report) {
  if (!existsSync(report)) return null;
  const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
  return { passed: numPassedTests, failed: numFailedTests };
}

/**
 * A gate that runs specs and counts them. A run without a single passed test does not pass.
 * @param {string} name
 * @param {string} script
 * @param {(report: string) => string[]} parameters
 * @returns {Gate}
 */
function specGate(name, script, parameters) {
  return {
    name,
    run: async ({ databaseUrl }) => {
      const report = inProject('out', 'tests', `${name.replaceAll(' ', '-')}.json`);
      mkdirSync(inProject('out', 'tests'), { recursive: true });
      rmSync(report, { force: true });
      const environment = { TEST_DATABASE_URL: databaseUrl, NG_CLI_ANALYTICS: 'false' };
      const passed = await passes(script, parameters(report), environment);
      const count = countOf(report);
      if (!passed || count === null || count.passed === 0) throw new GateFailure(count);
      return count;
    },
  };
}

/**
 * @param {string} name
 * @param {string[]} projects of vitest.config.ts
 */
function vitestGate(name, projects) {
  return specGate(name, 'vitest/vitest.mjs', (report) => [
    ...['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
    ...projects.map((project) => `--project=${project}`),
  ]);
}

/** @type {Gate} */
const buildGate = {
  name: 'build',
  run: async () => {
    await buildAll();
    return null;
  },
};

/** @type {Gate[]} */
export const gates = [
  programGate('format', ['prettier/bin/prettier.cjs', '--check', '.']),
  programGate('lint', ['eslint/bin/eslint.js', '.']),
  programGate('layers', [
    'dependency-cruiser/bin/dependency-cruise.mjs',
    ...['--config', '.dependency-cruiser.cjs'],
    ...codeFolders.filter((folder) => existsSync(inProject(folder))),
  ]),
  programGate(
    'types',
    ['typescript/bin/tsc', '-p', 'tsconfig.json'],
    ['typescript/bin/tsc', '-p', 'tsconfig.pure.json'],
    ['@angular/compiler-cli/bundles/src/bin/ngc.js', '-p', 'tsconfig.spec.json', '--noEmit'],
  ),
  vitestGate('unit and property', ['unit', 'property']),
  vitestGate('reference', ['reference']),
  vitestGate('API', ['api']),
  buildGate,
  specGate('components', '@angular/cli/bin/ng.js', (report) => [
    ...['test', '--no-watch', '--no-progress', '--reporters=json', '--reporters=default'],
    `--output-file=${report}`,
  ]),
  vitestGate('browser', ['browser']),
];
