import { Component, computed, input, signal } from '@angular/core';
import type { Layout } from '@shared/layout/schema';
import { projectShell } from './projected-shell';
import { pictureOf } from './shell-picture';

/** One press of an arrow key, or one click beside the shell. */
const TURN_STEP = Math.PI / 12;

/** The shell as a flat drawing that turns by steps: for browsers without WebGL, and for paper. */
@Component({
  selector: 'sl-shell-drawing',
  template: `
    <svg
      [attr.viewBox]="shell().viewBox"
      tabindex="0"
      role="img"
      [attr.aria-label]="label()"
      (keydown.arrowLeft)="turnBy(-1); $event.preventDefault()"
      (keydown.arrowRight)="turnBy(1); $event.preventDefault()"
    >
      <defs>
        <clipPath [attr.id]="clip"><path [attr.d]="shell().wall" /></clipPath>
        <linearGradient [attr.id]="light">
          <stop offset="0" stop-color="#140e08" stop-opacity="0.5" />
          <stop offset="0.2" stop-color="#140e08" stop-opacity="0.12" />
          <stop offset="0.42" stop-color="#fffaf0" stop-opacity="0.12" />
          <stop offset="0.7" stop-color="#140e08" stop-opacity="0.08" />
          <stop offset="1" stop-color="#140e08" stop-opacity="0.6" />
        </linearGradient>
      </defs>
      <path class="shadow" [attr.d]="shell().shadow" />
      <g [attr.clip-path]="'url(#' + clip + ')'">
        @for (tile of shell().tiles; track $index) {
          <path class="tile" [attr.d]="tile.d" [attr.fill]="tile.fill" />
        }
        <path [attr.d]="shell().wall" [attr.fill]="'url(#' + light + ')'" />
      </g>
      <path class="bore" [attr.d]="shell().bore" />
      @for (stave of shell().rim; track $index) {
        <path class="tile" [attr.d]="stave.d" [attr.fill]="stave.fill" />
      }
    </svg>
    <p>
      This browser shows the shell as a drawing.
      <button type="button" (click)="turnBy(-1)">Turn it left</button>
      <button type="button" (click)="turnBy(1)">Turn it right</button>
    </p>
  `,
  styles: `
    :host {
      display: grid;
      height: 100%;
      min-height: 0;
      grid-template-rows: minmax(0, 1fr) auto;
    }
    svg {
      width: 100%;
      height: 100%;
      min-height: 0;
    }
    .tile {
      stroke: rgb(30 20 12 / 62%);
      stroke-width: 0.4;
    }
    .bore {
      fill: #3a2a1d;
    }
    .shadow {
      fill: rgb(0 0 0 / 14%);
    }
    p {
      margin: 0;
      padding: 4px 12px 10px;
      color: var(--mute);
      font-size: 13px;
      text-align: center;
    }
    button {
      min-height: 28px;
      padding: 2px 12px;
      border: 1px solid var(--line);
      border-radius: var(--radius-full);
      background: var(--sheet);
      color: var(--blue);
      font: inherit;
      font-weight: 600;
      cursor: pointer;
    }
  `,
})
export class ShellDrawing {
  readonly layout = input.required<Layout>();
  private readonly turn = signal(0.3);
  private readonly picture = computed(() => pictureOf(this.layout()));

  private static drawn = 0;
  private readonly id = `shell-drawing-${ShellDrawing.drawn++}`;
  protected readonly clip = `${this.id}-wall`;
  protected readonly light = `${this.id}-light`;
  protected readonly shell = computed(() => projectShell(this.picture(), this.turn()));
  protected readonly label = computed(() => {
    const { shell, name } = this.layout();
    return `${name}: round shell of ${shell.staves} staves and ${shell.courses} courses. Turn it with the arrow keys.`;
  });

  protected turnBy(steps: number): void {
    this.turn.update((turn) => turn + steps * TURN_STEP);
  }
}
