import { describe, expect, it } from 'vitest';
import {
  applyPatch,
  fieldChange,
  invertPatch,
  layChange,
  overlapOf,
  patchBetween,
  sameValue,
  squashPatches,
  type Patch,
} from './patch';
import { resizeChange } from './carry';
import { smallLayout } from './small-layout.fixture';

const layout = smallLayout();

const lay = (positions: readonly number[], wood: number): Patch => [
  layChange(layout.cells, positions, wood)!,
];

describe('laying tiles', () => {
  it('names each tile once, in order, with what lay there', () => {
    expect(layChange(layout.cells, [5, 2, 5], 1)).toEqual({
      kind: 'cells',
      positions: [2, 5],
      before: [0, 0],
      after: [1, 1],
    });
  });

  it('is nothing where the wood lies already', () => {
    expect(layChange(layout.cells, [1, 2], 0)).toBeNull();
  });

  it('leaves the document it was made on alone', () => {
    applyPatch(layout, lay([3], 2));
    expect(layout.cells[3]).toBe(0);
  });
});

describe('setting a field', () => {
  it('keeps everything beside it', () => {
    const after = applyPatch(layout, [fieldChange(layout, 'joint.clearance', 0.2)!]);
    expect(after.joint).toEqual({ ...layout.joint, clearance: 0.2 });
    expect(after.cells).toBe(layout.cells);
  });

  it('is nothing when the value is the same, key order aside', () => {
    const { headRadius, filletRadius, reach } = { headRadius: 3.6, filletRadius: 1.8, reach: 7.6 };
    const same = { reach, filletRadius, headRadius, profile: 'round' as const };
    expect(fieldChange(layout, 'joint.staveJoint', same)).toBeNull();
    expect(sameValue({ a: 1, b: [1, 2] }, { b: [1, 2], a: 1 })).toBe(true);
    expect(sameValue([1, 2], [2, 1])).toBe(false);
  });
});

describe('squashing', () => {
  it('melts strokes over the same tiles into one change', () => {
    const first = lay([1, 2], 1);
    const after = applyPatch(layout, first);
    const second: Patch = [layChange(after.cells, [2, 3], 2)!];
    expect(squashPatches(first, second)).toEqual([
      { kind: 'cells', positions: [1, 2, 3], before: [0, 0, 0], after: [1, 2, 2] },
    ]);
  });

  it('leaves nothing of a stroke that was taken back', () => {
    const first = lay([1, 2], 1);
    expect(squashPatches(first, invertPatch(first))).toEqual([]);
  });

  it('does not carry tiles across a resize', () => {
    const first = lay([1], 1);
    const resize = resizeChange(applyPatch(layout, first), { staves: 10, courses: 3 })!;
    const resized = applyPatch(layout, [...first, resize]);
    const last = layChange(resized.cells, [1], 0)!;
    expect(squashPatches([...first, resize], [last])).toHaveLength(3);
  });
});

describe('what two patches both touch', () => {
  it('is nothing when they lay different tiles', () => {
    expect(overlapOf(lay([1], 1), lay([2], 1))).toBeNull();
  });

  it('is the tile or the field', () => {
    const clearance: Patch = [fieldChange(layout, 'joint.clearance', 0.2)!];
    expect(overlapOf(lay([1, 2], 1), lay([2, 3], 2))).toEqual({
      positions: [2],
      fields: [],
      grid: false,
    });
    expect(overlapOf(clearance, clearance)?.fields).toEqual(['joint.clearance']);
    expect(overlapOf(clearance, lay([1], 1))).toBeNull();
  });

  it('is the grid when one resizes and the other lays', () => {
    const resize: Patch = [resizeChange(layout, { staves: 10, courses: 3 })!];
    expect(overlapOf(resize, lay([1], 1))?.grid).toBe(true);
    expect(overlapOf(lay([1], 1), resize)?.grid).toBe(true);
    const renamed = layout.woods.map((wood) => ({ ...wood, name: `Old ${wood.name}` }));
    const woods: Patch = [fieldChange(layout, 'woods', renamed)!];
    expect(overlapOf(resize, woods)?.grid).toBe(true);
    expect(overlapOf(resize, [fieldChange(layout, 'name', 'Other ring')!])).toBeNull();
  });
});

it('the patch between two layouts turns one into the other', () => {
  const after = applyPatch(layout, [
    ...lay([4, 7], 3),
    fieldChange(layout, 'name', 'Other ring')!,
    fieldChange(layout, 'build.turnOver', false)!,
  ]);
  expect(applyPatch(layout, patchBetween(layout, after))).toEqual(after);
  expect(patchBetween(layout, layout)).toEqual([]);
});
