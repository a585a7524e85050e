import { smallLayout } from '@shared/layout/small-layout.fixture';
import { cutList } from '@shared/pieces/cut-list';
import { describe, expect, it } from 'vitest';
import { woodGroups } from './wood-groups';

describe('the cut list by wood', () => {
  const layout = smallLayout();
  layout.cells.set([2, 2, 2, 2], 8);
  const list = cutList(layout);
  const groups = woodGroups(list, layout.woods);

  it('leaves out woods that have no tile', () => {
    expect(groups.map((group) => group.wood.key)).toEqual(['ash', 'sapele']);
  });

  it('loses no piece and no board', () => {
    const rows = groups.flatMap((group) => group.rows);
    expect(rows).toHaveLength(list.rows.length);
    expect(groups.reduce((sum, group) => sum + group.toCut, 0)).toBe(list.toCut);
    const board = list.rows.reduce((sum, row) => sum + row.boardLength, 0);
    expect(groups.reduce((sum, group) => sum + group.boardLength, 0)).toBeCloseTo(board, 9);
  });

  it('takes the board as wide as the widest piece, tabs included', () => {
    expect(groups[0]?.widest).toBeGreaterThan(layout.shell.tileWidth);
  });
});
