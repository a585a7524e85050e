import { expect, it } from 'vitest';
import { migrateLayout, MIGRATIONS, type Migration } from './migrations';

/** Invented: version 1 called the shell a ring, version 2 had no clearance. */
const invented: readonly Migration[] = [
  { from: 1, migrate: ({ ring, ...rest }) => ({ ...rest, shell: ring }) },
  { from: 2, migrate: (document) => ({ ...document, clearance: 0 }) },
];

it('a document two versions old takes both steps in turn', () => {
  const old = { format: 'x', formatVersion: 1, ring: { staves: 8 } };
  expect(migrateLayout(old, 1, invented, 3)).toEqual({
    format: 'x',
    formatVersion: 3,
    shell: { staves: 8 },
    clearance: 0,
  });
});

it('a document of the present version is left as it is', () => {
  const document = { formatVersion: 3 };
  expect(migrateLayout(document, 3, invented, 3)).toBe(document);
});

it('a step that is missing leaves the version it got to, for the schema to refuse', () => {
  expect(migrateLayout({ formatVersion: 0 }, 0, invented, 3)).toEqual({ formatVersion: 0 });
});

it('the program’s own steps follow each other without a gap', () => {
  MIGRATIONS.forEach(({ from }, i) => expect(from).toBe((MIGRATIONS[0]?.from ?? 0) + i));
});
