import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CARRIES, carryPattern, resizeChange, waysToCarry } from './carry';
import { applyPatch, gridStateOf, invertPatch } from './patch';
import { smallLayout } from './small-layout.fixture';

const FROM = { staves: 4, courses: 2, cells: Uint8Array.of(0, 1, 2, 3, 3, 2, 1, 0) };

describe('carrying a pattern over to another size', () => {
  it('keeps what fits and fills the new tiles with the first wood', () => {
    expect([...carryPattern(FROM, { staves: 5, courses: 3 }, 'keep').cells]).toEqual([
      0, 1, 2, 3, 0, 3, 2, 1, 0, 0, 0, 0, 0, 0, 0,
    ]);
  });

  it('cuts off what does not fit', () => {
    expect([...carryPattern(FROM, { staves: 3, courses: 1 }, 'keep').cells]).toEqual([0, 1, 2]);
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

describe('the ways a person may choose from', () => {
  it('are three when the shell grows', () => {
    const ways = waysToCarry(FROM, { staves: 6, courses: 2 });
    expect(ways.map(({ carry }) => carry)).toEqual(['keep', 'repeat', 'stretch']);
  });

  it('leave out repeating when the shell only shrinks: it is what keeping is', () => {
    const ways = waysToCarry(FROM, { staves: 3, courses: 2 });
    expect(ways.map(({ carry }) => carry)).toEqual(['keep', 'stretch']);
  });

  it('are one for a pattern all in one wood, and it stays all in that wood', () => {
    const walnut = { ...FROM, cells: new Uint8Array(8).fill(1) };
    const ways = waysToCarry(walnut, { staves: 9, courses: 5 });
    expect(ways).toHaveLength(1);
    expect(new Set(ways[0]?.after.cells)).toEqual(new Set([1]));
  });

  it('are one for the size it has', () => {
    expect(waysToCarry(FROM, FROM)).toHaveLength(1);
  });
});

describe('the change of size', () => {
  it('is none for the size the shell has', () => {
    const layout = smallLayout();
    expect(resizeChange(layout, layout.shell, 'stretch')).toBeNull();
  });

  it('uses no wood that was not there, besides the first, and is undone to the tile', () => {
    const cases = fc.record({
      cells: fc.array(fc.nat(3), { minLength: 24, maxLength: 24 }),
      staves: fc.integer({ min: 6, max: 40 }),
      courses: fc.integer({ min: 1, max: 12 }),
      carry: fc.constantFrom(...CARRIES),
    });
    fc.assert(
      fc.property(cases, ({ cells, staves, courses, carry }) => {
        const layout = { ...smallLayout(), cells: Uint8Array.from(cells) };
        const change = resizeChange(layout, { staves, courses }, carry);
        const patch = change ? [change] : [];
        const after = applyPatch(layout, patch);
        expect(after.cells).toHaveLength(staves * courses);
        expect(after.cells.every((wood) => wood === 0 || cells.includes(wood))).toBe(true);
        expect(applyPatch(after, invertPatch(patch))).toEqual(layout);
        const back = carryPattern(gridStateOf(after), layout.shell, carry);
        const grows = staves >= 8 && courses >= 3;
        if (grows) expect(back.cells).toEqual(layout.cells);
      }),
      { seed: 280_714 },
    );
  });
});
