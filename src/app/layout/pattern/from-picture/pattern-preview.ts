import type { ElementRef } from '@angular/core';
import { Component, effect, input, signal, viewChild } from '@angular/core';
import type { Layout } from '@shared/layout/schema';
import { SceneBook } from '../canvas/scene';
import { themeColours } from '../canvas/theme-colours';
import { paintRange, type Scene } from '../canvas/tile-painting';

/** Most pixels high; a taller shell is drawn narrower. */
const HIGHEST_PX = 260;
/** Room above and below for tabs and the ends of the seam. */
const ROOM_PX = 8;

/** A pattern before it is laid, with a few staves beyond the seam on both sides to show that it meets there. */
@Component({
  selector: 'sl-pattern-preview',
  template: `<canvas #sheet role="img" [attr.aria-label]="label()"></canvas>`,
  styles: `
    :host {
      display: block;
    }
    canvas {
      display: block;
      margin: 0 auto;
    }
  `,
})
export class PatternPreview {
  /** The layout as it would be. */
  readonly layout = input.required<Layout>();
  readonly label = input.required<string>();
  private readonly sheet = viewChild.required<ElementRef<HTMLCanvasElement>>('sheet');
  private readonly book = new SceneBook();
  private readonly room = signal(0);

  constructor() {
    effect((onCleanup) => {
      const parent = this.sheet().nativeElement.parentElement;
      if (!parent) return;
      const observer = new ResizeObserver(([entry]) => {
        if (entry) this.room.set(Math.floor(entry.contentRect.width));
      });
      observer.observe(parent);
      onCleanup(() => observer.disconnect());
    });
    effect(() => {
      if (this.room() === 0) return;
      const { scene } = this.book.turnTo(this.layout(), 'hidden');
      draw(this.sheet().nativeElement, scene, this.room());
    });
  }
}

function draw(canvas: HTMLCanvasElement, scene: Scene, room: number): void {
  const context = canvas.getContext('2d');
  if (!context) return;
  const { grid, size, tileWidth } = scene.drawing;
  const beyond = Math.max(1, Math.min(4, Math.ceil(grid.staves / 12)));
  const width = size.circumference + 2 * beyond * tileWidth;
  const pxPerMm = Math.min(room / width, (HIGHEST_PX - 2 * ROOM_PX) / size.height);
  const ratio = Math.min(2, window.devicePixelRatio || 1);
  const shown = { width: width * pxPerMm, height: size.height * pxPerMm + 2 * ROOM_PX };
  canvas.width = Math.round(shown.width * ratio);
  canvas.height = Math.round(shown.height * ratio);
  canvas.style.width = `${shown.width}px`;
  canvas.style.height = `${shown.height}px`;
  const seamX = beyond * tileWidth * pxPerMm * ratio;
  paintRange(
    context,
    scene,
    { pxPerMm: pxPerMm * ratio, seamX, topY: ROOM_PX * ratio, ratio },
    {
      staveFrom: -beyond,
      staveTo: grid.staves + beyond,
      courseFrom: 0,
      courseTo: grid.courses,
    },
  );
  const seams = [seamX, seamX + size.circumference * pxPerMm * ratio] as const;
  drawSeams(context, canvas, seams, ratio);
}

/** Ghosts what is there a second time, and draws the seam at both ends. */
function drawSeams(
  context: CanvasRenderingContext2D,
  canvas: HTMLCanvasElement,
  [left, right]: readonly [number, number],
  ratio: number,
): void {
  const colours = themeColours(canvas.parentElement ?? document.body);
  context.fillStyle = colours.paper;
  context.globalAlpha = 0.6;
  context.fillRect(0, 0, left, canvas.height);
  context.fillRect(right, 0, canvas.width - right, canvas.height);
  context.globalAlpha = 1;
  context.strokeStyle = colours.teal;
  context.lineWidth = 2 * ratio;
  context.setLineDash([5 * ratio, 4 * ratio]);
  for (const x of [left, right]) {
    context.beginPath();
    context.moveTo(x, 0);
    context.lineTo(x, canvas.height);
    context.stroke();
  }
}
