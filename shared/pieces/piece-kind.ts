/**
 * A piece kind is what one drawing and one board serve: outline × wood × way up. Two tiles are the same
 * outline when one is the other after half a turn (a quarter turn never: grain runs along the stave). A
 * tile that lies face down is cut as its mirror image; where that mirror image is an outline that is cut
 * face up anyway (every alternating tile is its own mirror image), the pieces are interchangeable and
 * count as one kind, and the tiles that lie face down are listed with it.
 */
import type { TileEdges } from './tile-edges';

export interface PieceKind {
  /** From 1, in the order of the cut list. */
  readonly number: number;
  /** Index into the layout's woods. */
  readonly wood: number;
  /** The edges of the piece as it is drawn, i.e. as it lies on the machine. */
  readonly edges: TileEdges;
  /** True when the drawing is the mirror image of the piece as seen from outside the shell. */
  readonly mirrored: boolean;
  readonly count: number;
  readonly spares: number;
  /** Positions in the cells of the tiles it fills, ascending. */
  readonly positions: readonly number[];
  /** Those of the positions whose tile lies face down. */
  readonly faceDown: readonly number[];
  /** Those of the positions whose tile is the drawing after half a turn. */
  readonly halfTurned: readonly number[];
}
