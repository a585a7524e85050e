import { Component, computed, input } from '@angular/core';
import { grainColour, grainOf } from './grain';

/**
 * A strip of a wood as itself: its colour with grain along the stave (upright). Fills the box it is
 * given; decoration only, the wood's name stands beside it.
 */
@Component({
  selector: 'sl-wood-swatch',
  template: `
    <svg viewBox="0 0 1 1" preserveAspectRatio="none" aria-hidden="true" focusable="false">
      <rect width="1" height="1" [attr.fill]="colour()" />
      @for (line of lines(); track $index) {
        <rect [attr.x]="line.x" [attr.width]="line.width" height="1" [attr.fill]="line.fill" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: block;
      overflow: hidden;
      border-radius: var(--radius);
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
  `,
})
export class WoodSwatch {
  /** The wood's colour, "#RRGGBB". */
  readonly colour = input.required<string>();
  protected readonly lines = computed(() =>
    grainOf(this.colour()).map((line) => ({
      x: line.at - line.width / 2,
      width: line.width,
      fill: grainColour(line),
    })),
  );
}
