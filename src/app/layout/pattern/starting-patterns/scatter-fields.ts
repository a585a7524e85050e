import { Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Scatter } from '@shared/layout/starting-patterns/starting-pattern';
import { CountField } from '../../../drawing/count-field';
import type { WordOption } from '../sentence-bar/word-choice';
import { WoodStrip } from '../wood-tray/wood-strip';

/** A share for each wood, and the seed: another number, another scatter. */
@Component({
  selector: 'sl-scatter-fields',
  imports: [CountField, MatButton, WoodStrip],
  template: `
    <p class="hint">Share of each wood, taken of their sum ({{ sum() }}):</p>
    @for (wood of woods(); track wood.value) {
      <div class="share">
        @if (wood.wood; as strip) {
          <sl-wood-strip class="chip" [colour]="strip.colour" [figure]="strip.figure" />
        }
        <sl-count-field
          [label]="'Share of ' + wood.words"
          [value]="shareOf(wood.value)"
          [least]="bounds.share.least"
          [most]="bounds.share.most"
          (typing)="share(wood.value, $event)"
        />
      </div>
    }
    <div class="seed">
      <sl-count-field
        label="Seed"
        [value]="pattern().seed"
        [least]="bounds.seed.least"
        [most]="bounds.seed.most"
        (typing)="seed($event)"
      />
      <button matButton="outlined" type="button" (click)="seed(next())">Another scatter</button>
    </div>
  `,
  styleUrl: './fields.scss',
  styles: `
    .share {
      display: grid;
      grid-template-columns: 44px 1fr;
      gap: 10px;
    }
    .chip {
      height: 44px;
      margin-top: 6px;
      border-radius: 8px;
    }
    .seed {
      display: grid;
      grid-template-columns: 1fr auto;
      gap: 12px;
      align-items: start;
    }
    .seed button {
      margin-top: 8px;
      padding: 0 16px;
      white-space: nowrap;
    }
  `,
})
export class ScatterFields {
  readonly pattern = input.required<Scatter>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<Scatter>();
  protected readonly bounds = PATTERN_BOUNDS;
  protected readonly sum = computed(() =>
    this.pattern().shares.reduce((sum, { share }) => sum + share, 0),
  );
  protected readonly next = computed(
    () => (this.pattern().seed + 1) % (PATTERN_BOUNDS.seed.most + 1),
  );

  protected shareOf(wood: number): number {
    return this.pattern().shares.find((entry) => entry.wood === wood)?.share ?? 0;
  }

  protected share(wood: number, share: number): void {
    const others = this.pattern().shares.filter((entry) => entry.wood !== wood);
    const shares = [...others, { wood, share }].sort((a, b) => a.wood - b.wood);
    this.changed.emit({ ...this.pattern(), shares });
  }

  protected seed(seed: number): void {
    this.changed.emit({ ...this.pattern(), seed });
  }
}
