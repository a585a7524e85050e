import { Component, computed, inject, input, output, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatProgressBar } from '@angular/material/progress-bar';
import type { Version } from '@shared/api/version';
import { compareLayouts } from '@shared/layout/comparison';
import { readLayout } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { FigureText } from '../../drawing/figure-text';
import { Trouble } from '../../drawing/trouble';
import { UnrolledPicture } from '../../drawing/unrolled-picture';
import { apiFailureOf } from '../../platform/api-problem';
import { comparisonWords } from '../comparison-words';
import { LayoutStore } from '../layout-store';
import { VersionsApi } from '../versions-api';
import { sideName, type Pair, type Side } from './pair';

/** What changed between two versions, or a version and the draft: in words, in figures and as pictures. */
@Component({
  selector: 'sl-comparison-view',
  imports: [FigureText, MatButton, MatProgressBar, Trouble, UnrolledPicture],
  templateUrl: './comparison-view.html',
  styleUrl: './comparison-view.scss',
})
export class ComparisonView {
  private readonly store = inject(LayoutStore);
  private readonly api = inject(VersionsApi);

  readonly pair = input.required<Pair>();
  /** The versions that can be chosen, newest first. */
  readonly versions = input.required<readonly Version[]>();
  readonly chosen = output<Pair>();

  private readonly before = this.layoutAt(() => this.pair().before);
  private readonly after = this.layoutAt(() => this.pair().after);
  protected readonly trouble = computed(() => {
    const error = this.before.kept.error() ?? this.after.kept.error();
    return error ? apiFailureOf(error.cause ?? error).message : null;
  });
  protected readonly names = computed(() => ({
    before: sideName(this.pair().before),
    after: sideName(this.pair().after),
  }));
  protected readonly shown = computed(() => {
    const [before, after] = [this.before.layout(), this.after.layout()];
    if (!before || !after) return null;
    const comparison = compareLayouts(before, after);
    const words = comparisonWords(comparison, before, after, this.store.lengthUnit());
    return { before, after, words, marked: comparison.tiles, resized: comparison.resize !== null };
  });
  protected readonly pictures = computed(() => {
    const shown = this.shown();
    if (!shown) return [];
    const { before, after, marked } = shown;
    const { names } = this;
    return [
      { name: names().before, layout: before, label: pictureLabel(names().before, before, marked) },
      { name: names().after, layout: after, label: pictureLabel(names().after, after, marked) },
    ];
  });

  protected choose(end: 'before' | 'after', value: string): void {
    const side: Side = value === 'draft' ? 'draft' : Number(value);
    this.chosen.emit({ ...this.pair(), [end]: side });
  }

  protected swap(): void {
    const { before, after } = this.pair();
    this.chosen.emit({ before: after, after: before });
  }

  protected again(): void {
    if (this.before.kept.error()) this.before.kept.reload();
    if (this.after.kept.error()) this.after.kept.reload();
  }

  /** The layout on one side: the draft as it is on the screen, or a version from the server. */
  private layoutAt(side: () => Side) {
    const kept = resource({
      params: () => {
        const [id, number] = [this.store.opened()?.id, side()];
        return id !== undefined && number !== 'draft' ? { id, number } : undefined;
      },
      loader: async ({ params }) => {
        const detail = await this.api.detail(params.id, params.number);
        const read = readLayout(detail.layout);
        return read.ok ? read.layout : null;
      },
    });
    const layout = computed<Layout | null>(() => {
      if (side() === 'draft') return this.store.layout();
      return kept.hasValue() ? kept.value() : null;
    });
    return { kept, layout };
  }
}

function pictureLabel(name: string, { shell }: Layout, marked: readonly number[]): string {
  const size = `${name}, unrolled: ${shell.staves} staves by ${shell.courses} courses`;
  return marked.length === 0 ? size : `${size}, ${marked.length} changed tiles outlined`;
}
