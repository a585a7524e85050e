import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Segment } from '@shared/geometry/segment';
import { roundStave, type Grid } from '@shared/layout/cells';
import { tileEdges } from '@shared/pieces/tile-edges';
import { tilePicker, type PickedSheet } from './tile-picking';

/** A half disc of radius 3 on the edge: the simplest tab whose owner can be told by a distance. */
const halfDisc: Segment[] = [
  { kind: 'arc', centre: { x: 0, y: 0 }, radius: 3, startAngle: Math.PI, sweep: -Math.PI },
];

const sheetOf = (grid: Grid, scheme: PickedSheet['scheme']): PickedSheet => ({
  grid,
  tileWidth: 20,
  tileHeight: 30,
  scheme,
  staveTab: halfDisc,
  courseTab: halfDisc,
});

describe('which tile owns a point', () => {
  const grid = { staves: 8, courses: 4 };
  const pick = tilePicker(sheetOf(grid, 'alternating'));

  it('is the square away from its edges', () => {
    expect(pick({ x: 10, y: 15 })).toEqual({ stave: 0, course: 0 });
    expect(pick({ x: 155, y: 110 })).toEqual({ stave: 7, course: 3 });
  });

  it("is the neighbour where the neighbour's tab stands in the square", () => {
    expect(pick({ x: 22.9, y: 15 })).toEqual({ stave: 0, course: 0 });
    expect(pick({ x: 23.1, y: 15 })).toEqual({ stave: 1, course: 0 });
    expect(pick({ x: 10, y: 27.1 })).toEqual({ stave: 0, course: 1 });
    expect(pick({ x: 10, y: 26.9 })).toEqual({ stave: 0, course: 0 });
  });

  it('goes on beyond the seam', () => {
    expect(pick({ x: -2.9, y: 15 })).toEqual({ stave: 0, course: 0 });
    expect(pick({ x: -3.1, y: 15 })).toEqual({ stave: -1, course: 0 });
    expect(pick({ x: 165, y: 15 })).toEqual({ stave: 8, course: 0 });
  });

  it('is nobody below the first and above the last course', () => {
    expect(pick({ x: 10, y: -0.01 })).toBeNull();
    expect(pick({ x: 10, y: 120 })).toBeNull();
  });

  it('is the square where the joint does not close', () => {
    const straight = tilePicker({ ...sheetOf(grid, 'one-way'), staveTab: null, courseTab: null });
    expect(straight({ x: 21, y: 15 })).toEqual({ stave: 1, course: 0 });
  });

  it('agrees with a search through every tile and every tab', () => {
    const schemes = fc.constantFrom('alternating' as const, 'one-way' as const);
    const x = fc.integer({ min: -17_001, max: 33_000 }).map((mm) => mm / 101);
    const y = fc.integer({ min: 0, max: 12_300 }).map((mm) => mm / 103);
    fc.assert(
      fc.property(schemes, x, y, (scheme, px, py) => {
        const sheet = sheetOf(grid, scheme);
        const owner = tilePicker(sheet)({ x: px, y: py });
        fc.pre(distanceToJoints(px, py) > 1e-9);
        expect(owner).toEqual(ownerBySearch(sheet, px, py));
      }),
      { numRuns: 500 },
    );
  });
});

function tabCentres(sheet: PickedSheet): { x: number; y: number; stave: number; course: number }[] {
  const found = [];
  for (let stave = -12; stave < 24; stave++) {
    for (let course = 0; course < sheet.grid.courses; course++) {
      const edges = tileEdges(sheet.scheme, sheet.grid, roundStave(sheet.grid, stave), course);
      const middle = { x: stave * 20 + 10, y: course * 30 + 15 };
      if (edges.left === 'tab') found.push({ x: middle.x - 10, y: middle.y, stave, course });
      if (edges.right === 'tab') found.push({ x: middle.x + 10, y: middle.y, stave, course });
      if (edges.bottom === 'tab') found.push({ x: middle.x, y: middle.y - 15, stave, course });
      if (edges.top === 'tab') found.push({ x: middle.x, y: middle.y + 15, stave, course });
    }
  }
  return found;
}

function ownerBySearch(
  sheet: PickedSheet,
  x: number,
  y: number,
): { stave: number; course: number } {
  const tab = tabCentres(sheet).find((centre) => Math.hypot(x - centre.x, y - centre.y) < 3);
  if (tab) return { stave: tab.stave, course: tab.course };
  return { stave: Math.floor(x / 20), course: Math.floor(y / 30) };
}

/** Least distance to a square's edge or a tab's rim, where the owner turns on the last bit. */
function distanceToJoints(x: number, y: number): number {
  const edgeX = Math.abs(x - Math.round(x / 20) * 20);
  const edgeY = Math.abs(y - Math.round(y / 30) * 30);
  const middleX = x - (Math.floor(x / 20) + 0.5) * 20;
  const middleY = y - (Math.floor(y / 30) + 0.5) * 30;
  const staveRim = Math.abs(Math.hypot(edgeX, middleY) - 3);
  const courseRim = Math.abs(Math.hypot(middleX, edgeY) - 3);
  return Math.min(edgeX, edgeY, staveRim, courseRim);
}
