/** Runs the benches (`*.bench.ts` of this folder) one after the other and prints their rows as one table. */
import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { BenchRow } from './bench-row';

interface Bench {
  readonly default: () => Promise<BenchRow[]>;
}

const heads = ['what', 'ours', 'baseline', 'ratio', 'note'] as const;

function cells(row: BenchRow): string[] {
  return [row.what, row.ours, row.baseline, row.ratio.toPrecision(3), row.note ?? ''];
}

function table(rows: readonly BenchRow[]): string {
  const lines = [[...heads], ...rows.map(cells)];
  const widths = heads.map((_, column) =>
    Math.max(...lines.map((line) => line[column]?.length ?? 0)),
  );
  const printed = lines.map((line) =>
    line
      .map((cell, column) => cell.padEnd(widths[column] ?? 0))
      .join('  ')
      .trimEnd(),
  );
  return [
    printed[0],
    widths.map((width) => '─'.repeat(width)).join('  '),
    ...printed.slice(1),
  ].join('\n');
}

const wanted = process.argv.slice(2);
const files = readdirSync(fileURLToPath(new URL('.', import.meta.url)))
  .filter((name) => name.endsWith('.bench.ts'))
  .filter((name) => wanted.length === 0 || wanted.some((part) => name.includes(part)))
  .sort();

const rows: BenchRow[] = [];
for (const file of files) {
  console.error(`${file} …`);
  const bench = (await import(new URL(file, import.meta.url).href)) as Bench;
  rows.push(...(await bench.default()));
}
console.log(table(rows));
