import type { Layout } from '@shared/layout/schema';
import type { CutList, CutListRow } from '@shared/pieces/cut-list';
import type { TileEdges } from '@shared/pieces/tile-edges';
import { lengthDecimals } from '@shared/units/format';
import { fromMillimetres, type LengthUnit, type Millimetres } from '@shared/units/length';
import { printCsv, type Cell } from './csv';

/** The longest text a spreadsheet's cell holds. */
const CELL_MOST = 32_767;

/** The cut list as CSV, one row a piece kind, lengths in the given unit. */
export function cutListCsv(layout: Pick<Layout, 'woods'>, list: CutList, unit: LengthUnit): string {
  return printCsv([headings(unit), ...list.rows.map((row) => cellsOf(layout, row, unit))]);
}

function headings(unit: LengthUnit): Cell[] {
  return [
    ...['kind', 'wood', 'edges', 'drawn as seen', 'count', 'spares', 'to cut'],
    ...[`length along grain (${unit})`, `width (${unit})`, `board length (${unit})`, 'tiles'],
  ];
}

function cellsOf({ woods }: Pick<Layout, 'woods'>, row: CutListRow, unit: LengthUnit): Cell[] {
  const { kind } = row;
  return [
    kind.number,
    woods[kind.wood]?.name ?? '',
    edgesText(kind.edges),
    kind.mirrored ? 'from inside (mirrored)' : 'from outside',
    kind.count,
    kind.spares,
    row.toCut,
    figure(row.pieceLength, unit),
    figure(row.pieceWidth, unit),
    figure(row.boardLength, unit),
    tilesText(row.tiles),
  ];
}

function edgesText({ left, right, bottom, top }: TileEdges): string {
  return `left ${left}, right ${right}, bottom ${bottom}, top ${top}`;
}

function figure(length: Millimetres, unit: LengthUnit): number {
  return Number(fromMillimetres(length, unit).toFixed(lengthDecimals(unit)));
}

function tilesText(tiles: readonly string[]): string {
  const text = tiles.join(', ');
  return text.length <= CELL_MOST ? text : `${tiles.length} tiles, listed in manifest.json`;
}
