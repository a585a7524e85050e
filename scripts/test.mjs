/** `npm test`: every gate in order on a PostgreSQL of its own, up to the first that does not pass. */
import { postgresql, testTools } from './debian-packages.mjs';
import { atEnd, isEnding, runProgram } from './ending.mjs';
import { GateFailure, gates } from './gates.mjs';
import { startThrowawayPostgres } from './postgres/throwaway.mjs';
import { Refusal } from './refusal.mjs';
import { installAll } from './set-up.mjs';

/** @returns {Promise<string>} the address of a server that is gone when the tests are over */
async function useThrowawayPostgres() {
  const starting = startThrowawayPostgres();
  atEnd(async () => (await starting.catch(() => null))?.remove());
  return (await starting).url;
}

/** @param {number} since from performance.now() */
function secondsSince(since) {
  return `${((performance.now() - since) / 1000).toFixed(1)} s`;
}

/**
 * @param {import('./gates.mjs').Gate} gate
 * @param {import('./gates.mjs').GateContext} context
 * @returns {Promise<import('./gates.mjs').TestCount & { stopped: boolean }>}
 */
async function runGate(gate, context) {
  console.log(`\n── ${gate.name} ──`);
  const began = performance.now();
  try {
    const count = await gate.run(context);
    const tests = count === null ? '' : `, ${count.passed} passed`;
    console.log(`── ${gate.name}: passed in ${secondsSince(began)}${tests}`);
    return { passed: count?.passed ?? 0, failed: 0, stopped: false };
  } catch (error) {
    if (isEnding()) throw error;
    if (!(error instanceof GateFailure || error instanceof Refusal)) throw error;
    if (error instanceof Refusal) console.error(error.message);
    const count = error instanceof GateFailure ? error.count : null;
    console.error(`── ${gate.name}: DID NOT PASS after ${secondsSince(began)}`);
    // A gate that fails without a failed test (lint, or specs that do not load) counts as one failure.
    return { passed: count?.passed ?? 0, failed: Math.max(1, count?.failed ?? 1), stopped: true };
  }
}

/** @returns {Promise<number>} */
async function test() {
  const began = performance.now();
  await installAll([postgresql, ...testTools]);
  const context = { databaseUrl: await useThrowawayPostgres() };
  const total = { passed: 0, failed: 0 };
  for (const gate of gates) {
    const { passed, failed, stopped } = await runGate(gate, context);
    total.passed += passed;
    total.failed += failed;
    if (stopped) break;
  }
  console.log(`\nAll gates took ${secondsSince(began)}.`);
  console.log(`${total.passed} passed, ${total.failed} failed`);
  return total.failed === 0 ? 0 : 1;
}

await runProgram(test);
