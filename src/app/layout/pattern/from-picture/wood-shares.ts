import { Component, computed, input, output } from '@angular/core';
import type { Wood } from '@shared/layout/schema';
import { WoodSwatch } from '../../../drawing/wood-swatch';
import { tilesWords } from '../sentence-words';
import {
  percentWords,
  shareWords,
  STEPS_MOST,
  stepsOf,
  type ShareSteps,
  type WoodWishes,
} from './wood-wishes';

export interface ShareChange {
  readonly key: string;
  readonly steps: ShareSteps;
}

/** The woods of a picture: taking part or not, more or less of each, and what that comes to. */
@Component({
  selector: 'sl-wood-shares',
  imports: [WoodSwatch],
  templateUrl: './wood-shares.html',
  styleUrl: './wood-shares.scss',
})
export class WoodShares {
  readonly woods = input.required<readonly Wood[]>();
  readonly wishes = input.required<WoodWishes>();
  /** Tiles of each wood in the pattern as it would be; null while there is none. */
  readonly counts = input.required<readonly number[] | null>();
  readonly changed = output<ShareChange>();

  protected readonly most = STEPS_MOST;
  protected readonly rows = computed(() => {
    const counts = this.counts();
    const all = counts?.reduce((sum, count) => sum + count, 0) ?? 0;
    return this.woods().map((wood, index) => {
      const steps = stepsOf(this.wishes(), wood.key);
      const count = counts?.[index] ?? 0;
      return {
        wood,
        steps,
        words: steps === null ? 'left out' : shareWords(steps),
        tiles: counts ? tilesWords(count) : '',
        share: counts ? percentWords(count, all) : '',
      };
    });
  });

  protected take(key: string, box: HTMLInputElement): void {
    this.changed.emit({ key, steps: box.checked ? 0 : null });
  }

  protected slide(key: string, slider: HTMLInputElement): void {
    this.changed.emit({ key, steps: slider.valueAsNumber });
  }
}
