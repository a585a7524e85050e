import { Component, computed, input } from '@angular/core';
import { encodeCells } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import { colourRuns } from './colour-runs';
import { tileBorders } from './tile-borders';

/** Above this many staves lines between tiles would be closer than they are wide. */
const LINED_STAVES_MOST = 96;

/**
 * The whole pattern unrolled from the seam (the teal line at the left), tiles in their true proportion, as
 * wide as the place it stands in and lower than the window. Marked tiles are outlined, light on dark and dark on light at once.
 */
@Component({
  selector: 'sl-unrolled-picture',
  template: `
    <svg
      role="img"
      [attr.aria-label]="label()"
      [attr.viewBox]="'0 0 ' + grid().staves + ' ' + grid().courses"
      [style.aspect-ratio]="proportion()"
      [style.max-width]="'calc(64vh * ' + proportion() + ')'"
      preserveAspectRatio="none"
    >
      <g shape-rendering="crispEdges">
        @for (run of runs(); track run.colour) {
          <path [attr.d]="run.path" [attr.fill]="run.colour" />
        }
      </g>
      <path class="line" [attr.d]="lines()" />
      <path class="halo" [attr.d]="borders()" [style.stroke-width]="weight().halo" />
      <path class="mark" [attr.d]="borders()" [style.stroke-width]="weight().mark" />
      <path class="seam" [attr.d]="'M0 0v' + grid().courses" />
    </svg>
  `,
  styles: `
    :host {
      display: block;
    }
    svg {
      display: block;
      width: 100%;
      overflow: visible;
    }
    path {
      vector-effect: non-scaling-stroke;
    }
    .line {
      fill: none;
      stroke: rgb(30 42 54 / 35%);
      stroke-width: 0.6px;
    }
    .halo,
    .mark,
    .seam {
      fill: none;
      stroke-linecap: square;
    }
    .halo {
      stroke: var(--sheet);
    }
    .mark {
      stroke: var(--ink);
    }
    .seam {
      stroke: var(--teal);
      stroke-width: 3px;
    }
  `,
})
export class UnrolledPicture {
  readonly layout = input.required<Pick<Layout, 'shell' | 'woods' | 'cells'>>();
  /** Positions of the tiles to outline. */
  readonly marked = input<readonly number[]>([]);
  /** What the picture shows, in words. */
  readonly label = input.required<string>();

  protected readonly grid = computed(() => {
    const { staves, courses } = this.layout().shell;
    return { staves, courses };
  });
  protected readonly proportion = computed(() => {
    const { staves, courses, tileWidth, tileHeight } = this.layout().shell;
    return (staves * tileWidth) / (courses * tileHeight);
  });
  protected readonly runs = computed(() => {
    const colours = this.layout().woods.map((wood) => wood.colour);
    return colourRuns({ ...this.grid(), colours, cells: encodeCells(this.layout().cells) });
  });
  /** Thinner round small tiles, so that the wood inside still shows. */
  protected readonly weight = computed(() => {
    const { staves } = this.grid();
    if (staves <= 48) return { halo: 4.5, mark: 1.8 };
    return staves <= LINED_STAVES_MOST ? { halo: 3, mark: 1.4 } : { halo: 0, mark: 1 };
  });
  protected readonly lines = computed(() => {
    const { staves, courses } = this.grid();
    if (staves > LINED_STAVES_MOST) return '';
    const upright = Array.from({ length: staves - 1 }, (_, i) => `M${i + 1} 0v${courses}`);
    const level = Array.from({ length: courses - 1 }, (_, i) => `M0 ${i + 1}h${staves}`);
    return [...upright, ...level].join('');
  });
  protected readonly borders = computed(() => tileBorders(this.grid(), this.marked()));
}
