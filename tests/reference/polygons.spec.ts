/**
 * The ring against a table of regular polygons (data/polygons.csv: computed, exact; the same columns are
 * printed in Machinery's Handbook, "Formulas and Table for Regular Polygons", from memory).
 */
import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { ringOf } from '@shared/shell/ring';

interface Row {
  readonly n: number;
  readonly bevel: number;
  readonly central: number;
  readonly tan: number;
  readonly sec: number;
}

const file = new URL('data/polygons.csv', import.meta.url);
const rows: Row[] = readFileSync(file, 'utf8')
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => {
    const [n, central, , bevel, , tan, sec] = line.split(',').map(Number);
    return { n: n!, bevel: bevel!, central: central!, tan: tan!, sec: sec! };
  });

test('the table holds 3 to 64 sides', () => {
  expect(rows.map(({ n }) => n)).toEqual(Array.from({ length: 62 }, (_, i) => i + 3));
});

test.each(rows.filter(({ n }) => n >= 6))(
  'a ring of $n staves',
  ({ n, bevel, central, tan, sec }) => {
    const ring = ringOf(
      {
        staves: n,
        tileWidth: 100,
        finishedOuterDiameter: 90,
        finishedInnerDiameter: 80,
        skimAllowance: 0,
      },
      0,
    );
    expect(ring.bevel).toBeCloseTo(bevel, 6);
    expect(ring.jointTurn).toBeCloseTo(central, 6);
    // nine decimals in the table
    expect(100 / ring.acrossFlats / tan).toBeCloseTo(1, 7);
    expect(ring.acrossCorners / ring.acrossFlats / sec).toBeCloseTo(1, 8);
  },
);
