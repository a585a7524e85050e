import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { PROGRAM } from './program';

it('files name the version of the package', () => {
  const text = readFileSync(new URL('../package.json', import.meta.url), 'utf8');
  expect(JSON.parse(text)).toMatchObject({ version: PROGRAM.version });
});
