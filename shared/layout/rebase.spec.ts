import { expect, test } from 'vitest';
import { cellAt } from './cells';
import { applyPatch, fieldChange, invertPatch, layChange, type Change, type Patch } from './patch';
import { rebase, restatePatch, stillMine } from './rebase';
import { resizeChange } from './carry';
import type { Layout } from './schema';
import { smallLayout } from './small-layout.fixture';

const WALNUT = 1;
const SAPELE = 2;
const base = smallLayout();
const grid = { staves: 8, courses: 3 };

function patch(...changes: (Change | null)[]): Patch {
  return changes.filter((change) => change !== null);
}

function after(layout: Layout, theirs: Patch, mine: readonly Patch[]): Layout {
  return mine.reduce(applyPatch, applyPatch(layout, theirs));
}

test('tiles in different places merge without a word', () => {
  const theirs = patch(layChange(base.cells, [3], WALNUT));
  const mine = [patch(layChange(base.cells, [4], SAPELE))];
  const result = rebase(base, theirs, mine);
  expect(result.overlaid).toEqual([]);
  expect(result.contests).toEqual([]);
  expect([...result.layout.cells.slice(3, 5)]).toEqual([WALNUT, SAPELE]);
  expect(after(base, theirs, result.mine)).toEqual(result.layout);
});

test('the same tile keeps mine, remembers theirs as what was before, and is reported', () => {
  const theirs = patch(layChange(base.cells, [3], WALNUT));
  const result = rebase(base, theirs, [patch(layChange(base.cells, [3, 5], SAPELE))]);
  expect(result.overlaid).toEqual([3]);
  expect(result.mine).toEqual([
    [{ kind: 'cells', positions: [3, 5], before: [WALNUT, 0], after: [SAPELE, SAPELE] }],
  ]);
});

test('the same tile in the same wood is nobody’s concern', () => {
  const theirs = patch(layChange(base.cells, [3], WALNUT));
  const result = rebase(base, theirs, [patch(layChange(base.cells, [3], WALNUT))]);
  expect(result).toMatchObject({ overlaid: [], mine: [[]] });
});

test('the same field set differently is left as theirs and asked about', () => {
  const theirs = patch(fieldChange(base, 'shell.tileWidth', 30));
  const result = rebase(base, theirs, [patch(fieldChange(base, 'shell.tileWidth', 32))]);
  expect(result.layout.shell.tileWidth).toBe(30);
  expect(result.contests).toEqual([
    { kind: 'field', mine: { kind: 'field', path: 'shell.tileWidth', before: 30, after: 32 } },
  ]);
});

test('the same field set alike is not asked about', () => {
  const theirs = patch(fieldChange(base, 'shell.tileWidth', 30));
  const result = rebase(base, theirs, [patch(fieldChange(base, 'shell.tileWidth', 30))]);
  expect(result).toMatchObject({ contests: [], mine: [[]] });
});

test('tiles I laid stay on their stave and course when somebody adds staves', () => {
  const theirs = patch(resizeChange(base, { staves: 10, courses: 3 }));
  const result = rebase(base, theirs, [patch(layChange(base.cells, [cellAt(grid, 2, 1)], SAPELE))]);
  expect(result.layout.cells[cellAt({ staves: 10, courses: 3 }, 2, 1)]).toBe(SAPELE);
  expect(result.contests).toEqual([]);
});

test('tiles I laid on a course somebody took away are dropped', () => {
  const theirs = patch(resizeChange(base, { staves: 8, courses: 2 }));
  const result = rebase(base, theirs, [patch(layChange(base.cells, [cellAt(grid, 2, 2)], SAPELE))]);
  expect(result.mine).toEqual([[]]);
});

test('tiles somebody laid come along when I add staves', () => {
  const theirs = patch(layChange(base.cells, [cellAt(grid, 7, 2)], WALNUT));
  const wider = { staves: 10, courses: 3 };
  const result = rebase(base, theirs, [patch(resizeChange(base, wider))]);
  expect(result.layout.cells[cellAt(wider, 7, 2)]).toBe(WALNUT);
  expect(result.overlaid).toEqual([]);
  expect(after(base, theirs, result.mine)).toEqual(result.layout);
});

test('two different sizes of the grid are asked about', () => {
  const theirs = patch(resizeChange(base, { staves: 10, courses: 3 }));
  const result = rebase(base, theirs, [patch(resizeChange(base, { staves: 12, courses: 3 }))]);
  expect(result.contests).toEqual([
    {
      kind: 'grid',
      mine: { staves: 12, courses: 3 },
      theirs: { staves: 10, courses: 3 },
    },
  ]);
  expect(result.layout.shell.staves).toBe(10);
});

test('a tile in a wood somebody took off the list is dropped, so the document stays whole', () => {
  const theirs = patch(fieldChange(base, 'woods', base.woods.slice(0, 2)));
  const result = rebase(base, theirs, [patch(layChange(base.cells, [0], SAPELE))]);
  expect(result.mine).toEqual([[]]);
});

test('a step to undo takes what it finds as its "before" and drops what is so already', () => {
  const now = applyPatch(base, patch(layChange(base.cells, [1], SAPELE)));
  const step: Patch = [
    { kind: 'cells', positions: [0, 1], before: [WALNUT, WALNUT], after: [0, 0] },
  ];
  expect(restatePatch(now, step)).toEqual([
    { kind: 'cells', positions: [1], before: [SAPELE], after: [0] },
  ]);
});

test('undo leaves alone what somebody else has changed since', () => {
  const mine = patch(
    layChange(base.cells, [1, 2], SAPELE),
    fieldChange(base, 'shell.tileWidth', 31),
  );
  const done = applyPatch(base, mine);
  const overtaken = applyPatch(
    done,
    patch(layChange(done.cells, [2], WALNUT), fieldChange(done, 'shell.tileWidth', 33)),
  );
  const undo = invertPatch(mine);
  expect(stillMine(done, undo)).toEqual(undo);
  expect(applyPatch(overtaken, stillMine(overtaken, undo))).toMatchObject({
    shell: { tileWidth: 33 },
    cells: applyPatch(base, patch(layChange(base.cells, [2], WALNUT))).cells,
  });
});
