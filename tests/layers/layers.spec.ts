/**
 * The import rules themselves are tested: every rule has a small tree in not-ok/ that breaks it and no
 * other rule, and the tree in ok/ does all that is allowed.
 */
import { readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { cruise, type ICruiseOptions, type IForbiddenRuleType } from 'dependency-cruiser';
import { describe, expect, it } from 'vitest';
import { inProject } from '../../scripts/project.mjs';

interface Rules {
  readonly forbidden: (IForbiddenRuleType & { name: string })[];
  readonly options: ICruiseOptions;
}

const rules = createRequire(import.meta.url)('../../.dependency-cruiser.cjs') as Rules;
const here = inProject('tests', 'layers');

/** The rules the tree breaks, each once, and between which files. */
async function brokenRules(tree: string): Promise<string[]> {
  const { output } = await cruise(['.'], {
    ...rules.options,
    ruleSet: { forbidden: rules.forbidden },
    validate: true,
    baseDir: join(here, tree),
  });
  if (typeof output === 'string') throw new Error(output);
  return [...new Set(output.summary.violations.map(({ rule }) => rule.name))];
}

describe('the import rules', () => {
  it('allow what the map of the folders allows', async () => {
    expect(await brokenRules('ok')).toEqual([]);
  });

  it('have a tree that breaks each of them', () => {
    const trees = readdirSync(join(here, 'not-ok')).sort();
    expect(trees).toEqual(rules.forbidden.map(({ name }) => name).sort());
  });

  it.each(readdirSync(join(here, 'not-ok')))('bite: %s', async (name) => {
    expect(await brokenRules(join('not-ok', name))).toContain(name);
  });
});
