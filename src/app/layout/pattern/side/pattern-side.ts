import { Component, computed, effect, inject, input, output, signal } from '@angular/core';
import { cellAt } from '@shared/layout/cells';
import { FigureText } from '../../../drawing/figure-text';
import { LayoutStore } from '../../layout-store';
import type { ViewSpan } from '../canvas/view-span';
import { CheckList } from './check-list';
import { RingView } from './ring-view';
import { toCutSentence } from './to-cut';

/** How long the hand must rest before pieces are counted anew. */
const COUNT_REST_MS = 300;

/** Beside the canvas: where one is on the shell, what stands in the way of cutting, and how much there is to cut. */
@Component({
  selector: 'sl-pattern-side',
  imports: [CheckList, FigureText, RingView],
  template: `
    <section>
      <h2>Where you are on the shell</h2>
      @if (span(); as span) {
        <sl-ring-view
          [staves]="store.grid().staves"
          [colours]="topCourse()"
          [span]="span"
          (turned)="turned.emit($event)"
        />
      }
    </section>
    <ng-content />
    <section>
      <h2>To cut</h2>
      <p><sl-figure-text [text]="toCut()" /></p>
    </section>
    <section>
      <h2>Before it can be cut</h2>
      <sl-check-list [checks]="checks()" />
    </section>
  `,
  styleUrl: './pattern-side.scss',
})
export class PatternSide {
  protected readonly store = inject(LayoutStore);
  readonly span = input.required<ViewSpan | null>();
  readonly turned = output<number>();

  protected readonly topCourse = computed(() => {
    const grid = this.store.grid();
    const cells = this.store.cells();
    const woods = this.store.woods();
    return Array.from({ length: grid.staves }, (_, stave) => {
      const wood = cells[cellAt(grid, stave, grid.courses - 1)] ?? 0;
      return woods[wood]?.colour ?? '#000000';
    });
  });

  protected readonly checks = this.store.checks;

  private readonly counted = signal(this.store.layout());
  protected readonly toCut = computed(() => toCutSentence(this.counted()));

  constructor() {
    effect((onCleanup) => {
      const layout = this.store.layout();
      const rest = setTimeout(() => this.counted.set(layout), COUNT_REST_MS);
      onCleanup(() => clearTimeout(rest));
    });
  }
}
