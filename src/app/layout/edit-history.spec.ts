import type { Patch } from '@shared/layout/patch';
import { expect, test } from 'vitest';
import { EditHistory } from './edit-history';

const patch: Patch = [{ kind: 'cells', positions: [1], before: [0], after: [1] }];

test('the last thing done is the first to be undone, by name', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch });
  history.note({ label: 'Set the tile width', patch });
  expect(history.undoLabel()).toBe('Set the tile width');
  expect(history.takeUndo()?.label).toBe('Set the tile width');
  expect(history.undoLabel()).toBe('Lay walnut');
  expect(history.redoLabel()).toBe('Set the tile width');
});

test('what was undone can be done again until something new is done', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch });
  history.takeUndo();
  expect(history.takeRedo()?.label).toBe('Lay walnut');
  history.takeUndo();
  history.note({ label: 'Lay ash', patch });
  expect(history.redoLabel()).toBeNull();
  expect(history.takeRedo()).toBeNull();
});

test('a forgotten history offers nothing', () => {
  const history = new EditHistory();
  history.note({ label: 'Lay walnut', patch });
  history.forget();
  expect(history.undoLabel()).toBeNull();
  expect(history.takeUndo()).toBeNull();
});
