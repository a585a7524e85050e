import { describe, expect, it } from 'vitest';
import { carryPattern } from './carry';

const FROM = { staves: 4, courses: 2, cells: Uint8Array.of(0, 1, 2, 3, 3, 2, 1, 0) };

describe('carrying a pattern over to another size', () => {
  it('keeps what fits and fills the new tiles with the filling wood', () => {
    expect([...carryPattern(FROM, { staves: 5, courses: 3 }, 'keep', 9).cells]).toEqual([
      0, 1, 2, 3, 9, 3, 2, 1, 0, 9, 9, 9, 9, 9, 9,
    ]);
  });

  it('repeats round the shell and upwards', () => {
    expect([...carryPattern(FROM, { staves: 6, courses: 3 }, 'repeat').cells]).toEqual([
      0, 1, 2, 3, 0, 1, 3, 2, 1, 0, 3, 2, 0, 1, 2, 3, 0, 1,
    ]);
  });

  it('stretches to the nearest tile', () => {
    expect([...carryPattern(FROM, { staves: 8, courses: 2 }, 'stretch').cells]).toEqual([
      0, 0, 1, 1, 2, 2, 3, 3, 3, 3, 2, 2, 1, 1, 0, 0,
    ]);
  });
});
