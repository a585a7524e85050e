import { expect, it } from 'vitest';
import { smallLayout } from '../layout/small-layout.fixture';
import { cutList } from './cut-list';

const layout = { ...smallLayout(), cells: new Uint8Array(24).map((_, i) => (i < 8 ? 1 : 0)) };

it('lists each kind with its tiles by name', () => {
  const { rows } = cutList(layout);
  expect(rows.map(({ kind, tiles }) => [kind.wood, tiles])).toEqual([
    [0, ['B 1', 'B 3', 'B 5', 'B 7']],
    [0, ['B 2', 'B 4', 'B 6', 'B 8']],
    [0, ['C 1', 'C 3', 'C 5', 'C 7']],
    [0, ['C 2', 'C 4', 'C 6', 'C 8']],
    [1, ['A 1', 'A 3', 'A 5', 'A 7']],
    [1, ['A 2', 'A 4', 'A 6', 'A 8']],
  ]);
});

it('adds spares to every kind and sums up', () => {
  const list = cutList(layout);
  expect(list).toMatchObject({ tiles: 24, spares: 6, toCut: 30 });
  expect(list.rows.map(({ toCut }) => toCut)).toEqual([5, 5, 5, 5, 5, 5]);
});

it('measures a piece along the grain with its tabs, and a board with a cutter between pieces', () => {
  const upright = cutList(layout).rows.find(({ kind }) => kind.edges.top === 'tab');
  // tabs at top and bottom stand out 7.6 mm each less half the clearance
  const [length] = [28 + 2 * 7.6 - 0.12];
  const middle = cutList(layout).rows[0];
  expect(upright).toBeDefined();
  expect(middle?.kind.edges.top).toBe('tab');
  expect(middle?.pieceLength).toBeCloseTo(length, 9);
  expect(middle?.pieceWidth).toBeCloseTo(28 - 0.12, 9);
  expect(middle?.boardLength).toBeCloseTo(5 * (length + 3.175), 9);
});
