/** How a laid pattern is carried over when the number of staves or courses changes. */
import { roundStave, type Grid } from './cells';
import { gridStateOf, type GridState, type ResizeChange } from './patch';
import type { Layout } from './schema';

export const CARRIES = ['keep', 'repeat', 'stretch'] as const;

/**
 * keep: a tile keeps its wood where its stave and course still exist, new tiles get the first wood;
 * repeat: the pattern goes on round the shell and upwards; stretch: each tile takes the nearest one's wood.
 */
export type Carry = (typeof CARRIES)[number];

/** A way of carrying a pattern over, and what comes of it. */
export interface CarriedWay {
  readonly carry: Carry;
  readonly after: GridState;
}

/**
 * The ways of carrying a pattern to another size that come out differently, in the order of `CARRIES`: one
 * when there is nothing to choose. A pattern all in one wood stays all in that wood.
 */
export function waysToCarry(from: GridState, to: Grid): CarriedWay[] {
  const carries = isOneWood(from.cells) ? (['repeat'] as const) : CARRIES;
  const ways = carries.map((carry) => ({ carry, after: carryPattern(from, to, carry) }));
  return ways.filter(
    ({ after }, i) => ways.findIndex((way) => sameCells(way.after.cells, after.cells)) === i,
  );
}

/** The change to another number of staves or courses, or null when the grid already has that size. */
export function resizeChange(layout: Layout, to: Grid, carry: Carry = 'keep'): ResizeChange | null {
  const before = gridStateOf(layout);
  if (before.staves === to.staves && before.courses === to.courses) return null;
  return { kind: 'resize', before, after: carryPattern(before, to, carry) };
}

/** The pattern on another size of grid. */
export function carryPattern(from: GridState, to: Grid, carry: Carry): GridState {
  const cells = new Uint8Array(to.staves * to.courses);
  for (let course = 0; course < to.courses; course++) {
    for (let stave = 0; stave < to.staves; stave++) {
      cells[course * to.staves + stave] = carried(from, to, carry, stave, course) ?? 0;
    }
  }
  return { staves: to.staves, courses: to.courses, cells };
}

function carried(
  from: GridState,
  to: Grid,
  carry: Carry,
  stave: number,
  course: number,
): number | undefined {
  switch (carry) {
    case 'keep':
      return stave < from.staves && course < from.courses ? woodAt(from, stave, course) : undefined;
    case 'repeat':
      return woodAt(from, roundStave(from, stave), course % from.courses);
    case 'stretch':
      return woodAt(
        from,
        nearest(stave, to.staves, from.staves),
        nearest(course, to.courses, from.courses),
      );
  }
}

function woodAt(from: GridState, stave: number, course: number): number | undefined {
  return from.cells[course * from.staves + stave];
}

/** The tile whose middle lies nearest when both rows are drawn equally long. */
function nearest(index: number, count: number, ofCount: number): number {
  return Math.min(ofCount - 1, Math.floor(((index + 0.5) * ofCount) / count));
}

function isOneWood(cells: Uint8Array): boolean {
  return cells.every((wood) => wood === cells[0]);
}

function sameCells(a: Uint8Array, b: Uint8Array): boolean {
  return a.length === b.length && a.every((wood, at) => wood === b[at]);
}
