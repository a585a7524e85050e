import { Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatProgressBar } from '@angular/material/progress-bar';
import { Icon } from '../../drawing/icon';
import type { BundleState } from './bundle-download';
import { fileSize } from './file-size';

/** How far a bundle is, how it ended, and what to do when it failed. */
@Component({
  selector: 'sl-bundle-progress',
  imports: [Icon, MatButton, MatProgressBar],
  template: `
    <div role="status">
      @if (share(); as progress) {
        <mat-progress-bar
          [mode]="progress.mode"
          [value]="progress.percent"
          aria-label="Making the bundle"
        />
      }
      @if (sentence() !== '') {
        <p>
          @if (state().kind === 'saved') {
            <sl-icon name="check" />
          }
          {{ sentence() }}
        </p>
      }
      @if (state().kind === 'failed') {
        <button matButton="outlined" type="button" (click)="again.emit()">Try again</button>
      }
    </div>
  `,
  styles: `
    mat-progress-bar {
      margin-top: 12px;
    }
    p {
      display: flex;
      gap: 6px;
      margin: 10px 0 4px;
      font-size: 14px;
      line-height: 1.45;
      overflow-wrap: anywhere;
    }
  `,
})
export class BundleProgress {
  readonly state = input.required<BundleState>();
  readonly again = output();

  protected readonly share = computed(() => {
    const state = this.state();
    if (state.kind === 'making') return { mode: 'indeterminate', percent: 0 } as const;
    if (state.kind !== 'arriving') return null;
    return state.total === null
      ? ({ mode: 'indeterminate', percent: 0 } as const)
      : ({ mode: 'determinate', percent: (100 * state.received) / state.total } as const);
  });
  protected readonly sentence = computed(() => sentenceAbout(this.state()));
}

/** A state of the download in a sentence; empty while there is nothing to say. */
export function sentenceAbout(state: BundleState): string {
  switch (state.kind) {
    case 'idle':
    case 'stopped':
      return '';
    case 'making':
      return `Version ${state.order.version} is being drawn…`;
    case 'arriving': {
      const of = state.total === null ? '' : ` of ${fileSize(state.total)}`;
      return `${fileSize(state.received)}${of} have arrived…`;
    }
    case 'saved': {
      const written = state.order.request.override
        ? ' It says in writing that a stop was overridden, by whom and why.'
        : '';
      return `${state.order.fileName} is in the downloads, ${fileSize(state.size)}.${written}`;
    }
    case 'failed':
      return `The bundle could not be made. ${state.failure.message}`;
  }
}
