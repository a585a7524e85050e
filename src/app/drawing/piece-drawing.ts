import { Component, computed, input } from '@angular/core';
import { pathData } from '@exports/svg/path-data';
import { boundsOf, type Outline } from '@shared/geometry/outline';
import type { Millimetres } from '@shared/units/length';
import { grainColour, grainOf } from './grain';

let drawings = 0;

/**
 * One piece as it is cut: its true outline in its wood, grain upright. Decoration beside words that say
 * the same. `reach` is how far the drawing looks from the piece's centre, so that pieces drawn with the
 * same reach show their sizes against each other.
 */
@Component({
  selector: 'sl-piece-drawing',
  template: `
    <svg [attr.viewBox]="view()" aria-hidden="true" focusable="false">
      <clipPath [attr.id]="clip"><path [attr.d]="path()" /></clipPath>
      <g [attr.clip-path]="'url(#' + clip + ')'">
        <rect
          [attr.x]="box().minX"
          [attr.y]="-box().maxY"
          [attr.width]="width()"
          [attr.height]="height()"
          [attr.fill]="colour()"
        />
        @for (line of grain(); track $index) {
          <rect
            [attr.x]="line.x"
            [attr.y]="-box().maxY"
            [attr.width]="line.width"
            [attr.height]="height()"
            [attr.fill]="line.fill"
          />
        }
      </g>
      <path class="edge" [attr.d]="path()" />
    </svg>
  `,
  styles: `
    :host {
      display: block;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
    .edge {
      fill: none;
      stroke: var(--ink);
      stroke-width: 1.5px;
      stroke-linejoin: round;
      vector-effect: non-scaling-stroke;
    }
  `,
})
export class PieceDrawing {
  readonly outline = input.required<Outline>();
  /** The wood's colour, "#RRGGBB". */
  readonly colour = input.required<string>();
  readonly reach = input.required<Millimetres>();

  protected readonly clip = `sl-piece-${++drawings}`;
  protected readonly path = computed(() => pathData(this.outline().segments, { flipY: true }));
  protected readonly box = computed(() => boundsOf(this.outline().segments));
  protected readonly width = computed(() => this.box().maxX - this.box().minX);
  protected readonly height = computed(() => this.box().maxY - this.box().minY);
  protected readonly view = computed(() => {
    // a hair more than the piece, so that the stroke of its edge is not cut off
    const reach = this.reach() * 1.03;
    return `${-reach} ${-reach} ${2 * reach} ${2 * reach}`;
  });
  protected readonly grain = computed(() =>
    grainOf(this.colour()).map((line) => ({
      x: this.box().minX + (line.at - line.width / 2) * this.width(),
      width: line.width * this.width(),
      fill: grainColour(line),
    })),
  );
}
