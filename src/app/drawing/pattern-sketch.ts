import type { ElementRef } from '@angular/core';
import { Component, effect, input, viewChild } from '@angular/core';
import type { GridState } from '@shared/layout/patch';

/** Width of the drawing at most, in its own pixels; the page scales it down. */
const WIDTH_MOST = 1440;
const TILE_MOST = 24;
/** Joints are drawn where a tile is at least this wide. */
const JOINTS_FROM = 8;

/** A pattern unrolled from the seam: plain tiles in their woods' colours, the seam in teal. */
@Component({
  selector: 'sl-pattern-sketch',
  template: `<canvas #canvas role="img" [attr.aria-label]="label()"></canvas>`,
  styles: `
    :host {
      display: block;
    }
    /* the theme's colours, to be read back as the canvas takes them */
    canvas {
      color: var(--teal);
      background: var(--paper);
      display: block;
      max-width: 100%;
      max-height: var(--sketch-height, 220px);
      border-radius: 6px;
    }
  `,
})
export class PatternSketch {
  readonly pattern = input.required<GridState>();
  readonly colours = input.required<readonly string[]>();
  /** What the picture shows, for who cannot see it. */
  readonly label = input.required<string>();
  /** A second turn, fainter, shows how the pattern meets itself. */
  readonly turns = input<1 | 2>(1);
  /** Height of a tile over its width. */
  readonly proportion = input(1);
  private readonly canvas = viewChild.required<ElementRef<HTMLCanvasElement>>('canvas');

  constructor() {
    effect(() => {
      const canvas = this.canvas().nativeElement;
      const { staves, courses } = this.pattern();
      const columns = staves * this.turns();
      const tile = Math.max(1, Math.min(TILE_MOST, Math.floor(WIDTH_MOST / columns)));
      canvas.width = columns * tile;
      canvas.height = Math.max(1, Math.round(courses * tile * this.proportion()));
      const context = canvas.getContext('2d');
      if (context) this.paint(context, tile);
    });
  }

  private paint(context: CanvasRenderingContext2D, tile: number): void {
    const { width, height } = context.canvas;
    const { staves, courses } = this.pattern();
    const oneTurn = staves * tile;
    const tiles = tilesOf(this.pattern(), this.colours());
    context.imageSmoothingEnabled = false;
    for (let x = 0; x < width; x += oneTurn) context.drawImage(tiles, x, 0, oneTurn, height);
    if (tile >= JOINTS_FROM) paintJoints(context, tile, height / courses);
    const look = getComputedStyle(context.canvas);
    context.globalAlpha = 0.45;
    context.fillStyle = look.backgroundColor;
    context.fillRect(oneTurn, 0, width, height);
    context.globalAlpha = 1;
    context.fillStyle = look.color;
    for (let x = 0; x <= width; x += oneTurn) context.fillRect(x - 2, 0, 4, height);
  }
}

function tilesOf(
  { staves, courses, cells }: GridState,
  colours: readonly string[],
): OffscreenCanvas {
  const tiles = new OffscreenCanvas(staves, courses);
  const context = tiles.getContext('2d');
  const inks = colours.map((colour) => Number.parseInt(colour.slice(1), 16));
  const image = new ImageData(staves, courses);
  for (let at = 0; at < staves * courses; at++) {
    const ink = inks[cells[at] ?? 0] ?? 0;
    const row = courses - 1 - Math.floor(at / staves);
    image.data.set(
      [ink >> 16, (ink >> 8) & 255, ink & 255, 255],
      4 * (row * staves + (at % staves)),
    );
  }
  context?.putImageData(image, 0, 0);
  return tiles;
}

function paintJoints(context: CanvasRenderingContext2D, across: number, up: number): void {
  const { width, height } = context.canvas;
  context.fillStyle = 'rgb(30 42 54 / 30%)';
  for (let x = across; x < width; x += across) context.fillRect(x - 0.5, 0, 1, height);
  for (let y = up; y < height - 1; y += up) context.fillRect(0, y - 0.5, width, 1);
}
