import { relayChange, type CellsChange } from '@shared/layout/patch';

/** Tiles laid in one place and, while the hand is still down, in another instead: where it was comes back. */
export class MovedLay {
  /** Woods of the tiles this lay has covered so far, as they were before it. */
  private readonly before = new Map<number, number>();

  /** The change that lays these woods and takes back what was laid last, or null when nothing differs. */
  instead(cells: Uint8Array, wished: ReadonlyMap<number, number>): CellsChange | null {
    const next = cells.slice();
    for (const [position, wood] of this.before) next[position] = wood;
    for (const position of [...this.before.keys()]) {
      if (!wished.has(position)) this.before.delete(position);
    }
    for (const [position, wood] of wished) {
      if (!this.before.has(position)) this.before.set(position, cells[position] ?? 0);
      next[position] = wood;
    }
    return relayChange(cells, next);
  }
}
