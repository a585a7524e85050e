import {
  afterNextRender,
  Component,
  DestroyRef,
  DOCUMENT,
  inject,
  signal,
  viewChild,
  type ElementRef,
} from '@angular/core';
import { demoShell } from './demo-shell';
import { drawShell } from './draw-shell';
import { pictureOf } from '../wrapped-shell/shell-picture';

/** One turn takes this long. */
const TURN_MS = 60_000;
/** A slow turn needs no more pictures than these. */
const FRAME_MS = 1000 / 30;
const START = 0.35;

/** The demonstration shell, turning slowly; it stands still on request and where motion is unwelcome. */
@Component({
  selector: 'sl-turning-shell',
  template: `
    <canvas
      #canvas
      role="img"
      aria-label="A round shell of light ash tiles, with diamonds of dark walnut and red hearts, joined by round tabs."
    ></canvas>
    <button type="button" (click)="turning.set(!turning())">
      {{ turning() ? 'Hold the shell still' : 'Let the shell turn' }}
    </button>
  `,
  styles: `
    :host {
      display: grid;
      justify-items: center;
      gap: 4px;
    }
    canvas {
      display: block;
      width: 100%;
      aspect-ratio: 1.08;
    }
    button {
      min-height: 32px;
      padding: 4px 14px;
      border: 0;
      border-radius: var(--radius-full);
      background: none;
      color: var(--mute);
      font: inherit;
      font-size: 14px;
      font-weight: 600;
      cursor: pointer;
    }
    button:hover {
      background: var(--well);
      color: var(--ink);
    }
  `,
})
export class TurningShell {
  private readonly window = inject(DOCUMENT).defaultView;
  private readonly canvas = viewChild.required<ElementRef<HTMLCanvasElement>>('canvas');
  private readonly picture = pictureOf(demoShell());
  private turn = START;
  private drawnAt = 0;
  private drawnSize = '';
  protected readonly turning = signal(
    !(this.window?.matchMedia('(prefers-reduced-motion: reduce)').matches ?? true),
  );

  constructor() {
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      let frame = 0;
      const step = (now: number): void => {
        this.advance(now);
        frame = this.window?.requestAnimationFrame(step) ?? 0;
      };
      step(0);
      destroyed.onDestroy(() => this.window?.cancelAnimationFrame(frame));
    });
  }

  private advance(now: number): void {
    const size = this.fit();
    const passed = now - this.drawnAt;
    const moved = this.turning() && passed >= FRAME_MS;
    if (!moved && size === this.drawnSize) return;
    // After a pause the shell goes on from where it was instead of jumping.
    if (moved) this.turn += (Math.min(passed, 2 * FRAME_MS) / TURN_MS) * 2 * Math.PI;
    this.drawnAt = now;
    this.drawnSize = size;
    this.draw();
  }

  /** Gives the canvas as many pixels as it covers on the screen; returns its size as text. */
  private fit(): string {
    const { nativeElement } = this.canvas();
    const ratio = Math.min(this.window?.devicePixelRatio ?? 1, 2);
    const width = Math.round(nativeElement.clientWidth * ratio);
    const height = Math.round(nativeElement.clientHeight * ratio);
    const size = `${width} ${height} ${ratio}`;
    if (size !== this.drawnSize) {
      nativeElement.width = width;
      nativeElement.height = height;
    }
    return size;
  }

  private draw(): void {
    const { nativeElement } = this.canvas();
    const pen = nativeElement.getContext('2d');
    if (pen === null || nativeElement.clientWidth === 0) return;
    const ratio = nativeElement.width / nativeElement.clientWidth;
    pen.setTransform(ratio, 0, 0, ratio, 0, 0);
    drawShell(pen, this.picture, {
      turn: this.turn,
      width: nativeElement.clientWidth,
      height: nativeElement.clientHeight,
    });
  }
}
