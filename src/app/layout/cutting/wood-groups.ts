import type { CutList, CutListRow } from '@shared/pieces/cut-list';
import type { Wood } from '@shared/layout/schema';
import type { Millimetres } from '@shared/units/length';

/** The lines of the cut list that are cut from one wood. */
export interface WoodGroup {
  readonly wood: Wood;
  readonly rows: readonly CutListRow[];
  readonly toCut: number;
  /** Board in one row, grain along it. */
  readonly boardLength: Millimetres;
  /** The widest of its pieces: the board is at least a cutter's width wider. */
  readonly widest: Millimetres;
}

/** The cut list gathered by wood, in the order of the layout's woods; woods without tiles are left out. */
export function woodGroups(list: CutList, woods: readonly Wood[]): WoodGroup[] {
  return woods.flatMap((wood, index) => {
    const rows = list.rows.filter((row) => row.kind.wood === index);
    if (rows.length === 0) return [];
    return [
      {
        wood,
        rows,
        toCut: rows.reduce((sum, row) => sum + row.toCut, 0),
        boardLength: rows.reduce((sum, row) => sum + row.boardLength, 0),
        widest: Math.max(...rows.map((row) => row.pieceWidth)),
      },
    ];
  });
}
