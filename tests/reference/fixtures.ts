import { readFileSync, readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { readLayoutText } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';

const FOLDER = new URL('../fixtures/layouts/', import.meta.url);

/** Absolute path of a fixture, e.g. `ok/least-shell.json`. */
export function fixturePath(name: string): string {
  return fileURLToPath(new URL(name, FOLDER));
}

/** Names of the fixtures of a folder, ascending. */
export function fixtureNames(folder: 'ok' | 'not-ok'): string[] {
  return readdirSync(new URL(folder, FOLDER)).sort();
}

/** The layout of a fixture under `ok/`. */
export function fixtureLayout(name: string): Layout {
  const reading = readLayoutText(readFileSync(fixturePath(`ok/${name}`), 'utf8'));
  if (!reading.ok) throw new Error(`${name}: ${JSON.stringify(reading.problems)}`);
  return reading.layout;
}
