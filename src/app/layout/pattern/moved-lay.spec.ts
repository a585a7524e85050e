import { describe, expect, it } from 'vitest';
import { MovedLay } from './moved-lay';

const laidBy = (cells: Uint8Array, change: ReturnType<MovedLay['instead']>): Uint8Array => {
  const next = cells.slice();
  change?.positions.forEach((position, i) => (next[position] = change.after[i] ?? 0));
  return next;
};

describe('tiles laid while the hand is still down', () => {
  it('leave no trace where the hand has gone on', () => {
    const lay = new MovedLay();
    let cells: Uint8Array = Uint8Array.of(0, 1, 2, 3, 0, 0);
    const here = new Map([
      [1, 5],
      [2, 5],
    ]);
    cells = laidBy(cells, lay.instead(cells, here));
    expect([...cells]).toEqual([0, 5, 5, 3, 0, 0]);
    const there = new Map([
      [2, 5],
      [3, 5],
    ]);
    cells = laidBy(cells, lay.instead(cells, there));
    expect([...cells]).toEqual([0, 1, 5, 5, 0, 0]);
    expect(lay.instead(cells, there)).toBeNull();
    cells = laidBy(cells, lay.instead(cells, new Map()));
    expect([...cells]).toEqual([0, 1, 2, 3, 0, 0]);
  });

  it('leave alone what somebody else has laid beside them', () => {
    const lay = new MovedLay();
    let cells: Uint8Array = Uint8Array.of(0, 0, 0);
    cells = laidBy(cells, lay.instead(cells, new Map([[0, 5]])));
    cells[2] = 7;
    cells = laidBy(cells, lay.instead(cells, new Map([[1, 5]])));
    expect([...cells]).toEqual([0, 5, 7]);
  });
});
