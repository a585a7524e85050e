import type { ElementRef } from '@angular/core';
import { Component, effect, input, viewChild } from '@angular/core';
import { grainTexture, TEXTURE_PX } from '../grain/grain-texture';
import type { WoodFigure } from '../grain/wood-figure';

/** Shows so many texture pixels a CSS pixel, as the tiles do when they are large. */
const TEXTURE_SCALE = 0.62;

/** A piece of a wood with its grain and the marks of its figure, as they show on the tiles. */
@Component({
  selector: 'sl-wood-strip',
  template: `<canvas #strip width="440" height="150" aria-hidden="true"></canvas>`,
  styles: `
    :host {
      display: block;
      overflow: hidden;
    }
    canvas {
      display: block;
      width: 100%;
      height: 100%;
      object-fit: cover;
    }
  `,
})
export class WoodStrip {
  readonly colour = input.required<string>();
  readonly figure = input.required<WoodFigure>();
  private readonly strip = viewChild.required<ElementRef<HTMLCanvasElement>>('strip');

  constructor() {
    effect(() => {
      const texture = grainTexture(this.colour(), this.figure());
      const context = this.strip().nativeElement.getContext('2d');
      const pattern = context?.createPattern(texture, 'repeat');
      if (!context || !pattern) return;
      context.setTransform(TEXTURE_SCALE, 0, 0, TEXTURE_SCALE, 0, 0);
      context.fillStyle = pattern;
      context.fillRect(0, 0, TEXTURE_PX * 2, TEXTURE_PX);
    });
  }
}
