/**
 * The hand over the pattern: where it points or stands, the stroke under it, and what a touch there changes.
 * Woods are laid as the hand goes; a patch and a copy move along with it and stay where it lets go.
 */
import { computed, inject, Injectable, signal, type OnDestroy } from '@angular/core';
import { roundStave } from '@shared/layout/cells';
import { copyPatch, type CopiedPatch } from '@shared/layout/copied-patch';
import { boxBetween, positionsInBox, type Tile, type TileBox } from '@shared/layout/extent';
import { fieldChange, layChange, relayChange } from '@shared/layout/patch';
import { Announcer } from '../../platform/announcer';
import { LayoutStore, type Gesture } from '../layout-store';
import { CopiedPatches } from './copied-patches';
import { MovedLay } from './moved-lay';
import { PatternTool } from './pattern-tool';
import { sizeWords } from './sentence-words';
import { copiedWords, laidWords, touchWords } from './spoken';

/** A press on the canvas until its release. */
interface Stroke {
  /** Null while copying: nothing is changed. */
  readonly gesture: Gesture | null;
  readonly lay: MovedLay;
  /** The first tile met. */
  from: Tile | null;
  to: Tile | null;
}

@Injectable()
export class PatternHand implements OnDestroy {
  private readonly store = inject(LayoutStore);
  private readonly tool = inject(PatternTool);
  private readonly copies = inject(CopiedPatches);
  private readonly announcer = inject(Announcer);
  private stroke: Stroke | null = null;

  private readonly pointedAt = signal<Tile | null>(null);
  /** Counted on past the seam while a patch is drawn out. */
  private readonly standsOn = signal<Tile | null>(null);
  private readonly firstCorner = signal<Tile | null>(null);

  /** The tile the next touch lands on. */
  readonly at = computed(() => this.standsOn() ?? this.pointedAt());
  private readonly corner = computed(() => this.firstCorner() ?? undefined);
  private readonly box = computed(() => {
    const at = this.at();
    return at && this.boxAt(at, this.corner() ?? at);
  });
  private readonly wished = computed<ReadonlyMap<number, number>>(() => {
    const at = this.at();
    if (!at || this.tool.verb() === 'copy') return new Map<number, number>();
    return this.tool.woodsFor(at, this.corner());
  });
  /** Positions the next touch lays or copies. */
  readonly reached = computed<readonly number[]>(() => {
    const box = this.box();
    if (this.tool.verb() !== 'copy') return [...this.wished().keys()];
    return box ? positionsInBox(this.store.grid(), box) : [];
  });
  /** What the next touch comes to, or null while the hand is nowhere: "8 tiles will change." */
  readonly words = computed(() => {
    const box = this.box();
    if (!box) return null;
    if (this.tool.verb() === 'copy') return `${sizeWords(box)} will be copied.`;
    return touchWords(this.reached().length, this.changed(), this.tool.stocked().added);
  });
  private readonly changed = computed(() => {
    const cells = this.store.cells();
    return [...this.wished()].filter(([position, wood]) => cells[position] !== wood).length;
  });

  /** Whoever leaves in the middle of a stroke keeps what it has laid. */
  ngOnDestroy(): void {
    this.stroke?.gesture?.finish();
  }

  point(tile: Tile | null): void {
    this.pointedAt.set(tile);
  }

  /** The keyboard stands on a tile now, or has left. */
  walk(tile: Tile | null): void {
    const before = this.standsOn();
    if (!tile) this.firstCorner.set(null);
    this.standsOn.set(tile && before && this.firstCorner() ? this.unrolled(before, tile) : tile);
  }

  /** Marks the corner a patch is drawn out from with the arrow keys. */
  mark(tile: Tile): void {
    this.standsOn.set(tile);
    this.firstCorner.set(tile);
    if (this.tool.verb() === 'lay') this.tool.extent.set('patch');
    if (this.tool.verb() === 'copy') this.tool.copyExtent.set('patch');
  }

  begin(): void {
    const gesture = this.tool.verb() === 'copy' ? null : this.store.begin(this.label());
    this.stroke = { gesture, lay: new MovedLay(), from: null, to: null };
  }

  meet(tiles: readonly Tile[]): void {
    const { stroke } = this;
    const last = tiles.at(-1);
    if (!stroke || !last) return;
    const first = stroke.from ?? tiles[0] ?? last;
    const isFirst = stroke.from === null;
    stroke.from = first;
    stroke.to = last;
    const moves = this.tool.verb() !== 'lay' || this.tool.extent() === 'patch';
    if (moves) this.pointedAt.set(last);
    if (moves && this.tool.verb() !== 'lay-copy') this.firstCorner.set(first);
    if (this.tool.verb() === 'copy') return;
    if (moves) this.move(stroke, last);
    else if (!this.touchesOnce() || isFirst) this.lay(stroke, tiles);
  }

  end(): void {
    const { stroke } = this;
    if (!stroke) return;
    this.drop();
    if (stroke.gesture) stroke.gesture.finish();
    else if (stroke.from && stroke.to) this.copy(stroke.from, stroke.to);
  }

  cancel(): void {
    this.stroke?.gesture?.cancel();
    this.drop();
  }

  /** What the keyboard's touch does; says what came of it. */
  touch(tile: Tile): void {
    const at = this.standsOn() ?? tile;
    if (this.tool.verb() === 'copy') {
      this.copy(this.corner() ?? at, at);
      return;
    }
    const count = this.changed();
    const name = this.tool.verb() === 'lay' ? this.tool.woodName() : 'the copy';
    const gesture = this.store.begin(this.label());
    const wished = this.tool.woodsFor(at, this.corner());
    this.stock(gesture);
    gesture.apply(relayChange(this.store.cells(), this.withLaid(wished)));
    gesture.finish();
    this.firstCorner.set(null);
    this.announcer.speak(laidWords({ ...at, stave: this.rounded(at) }, count, name));
  }

  /** Copies the patch the keyboard has drawn out, or the tile it stands on; false when it stands nowhere. */
  copyStanding(): boolean {
    const at = this.standsOn();
    if (at) this.copyBox(this.boxBetween(at, this.corner() ?? at));
    return at !== null;
  }

  /** Takes a copy into the hand and lays it where the keyboard stands. */
  paste(patch: CopiedPatch): void {
    this.copies.keep(patch);
    this.tool.take('lay-copy');
    const at = this.standsOn();
    this.firstCorner.set(null);
    if (at) this.touch(at);
    else
      this.announcer.tell(`A copy of ${sizeWords(patch)} is in the hand. Lay it where you like.`);
  }

  private copy(from: Tile, to: Tile): void {
    const box = this.boxAt(to, from);
    this.copyBox(box);
    if (box) this.tool.take('lay-copy');
  }

  private copyBox(box: TileBox | null): void {
    if (!box) return;
    const laid = { ...this.store.grid(), cells: this.store.cells() };
    this.copies.keep(copyPatch(laid, this.store.woods(), box));
    this.firstCorner.set(null);
    this.announcer.tell(copiedWords(box));
  }

  private label(): string {
    return this.tool.verb() === 'lay' ? `Lay ${this.tool.woodName()}` : 'Lay the copy';
  }

  /** Every tile of a wood and connected tiles are meant by the first tile of a stroke alone. */
  private touchesOnce(): boolean {
    return this.tool.extent() === 'wood' || this.tool.extent() === 'connected';
  }

  private lay({ gesture }: Stroke, tiles: readonly Tile[]): void {
    const met = this.touchesOnce() ? tiles.slice(0, 1) : tiles;
    gesture?.apply(layChange(this.store.cells(), this.tool.positionsFor(met), this.tool.wood()));
  }

  private move({ gesture, lay }: Stroke, to: Tile): void {
    const wished = this.tool.woodsFor(to, this.corner());
    if (gesture) this.stock(gesture);
    gesture?.apply(lay.instead(this.store.cells(), wished));
  }

  /** Adds the woods a copy needs and the layout does not have. */
  private stock(gesture: Gesture): void {
    const { woods, added } = this.tool.stocked();
    if (this.tool.verb() !== 'lay-copy' || added.length === 0) return;
    gesture.apply(fieldChange(this.store.layout(), 'woods', woods));
    this.announcer.tell(`Added for the copy: ${added.map(({ name }) => name).join(', ')}.`);
  }

  private withLaid(wished: ReadonlyMap<number, number>): Uint8Array {
    const cells = this.store.cells().slice();
    for (const [position, wood] of wished) cells[position] = wood;
    return cells;
  }

  private drop(): void {
    this.stroke = null;
    this.firstCorner.set(null);
  }

  private boxAt(at: Tile, corner: Tile): TileBox | null {
    const { staves, courses } = this.store.grid();
    if (this.tool.verb() !== 'copy') return this.boxBetween(corner, at);
    switch (this.tool.copyExtent()) {
      case 'patch':
        return this.boxBetween(corner, at);
      case 'course':
        return this.boxBetween(
          { stave: 0, course: at.course },
          { stave: staves - 1, course: at.course },
        );
      case 'stave':
        return this.boxBetween({ ...at, course: 0 }, { ...at, course: courses - 1 });
      case 'whole':
        return { stave: 0, course: 0, staves, courses };
    }
  }

  private boxBetween(a: Tile, b: Tile): TileBox | null {
    return boxBetween(this.store.grid(), a, b);
  }

  private rounded(tile: Tile): number {
    return roundStave(this.store.grid(), tile.stave);
  }

  /** The tile counted on from the one before, past the seam when that is the shorter way. */
  private unrolled(before: Tile, tile: Tile): Tile {
    const { staves } = this.store.grid();
    const half = Math.floor(staves / 2);
    const way = roundStave(this.store.grid(), tile.stave - before.stave + half) - half;
    return { stave: before.stave + way, course: tile.course };
  }
}
