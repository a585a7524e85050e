import { Component, computed, input } from '@angular/core';
import type { Thumbnail } from '@shared/api/commission';
import { colourRuns } from './colour-runs';

/**
 * A small picture of a pattern, unrolled from the seam. Tiles stay square: what does not fit the
 * picture's shape is left out at the right, or above and below.
 */
@Component({
  selector: 'sl-shell-thumbnail',
  template: `
    <svg
      [attr.viewBox]="'0 0 ' + thumbnail().staves + ' ' + thumbnail().courses"
      preserveAspectRatio="xMinYMid slice"
      shape-rendering="crispEdges"
      aria-hidden="true"
      focusable="false"
    >
      @for (run of runs(); track run.colour) {
        <path [attr.d]="run.path" [attr.fill]="run.colour" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: block;
      width: 144px;
      height: 54px;
      overflow: hidden;
      border-radius: var(--radius);
      background: var(--well);
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
  `,
})
export class ShellThumbnail {
  readonly thumbnail = input.required<Thumbnail>();
  protected readonly runs = computed(() => colourRuns(this.thumbnail()));
}
