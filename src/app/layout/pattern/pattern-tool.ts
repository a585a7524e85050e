/** What the next touch lays and where: the words of the sentence bar as signals, and what follows from them. */
import { computed, inject, Injectable, linkedSignal, signal } from '@angular/core';
import type { Extent, Tile } from '@shared/layout/extent';
import { positionsTouched, timesRound, type Mirror, type Repeats } from '@shared/layout/repeats';
import { LayoutStore } from '../layout-store';
import { inSentence } from './sentence-words';

@Injectable()
export class PatternTool {
  private readonly store = inject(LayoutStore);

  /** Index of the wood in the hand; the last one when woods were removed under it. */
  readonly wood = linkedSignal<number, number>({
    source: () => this.store.woods().length,
    computation: (count, before) => Math.min(before?.value ?? 1, count - 1),
  });
  readonly extent = signal<Extent>('tile');
  private readonly wishedTimes = signal(1);
  readonly step = signal(0);
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
    mirror: this.mirror(),
  }));
  readonly woodName = computed(() => inSentence(this.store.woods()[this.wood()]?.name ?? ''));

  repeat(times: number): void {
    this.wishedTimes.set(times);
  }

  /** Positions a touch of these tiles lays, with all repeats. */
  positionsFor(tiles: readonly Tile[]): Set<number> {
    const grid = this.store.grid();
    const positions = new Set<number>();
    for (const tile of tiles) {
      for (const position of positionsTouched(grid, this.extent(), tile, this.repeats())) {
        positions.add(position);
      }
    }
    return positions;
  }
}
