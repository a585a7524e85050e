/** For any layout file: it is refused field by field, or everything built from it holds. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { runChecks } from '@shared/checks/run-checks';
import { selfCrossing } from '@shared/geometry/crossing';
import { areaOf } from '@shared/geometry/outline';
import { endOf, startOf, type Segment } from '@shared/geometry/segment';
import { distance } from '@shared/geometry/vector';
import { cutterFit } from '@shared/joint/cutter-fit';
import { printLayout, readLayout, readLayoutText } from '@shared/layout/read-layout';
import { layoutFileSchema, type Layout } from '@shared/layout/schema';
import { cutList } from '@shared/pieces/cut-list';
import { layoutOutlines } from '@shared/pieces/layout-fit';
import { nominalTileOutline } from '@shared/pieces/tile-outline';
import { tileEdges } from '@shared/pieces/tile-edges';
import { FIXED_SEED } from './fixed-seed';
import { layoutFiles } from './layouts';

/** Runs a property on every accepted layout and returns how many of the files were accepted. */
function forAccepted(numRuns: number, holds: (layout: Layout) => void): number {
  let accepted = 0;
  fc.assert(
    fc.property(layoutFiles, (file) => {
      const reading = readLayout(file);
      if (!reading.ok) return;
      accepted += 1;
      holds(reading.layout);
    }),
    { ...FIXED_SEED, numRuns },
  );
  return accepted;
}

test('the files are what the schema allows, and a good part of them is accepted', () => {
  fc.assert(
    fc.property(layoutFiles, (file) => {
      expect(layoutFileSchema.safeParse(file).error?.issues).toBeUndefined();
      const reading = readLayout(file);
      if (reading.ok) return;
      expect(reading.problems.length).toBeGreaterThan(0);
      for (const { field, message } of reading.problems) {
        expect(field).toMatch(/^(shell|joint)\./);
        expect(message).toMatch(/^must be (at (least|most)|over|under) /);
        expect(message).not.toMatch(/NaN|Infinity|-\d/);
      }
    }),
    { ...FIXED_SEED, numRuns: 800 },
  );
  expect(forAccepted(800, () => undefined)).toBeGreaterThan(200);
});

test('outlines are closed, counter-clockwise, and cross themselves only where the web check stops', () => {
  forAccepted(900, (layout) => {
    const stopped = fallsApart(layout);
    for (const { outline } of layoutOutlines(layout)) {
      expect(openings(outline.segments)).toBeLessThanOrEqual(1e-6);
      if (stopped) continue;
      expect(selfCrossing(outline.segments)).toBeNull();
      expect(areaOf(outline)).toBeGreaterThan(0);
    }
  });
});

/** True when sockets leave no wood between them, which the web check must say. */
function fallsApart(layout: Layout): boolean {
  return runChecks(layout).some(({ key, result }) => key === 'web' && result === 'stop');
}

function openings(segments: readonly Segment[]): number {
  return Math.max(
    ...segments.map((segment, i) =>
      distance(endOf(segment), startOf(segments[(i + 1) % segments.length]!)),
    ),
  );
}

test('before clearance middle tiles have the area of the grid', () => {
  forAccepted(800, (layout) => {
    const { tileWidth, tileHeight } = layout.shell;
    const grid = { staves: 8, courses: 4 };
    const middle = (stave: number) =>
      areaOf(nominalTileOutline(layout, tileEdges(layout.joint.scheme, grid, stave, 1)));
    // tiny joints on a large tile: the area is a difference of large numbers
    const pair = middle(0) + middle(1);
    expect(pair / (2 * tileWidth * tileHeight)).toBeCloseTo(1, 9);
    if (layout.joint.scheme === 'one-way') {
      expect(middle(0) / (tileWidth * tileHeight)).toBeCloseTo(1, 9);
    }
  });
});

test('printing a layout and reading it again is the identity', () => {
  forAccepted(800, (layout) => {
    const printed = printLayout(layout);
    const reading = readLayoutText(printed);
    expect(reading.ok && reading.layout).toEqual(layout);
    expect(reading.ok && printLayout(reading.layout)).toBe(printed);
  });
});

test('a cutter that fits an outline leaves room for every smaller one', () => {
  forAccepted(400, (layout) => {
    if (fallsApart(layout)) return;
    for (const { outline } of layoutOutlines(layout)) {
      const { largestCutter } = cutterFit(outline, 1);
      if (largestCutter === Infinity) continue;
      for (const share of [0.999, 0.5, 0.1]) {
        expect(cutterFit(outline, largestCutter * share).fits).toBe(true);
      }
      for (const more of [0.002, 1]) {
        expect(cutterFit(outline, largestCutter + more).fits).toBe(false);
      }
    }
  });
});

test('checks never throw, print plain figures, and have a remedy exactly when not clear', () => {
  forAccepted(900, (layout) => {
    for (const lengthUnit of ['mm', 'in'] as const) {
      for (const check of runChecks(layout, { lengthUnit })) {
        const { finding, reason, remedy, figure, limit } = check;
        expect(`${finding} ${reason} ${remedy}`).not.toMatch(/NaN|Infinity|undefined|null/);
        for (const measure of [figure, limit]) {
          expect(measure === null || Number.isFinite(measure.value)).toBe(true);
        }
        expect(remedy !== '').toBe(check.result !== 'clear');
        expect(finding).toMatch(/\.$/);
      }
    }
  });
});

test('the cut list fills every tile exactly once', () => {
  forAccepted(300, (layout) => {
    const { rows, tiles } = cutList(layout);
    const filled = rows.flatMap(({ kind }) => kind.positions).sort((a, b) => a - b);
    expect(filled).toEqual([...layout.cells.keys()]);
    expect(tiles).toBe(layout.cells.length);
    for (const { kind } of rows) {
      expect(kind.positions.every((position) => layout.cells[position] === kind.wood)).toBe(true);
    }
  });
});
