/** What the next touch does and where: the words of the sentence bar as signals, and what follows from them. */
import { computed, inject, Injectable, linkedSignal, signal } from '@angular/core';
import { copiedTiles } from '@shared/layout/copied-patch';
import type { Extent, LaidGrid, Tile } from '@shared/layout/extent';
import {
  positionsTouched,
  timesRound,
  type AtTheEnd,
  type Mirror,
  type Repeats,
} from '@shared/layout/repeats';
import { stockWoods } from '@shared/wood/woods-alike';
import { LayoutStore } from '../layout-store';
import { CopiedPatches } from './copied-patches';
import { inSentence, type CopyExtent, type Verb } from './sentence-words';

@Injectable()
export class PatternTool {
  private readonly store = inject(LayoutStore);
  private readonly copies = inject(CopiedPatches);
  private readonly wishedVerb = signal<Verb>('lay');

  readonly copied = this.copies.patch;
  readonly verb = computed<Verb>(() => {
    const wished = this.wishedVerb();
    return wished === 'lay-copy' && !this.copied() ? 'lay' : wished;
  });
  /** Index of the wood in the hand; the last one when woods were removed under it. */
  readonly wood = linkedSignal<number, number>({
    source: () => this.store.woods().length,
    computation: (count, before) => Math.min(before?.value ?? 1, count - 1),
  });
  readonly extent = signal<Extent>('tile');
  readonly copyExtent = signal<CopyExtent>('patch');
  private readonly wishedTimes = signal(1);
  readonly step = signal(0);
  readonly atTheEnd = signal<AtTheEnd>('stop');
  readonly mirror = signal<Mirror>('none');

  /** Counts that divide the staves: the only ones that close round the shell. */
  readonly timesOffered = computed(() => timesRound(this.store.grid().staves));
  readonly times = computed(() => {
    const wished = this.wishedTimes();
    return this.timesOffered().includes(wished) ? wished : 1;
  });
  readonly repeats = computed<Repeats>(() => ({
    times: this.times(),
    step: this.step(),
    atTheEnd: this.atTheEnd(),
    mirror: this.mirror(),
  }));
  readonly woodName = computed(() => inSentence(this.store.woods()[this.wood()]?.name ?? ''));
  /** The layout's woods for those of the copied patch, and what must be added before it can be laid. */
  readonly stocked = computed(() => stockWoods(this.store.woods(), this.copied()?.woods ?? []));

  repeat(times: number): void {
    this.wishedTimes.set(times);
  }

  take(verb: Verb): void {
    this.wishedVerb.set(verb);
  }

  /** Positions a touch of these tiles lays, with all repeats; a patch reaches from its corner. */
  positionsFor(tiles: readonly Tile[], corner?: Tile): Set<number> {
    const grid = this.laid();
    const extent = this.extent();
    const positions = new Set<number>();
    for (const tile of tiles) {
      const touch = { extent, tile, ...(corner && { corner }) };
      for (const position of positionsTouched(grid, touch, this.repeats())) {
        positions.add(position);
      }
    }
    return positions;
  }

  /** The woods a touch of one tile lays, by position. */
  woodsFor(tile: Tile, corner?: Tile): Map<number, number> {
    const copied = this.copied();
    if (this.verb() === 'lay-copy' && copied) {
      const { indices: woods } = this.stocked();
      return copiedTiles(this.laid(), copied, { at: tile, woods, repeats: this.repeats() });
    }
    const wood = this.wood();
    return new Map([...this.positionsFor([tile], corner)].map((position) => [position, wood]));
  }

  private laid(): LaidGrid {
    return { ...this.store.grid(), cells: this.store.cells() };
  }
}
