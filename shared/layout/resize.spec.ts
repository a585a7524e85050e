import { expect, test } from 'vitest';
import { resizeChange, resizedCells } from './resize';
import { applyPatch, invertPatch } from './patch';
import { smallLayout } from './small-layout.fixture';

test('a wider ring keeps every tile in its place and lays the first wood on the new staves', () => {
  const cells = Uint8Array.from([1, 2, 3, 4, 5, 6]);
  expect([...resizedCells(cells, { staves: 3, courses: 2 }, { staves: 4, courses: 2 })]).toEqual([
    1, 2, 3, 0, 4, 5, 6, 0,
  ]);
});

test('fewer staves and more courses keep what fits', () => {
  const cells = Uint8Array.from([1, 2, 3, 4, 5, 6]);
  expect([...resizedCells(cells, { staves: 3, courses: 2 }, { staves: 2, courses: 3 })]).toEqual([
    1, 2, 4, 5, 0, 0,
  ]);
});

test('a resize is undone with every tile that was cut off', () => {
  const layout = smallLayout();
  const change = resizeChange(layout, { staves: 6, courses: 1 });
  expect(change).not.toBeNull();
  const patch = change ? [change] : [];
  expect(applyPatch(applyPatch(layout, patch), invertPatch(patch))).toEqual(layout);
});

test('the same size is no change', () => {
  const layout = smallLayout();
  expect(resizeChange(layout, layout.shell)).toBeNull();
});
