import { expect, it } from 'vitest';
import { compareLayouts } from './comparison';
import { smallLayout } from './small-layout.fixture';

it('a layout is the same as its copy', () => {
  expect(compareLayouts(smallLayout(), smallLayout())).toEqual({
    fields: [],
    resize: null,
    tiles: [],
  });
});

it('fields, tiles and woods that changed are named', () => {
  const before = smallLayout();
  const after = {
    ...before,
    name: 'Other ring',
    joint: { ...before.joint, clearance: 0.2 },
    cells: before.cells.map((_, i) => (i === 3 || i === 20 ? 1 : 0)),
  };
  const { fields, tiles } = compareLayouts(before, after);
  expect(fields.map(({ path }) => path)).toEqual(['name', 'joint.clearance']);
  expect(tiles).toEqual([3, 20]);
});

it('woods in another order leave tiles that show the same wood unchanged', () => {
  const before = smallLayout();
  const [first, second, ...others] = before.woods;
  const woods = [second!, first!, ...others];
  const after = { ...before, woods, cells: before.cells.map(() => 1) };
  expect(compareLayouts(before, after).tiles).toEqual([]);
});

it('another grid is one change, not thousands of tiles', () => {
  const before = smallLayout();
  const shell = { ...before.shell, staves: 10 };
  const after = { ...before, shell, cells: new Uint8Array(30) };
  const { resize, tiles } = compareLayouts(before, after);
  expect(resize).toMatchObject({ before: { staves: 8 }, after: { staves: 10 } });
  expect(tiles).toEqual([]);
});
