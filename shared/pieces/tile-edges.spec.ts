import { describe, expect, it } from 'vitest';
import { cellAt } from '../layout/cells';
import { faceDown, halfTurned, tileEdges, type EdgeKind } from './tile-edges';

const meets = (a: EdgeKind, b: EdgeKind) =>
  `${a} ${b}` === 'tab socket' || `${a} ${b}` === 'socket tab';

describe.each([
  { scheme: 'alternating' as const, staves: 8 },
  { scheme: 'one-way' as const, staves: 8 },
  { scheme: 'one-way' as const, staves: 9 },
])('$scheme tabs on $staves staves', ({ scheme, staves }) => {
  const grid = { staves, courses: 4 };
  const edgesAt = (stave: number, course: number) =>
    tileEdges(scheme, grid, cellAt(grid, stave, 0), course);

  it('meet sockets at every stave joint, the seam too', () => {
    for (let course = 0; course < 4; course++) {
      for (let stave = 0; stave < staves; stave++) {
        const [left, right] = [edgesAt(stave, course), edgesAt(stave + 1, course)];
        expect(meets(left.right, right.left)).toBe(true);
      }
    }
  });

  it('meet sockets at every course joint', () => {
    for (let course = 0; course < 3; course++) {
      for (let stave = 0; stave < staves; stave++) {
        expect(meets(edgesAt(stave, course).top, edgesAt(stave, course + 1).bottom)).toBe(true);
      }
    }
  });

  it('leave both ends of the shell flat', () => {
    expect(edgesAt(3, 0).bottom).toBe('flat');
    expect(edgesAt(3, 3).top).toBe('flat');
  });
});

it('alternating tabs clash at the seam of an odd ring', () => {
  const grid = { staves: 9, courses: 4 };
  const [last, first] = [8, 0].map((stave) => tileEdges('alternating', grid, stave, 1));
  expect(meets(last!.right, first!.left)).toBe(false);
});

it('half a turn exchanges both pairs, lying face down only left and right', () => {
  const edges = { left: 'socket', right: 'tab', bottom: 'flat', top: 'tab' } as const;
  expect(halfTurned(edges)).toEqual({ left: 'tab', right: 'socket', bottom: 'tab', top: 'flat' });
  expect(faceDown(edges)).toEqual({ left: 'tab', right: 'socket', bottom: 'flat', top: 'tab' });
});
