/** How a laid pattern is carried over when the number of staves or courses changes. */
import { roundStave, type Grid } from './cells';
import type { GridState } from './patch';

export const CARRIES = ['keep', 'repeat', 'stretch'] as const;

/** keep: what fits stays, new tiles get the filling wood; repeat: the pattern goes on; stretch: to the nearest tile. */
export type Carry = (typeof CARRIES)[number];

/** The pattern on another size of grid. */
export function carryPattern(from: GridState, to: Grid, carry: Carry, filling = 0): GridState {
  const cells = new Uint8Array(to.staves * to.courses);
  for (let course = 0; course < to.courses; course++) {
    for (let stave = 0; stave < to.staves; stave++) {
      cells[course * to.staves + stave] = carried(from, to, carry, stave, course) ?? filling;
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
