import { readdirSync } from 'node:fs';
import { basename, extname } from 'node:path';
import { expect, it } from 'vitest';
import { inProject } from '../../scripts/project.mjs';

const codeFolders = ['shared', 'exports', 'drizzle', 'server', 'seeds', 'src', 'scripts', 'tests'];

/** Names that say nothing about the trade, and so gather everything. */
const emptyNames = ['utils', 'helpers', 'common', 'services', 'types', 'misc', 'lib'];

it('every folder and file of code is named for what it holds', () => {
  const nameless = codeFolders.flatMap((folder) =>
    readdirSync(inProject(folder), { recursive: true, encoding: 'utf8' }).filter((path) =>
      emptyNames.includes(basename(path, extname(path))),
    ),
  );
  expect(nameless).toEqual([]);
});
