import { Component, computed, inject, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatProgressBar } from '@angular/material/progress-bar';
import type { BundleRequest } from '@shared/api/bundle';
import { runChecks } from '@shared/checks/run-checks';
import { compareLayouts } from '@shared/layout/comparison';
import { layoutFileName } from '@shared/layout/file-name';
import { readLayout } from '@shared/layout/read-layout';
import { formatLength } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import { EmptyPlace } from '../../drawing/empty-place';
import { Icon } from '../../drawing/icon';
import { apiFailureOf } from '../../platform/api-problem';
import { comparisonWords } from '../comparison-words';
import { fieldValue } from '../field-names';
import { KeepVersion } from '../keep-version';
import { LayoutStore } from '../layout-store';
import { VersionsApi } from '../versions-api';
import { BundleDownload } from './bundle-download';
import { BundleProgress } from './bundle-progress';
import { StoppedVersion } from './stopped-version';

/** Takes a kept version to the machine: its options, what stands in the way, and the download. */
@Component({
  selector: 'sl-bundle-panel',
  imports: [BundleProgress, EmptyPlace, Icon, MatButton, MatProgressBar, StoppedVersion],
  providers: [BundleDownload],
  templateUrl: './bundle-panel.html',
  styleUrl: './bundle-panel.scss',
})
export class BundlePanel {
  protected readonly store = inject(LayoutStore);
  private readonly api = inject(VersionsApi);
  private readonly keeping = inject(KeepVersion);
  protected readonly download = inject(BundleDownload);

  /** The version somebody chose; null goes with the latest. */
  private readonly chosen = signal<number | null>(null);
  protected readonly dxf = signal<'r2000' | 'r12'>('r2000');
  private readonly chosenUnit = signal<LengthUnit | null>(null);
  protected readonly centrePath = signal<'left-out' | 'drawn'>('left-out');

  protected readonly unit = computed(() => this.chosenUnit() ?? this.store.lengthUnit());
  protected readonly list = resource({
    params: () => {
      const opened = this.store.opened();
      return opened ? { id: opened.id, last: opened.lastVersion?.number } : undefined;
    },
    loader: async ({ params }) => (await this.api.list(params.id)).versions,
  });
  protected readonly versions = computed(() => {
    const versions = this.list.hasValue() ? this.list.value() : [];
    return [...versions].sort((a, b) => b.number - a.number);
  });
  protected readonly number = computed(() => this.chosen() ?? this.versions()[0]?.number ?? null);
  protected readonly detail = resource({
    params: () => {
      const [id, number] = [this.store.opened()?.id, this.number()];
      return id !== undefined && number !== null ? { id, number } : undefined;
    },
    loader: ({ params }) => this.api.detail(params.id, params.number),
  });
  protected readonly trouble = computed(() => {
    const error = this.list.error() ?? this.detail.error();
    return error ? apiFailureOf(error.cause ?? error).message : null;
  });
  protected readonly kept = computed(() => {
    const read = this.detail.hasValue() ? readLayout(this.detail.value().layout) : null;
    return read?.ok === true ? read.layout : null;
  });
  protected readonly facts = computed(() => {
    const kept = this.kept();
    if (!kept) return null;
    return {
      clearance: formatLength(kept.joint.clearance, this.unit()),
      way: fieldValue('build.way', kept.build.way, this.unit()),
    };
  });
  /** How the draft differs from the chosen version, in a few words; null when it does not. */
  protected readonly difference = computed(() => {
    const [kept, draft] = [this.kept(), this.store.layout()];
    if (!kept) return null;
    const comparison = compareLayouts(kept, draft);
    const { summary } = comparisonWords(comparison, kept, draft, this.store.lengthUnit());
    return summary === 'nothing' ? null : summary;
  });
  protected readonly isLatest = computed(() => this.number() === this.versions()[0]?.number);
  protected readonly next = computed(() => (this.versions()[0]?.number ?? 0) + 1);
  /** What stops the chosen version: as the server said, else as it will say. */
  protected readonly stops = computed(() => {
    const state = this.download.state();
    if (state.kind === 'stopped' && state.order.version === this.number()) return state.checks;
    const kept = this.kept();
    if (!kept) return [];
    const checks = runChecks(kept, { lengthUnit: this.store.lengthUnit() });
    return checks.filter((check) => check.result === 'stop');
  });
  protected readonly busy = computed(() =>
    ['making', 'arriving'].includes(this.download.state().kind),
  );

  protected choose(number: string): void {
    this.chosen.set(Number(number));
    this.download.forget();
  }

  protected setDrawings(dxf: string): void {
    this.dxf.set(dxf === 'r12' ? 'r12' : 'r2000');
  }

  protected setUnit(unit: string): void {
    this.chosenUnit.set(unit === 'in' ? 'in' : 'mm');
  }

  protected setCentrePath(centrePath: string): void {
    this.centrePath.set(centrePath === 'drawn' ? 'drawn' : 'left-out');
  }

  protected again(): void {
    if (this.list.error()) this.list.reload();
    else this.detail.reload();
  }

  protected async keep(): Promise<void> {
    if ((await this.keeping.ask(this.store)) !== null) this.chosen.set(null);
  }

  /** Downloads the chosen version; with a reason when it goes on in spite of a stop. */
  protected start(override?: BundleRequest['override']): void {
    const [opened, version, kept] = [this.store.opened(), this.number(), this.kept()];
    if (!opened || version === null || !kept || this.busy()) return;
    this.download.start({
      layoutId: opened.id,
      version,
      fileName: layoutFileName(kept.name, `-v${version}.zip`),
      request: {
        dxf: this.dxf(),
        unit: this.unit(),
        centrePath: this.centrePath() === 'drawn',
        ...(override ? { override } : {}),
      },
    });
  }
}
