/**
 * A square of wood that can be laid side by side in both directions: its colour, grain lines along the
 * stave, and the marks of its figure. Drawn once a wood and used as a pattern by the canvas and the tray.
 */
import { grainColour, grainOf } from '../../../drawing/grain';
import type { FigureMark, WoodFigure } from './wood-figure';

/** Side of the texture in pixels. */
export const TEXTURE_PX = 512;

/** How many tile widths one texture spans. */
export const TEXTURE_TILES = 4;

type Context = CanvasRenderingContext2D;

/** The texture of a wood on a canvas of its own. */
export function grainTexture(colour: string, figure: WoodFigure): HTMLCanvasElement {
  const canvas = document.createElement('canvas');
  canvas.width = TEXTURE_PX;
  canvas.height = TEXTURE_PX;
  const context = canvas.getContext('2d');
  if (context === null) return canvas;
  context.fillStyle = colour;
  context.fillRect(0, 0, TEXTURE_PX, TEXTURE_PX);
  drawLines(context, colour);
  context.fillStyle = context.strokeStyle = markColour(colour);
  MARKS[figure.mark](context, figure.density, scatter(figure));
  return canvas;
}

/** Grain lines that wander a little and come back, so the texture closes at its lower edge. */
function drawLines(context: Context, colour: string): void {
  const strip = TEXTURE_PX / 2;
  for (const [i, line] of grainOf(colour).entries()) {
    context.strokeStyle = grainColour(line);
    context.lineWidth = Math.max(1.2, line.width * strip);
    for (const shift of [0, strip]) {
      wander(context, shift + line.at * strip, 1.5 + (i % 3), i + shift);
    }
  }
}

function wander(context: Context, x: number, swing: number, phase: number): void {
  context.beginPath();
  for (let y = 0; y <= TEXTURE_PX; y += 16) {
    const turn = (y / TEXTURE_PX) * 2 * Math.PI;
    context.lineTo(x + swing * Math.sin(turn + phase) * Math.cos(turn * 2), y);
  }
  context.stroke();
}

/** Marks darken a pale wood and lighten a dark one. */
function markColour(colour: string): string {
  const value = Number.parseInt(colour.slice(1), 16);
  const light = 0.299 * (value >> 16) + 0.587 * ((value >> 8) & 255) + 0.114 * (value & 255);
  return light > 110 ? 'rgb(60 30 0 / 17%)' : 'rgb(255 236 210 / 15%)';
}

type Scatter = () => number;

/** The same places every time for the same figure: a linear congruential sequence (Numerical Recipes). */
function scatter({ mark, density }: WoodFigure): Scatter {
  let state = mark.length * 7919 + density * 104_729;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 0x1_0000_0000;
  };
}

const MARKS: Record<FigureMark, (context: Context, density: number, random: Scatter) => void> = {
  plain: (context, density) => {
    context.globalAlpha = 0.35;
    for (let i = 0; i < density * 4; i++) wander(context, ((i + 0.5) / density) * 128, 3, i);
    context.globalAlpha = 1;
  },
  pores: (context, density, random) => {
    for (let i = 0; i < density * 130; i++) {
      context.fillRect(random() * TEXTURE_PX, random() * TEXTURE_PX, 2, 10 + random() * 14);
    }
  },
  arches: (context, density) => {
    context.lineWidth = 2;
    const across = TEXTURE_PX / 4;
    for (let column = 0; column < 4; column++) {
      for (let i = 0; i < density * 3; i++)
        arch(context, (column + 0.5) * across, i / (density * 3));
    }
  },
  flecks: (context, density, random) => {
    for (let i = 0; i < density * 90; i++) {
      const y = random() * TEXTURE_PX;
      context.beginPath();
      context.ellipse(random() * TEXTURE_PX, y, 1.8, 8 + random() * 10, 0, 0, 2 * Math.PI);
      context.fill();
    }
  },
  ribbon: (context, density) => {
    const width = TEXTURE_PX / (density * 8);
    context.globalAlpha = 0.6;
    for (let i = 0; i < density * 4; i++) context.fillRect(2 * i * width, 0, width, TEXTURE_PX);
    context.globalAlpha = 1;
  },
  waves: (context, density) => {
    context.lineWidth = 2.4;
    const step = TEXTURE_PX / (density * 10);
    for (let x = step / 2; x < TEXTURE_PX; x += step) waveLine(context, x);
  },
  specks: (context, density, random) => {
    for (let i = 0; i < density * 140; i++) {
      context.beginPath();
      context.arc(random() * TEXTURE_PX, random() * TEXTURE_PX, 2, 0, 2 * Math.PI);
      context.fill();
    }
  },
  stripes: (context, density) => {
    const step = TEXTURE_PX / (density * 6);
    for (let x = step / 2; x < TEXTURE_PX; x += step) context.fillRect(x, 0, 4, TEXTURE_PX);
  },
};

/** One of the nested arches a board sawn flat shows; drawn twice so that it goes on over the lower edge. */
function arch(context: Context, x: number, share: number): void {
  const top = share * TEXTURE_PX;
  for (const y of [top, top - TEXTURE_PX]) {
    context.beginPath();
    context.moveTo(x - 44, y + 300);
    context.quadraticCurveTo(x - 30, y, x, y);
    context.quadraticCurveTo(x + 30, y, x + 44, y + 300);
    context.stroke();
  }
}

function waveLine(context: Context, x: number): void {
  context.beginPath();
  for (let y = 0; y <= TEXTURE_PX; y += 8) {
    context.lineTo(x + 4 * Math.sin((y / TEXTURE_PX) * 16 * Math.PI), y);
  }
  context.stroke();
}
