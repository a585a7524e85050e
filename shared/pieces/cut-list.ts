import { boundsOf } from '../geometry/outline';
import { tileName, tileOf } from '../layout/cells';
import type { Layout } from '../layout/schema';
import type { Millimetres } from '../units/length';
import type { PieceKind } from './piece-kind';
import { pieceKinds } from './piece-kinds';
import { tileOutline } from './tile-outline';

/** One line of the cut list. */
export interface CutListRow {
  readonly kind: PieceKind;
  /** Pieces to cut: the count and its spares. */
  readonly toCut: number;
  /** Size of one piece along the grain (tabs included) and across it. */
  readonly pieceLength: Millimetres;
  readonly pieceWidth: Millimetres;
  /** Board needed in one row, grain along it: pieces end to end with a cutter's width between them. */
  readonly boardLength: Millimetres;
  /** The tiles it fills: "A 1", "A 3"… */
  readonly tiles: readonly string[];
}

export interface CutList {
  readonly rows: readonly CutListRow[];
  /** Tiles of the shell, spares of all kinds, and both together. */
  readonly tiles: number;
  readonly spares: number;
  readonly toCut: number;
}

/** The cut list: for every piece kind how many, of what length of board, and for which tiles. */
export function cutList(layout: Layout): CutList {
  const rows = pieceKinds(layout).map((kind) => rowOf(layout, kind));
  const tiles = rows.reduce((sum, row) => sum + row.kind.count, 0);
  const spares = rows.reduce((sum, row) => sum + row.kind.spares, 0);
  return { rows, tiles, spares, toCut: tiles + spares };
}

function rowOf(layout: Layout, kind: PieceKind): CutListRow {
  const bounds = boundsOf(tileOutline(layout, kind.edges).segments);
  const pieceLength = bounds.maxY - bounds.minY;
  const toCut = kind.count + kind.spares;
  return {
    kind,
    toCut,
    pieceLength,
    pieceWidth: bounds.maxX - bounds.minX,
    boardLength: toCut * (pieceLength + layout.cutter.diameter),
    tiles: kind.positions.map((position) => {
      const { stave, course } = tileOf(layout.shell, position);
      return tileName(stave, course);
    }),
  };
}
