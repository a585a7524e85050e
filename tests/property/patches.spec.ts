/** The laws of patches, on random sequences of edits as the stations make them. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  applyPatch,
  fieldChange,
  invertPatch,
  layChange,
  overlapOf,
  patchBetween,
  squashPatches,
  type Change,
  type Patch,
} from '@shared/layout/patch';
import { resizeChange } from '@shared/layout/carry';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { FIXED_SEED } from './fixed-seed';

type Edit = (layout: Layout) => Change | null;

const laying: fc.Arbitrary<Edit> = fc
  .tuple(fc.array(fc.nat(60), { minLength: 1, maxLength: 12 }), fc.nat(3))
  .map(([tiles, wood]) => (layout) => {
    const positions = tiles.map((tile) => tile % layout.cells.length);
    return layChange(layout.cells, positions, wood);
  });

const setting: fc.Arbitrary<Edit> = fc.oneof(
  fc.constantFrom(24, 28, 30).map(
    (w): Edit =>
      (at) =>
        fieldChange(at, 'shell.tileWidth', w),
  ),
  fc.constantFrom('A', 'B').map(
    (name): Edit =>
      (at) =>
        fieldChange(at, 'name', name),
  ),
  fc.boolean().map(
    (turn): Edit =>
      (at) =>
        fieldChange(at, 'build.turnOver', turn),
  ),
  fc.constantFrom(6.4, 7, 7.6).map(
    (reach): Edit =>
      (at) =>
        fieldChange(at, 'joint.staveJoint', {
          profile: 'round',
          headRadius: 3.6,
          filletRadius: 1.8,
          reach,
        }),
  ),
);

const resizing: fc.Arbitrary<Edit> = fc
  .record({ staves: fc.integer({ min: 6, max: 10 }), courses: fc.integer({ min: 1, max: 5 }) })
  .map((grid) => (layout) => resizeChange(layout, grid));

const edit = fc.oneof(
  { weight: 5, arbitrary: laying },
  { weight: 3, arbitrary: setting },
  { weight: 1, arbitrary: resizing },
);
const edits = fc.array(edit, { maxLength: 12 });

/** The edits as one patch on a layout, each stated on what the ones before left. */
function patchOf(start: Layout, sequence: readonly Edit[]): Patch {
  let layout = start;
  return sequence.flatMap((make) => {
    const change = make(layout);
    if (!change) return [];
    layout = applyPatch(layout, [change]);
    return [change];
  });
}

const options = { ...FIXED_SEED, numRuns: 500 };

test('applying a patch and its inverse is the identity: undo all is the start', () => {
  fc.assert(
    fc.property(edits, (sequence) => {
      const start = smallLayout();
      const patch = patchOf(start, sequence);
      const after = applyPatch(start, patch);
      expect(applyPatch(after, invertPatch(patch))).toEqual(start);
      const undone = [...patch]
        .reverse()
        .reduce((layout, change) => applyPatch(layout, invertPatch([change])), after);
      expect(undone).toEqual(start);
      expect(applyPatch(start, invertPatch(invertPatch(patch)))).toEqual(after);
    }),
    options,
  );
});

test('a squashed patch does what the sequence does, and takes it all back', () => {
  fc.assert(
    fc.property(edits, edits, (first, second) => {
      const start = smallLayout();
      const one = patchOf(start, first);
      const middle = applyPatch(start, one);
      const two = patchOf(middle, second);
      const after = applyPatch(middle, two);
      const squashed = squashPatches(one, two);
      expect(applyPatch(start, squashed)).toEqual(after);
      expect(applyPatch(after, invertPatch(squashed))).toEqual(start);
      expect(squashed.length).toBeLessThanOrEqual(one.length + two.length);
    }),
    options,
  );
});

test('patches that do not overlap can be applied in either order', () => {
  let apart = 0;
  fc.assert(
    fc.property(edits, edits, (first, second) => {
      const start = smallLayout();
      const [mine, theirs] = [patchOf(start, first), patchOf(start, second)];
      if (overlapOf(mine, theirs)) return;
      apart += 1;
      expect(overlapOf(theirs, mine)).toBeNull();
      const mineFirst = applyPatch(applyPatch(start, mine), theirs);
      expect(mineFirst).toEqual(applyPatch(applyPatch(start, theirs), mine));
    }),
    { ...options, numRuns: 1500 },
  );
  expect(apart).toBeGreaterThan(100);
});

test('the patch between any two layouts turns one into the other', () => {
  fc.assert(
    fc.property(edits, edits, (first, second) => {
      const start = smallLayout();
      const [from, to] = [first, second].map((sequence) =>
        applyPatch(start, patchOf(start, sequence)),
      );
      expect(applyPatch(from!, patchBetween(from!, to!))).toEqual(to);
      expect(applyPatch(to!, invertPatch(patchBetween(from!, to!)))).toEqual(from);
    }),
    options,
  );
});
