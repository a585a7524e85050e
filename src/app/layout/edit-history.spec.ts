import type { Patch } from '@shared/layout/patch';
import { expect, test } from 'vitest';
import { EditHistory } from './edit-history';

const patch: Patch = [{ kind: 'cells', positions: [1], before: [0], after: [1] }];

test('the last thing done is the first to be undone, by name', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch }, 0);
  history.note({ label: 'Set the tile width', patch }, 0);
  expect(history.undoLabel()).toBe('Set the tile width');
  expect(history.takeUndo()?.label).toBe('Set the tile width');
  expect(history.undoLabel()).toBe('Lay walnut');
  expect(history.redoLabel()).toBe('Set the tile width');
});

test('what was undone can be done again until something new is done', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch }, 0);
  history.takeUndo();
  expect(history.takeRedo()?.label).toBe('Lay walnut');
  history.takeUndo();
  history.note({ label: 'Lay ash', patch }, 0);
  expect(history.redoLabel()).toBeNull();
  expect(history.takeRedo()).toBeNull();
});

test('a forgotten history offers nothing', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch }, 0);
  history.forget();
  expect(history.undoLabel()).toBeNull();
  expect(history.takeUndo()).toBeNull();
});

test('typing a figure is one step, however many keys it took', () => {
  const history = new EditHistory();
  const width = (before: number, after: number): Patch => [
    { kind: 'field', path: 'shell.tileWidth', before, after },
  ];
  history.note({ label: 'Set the tile width', patch: width(28, 3) }, 0);
  history.note({ label: 'Set the tile width', patch: width(3, 32) }, 400);
  history.note({ label: 'Set the tile width', patch: width(32, 30) }, 9_000);
  expect(history.takeUndo()?.patch).toEqual(width(32, 30));
  expect(history.takeUndo()?.patch).toEqual(width(28, 32));
  expect(history.undoLabel()).toBeNull();
});
