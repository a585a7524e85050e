/** From a layout to what the canvas paints. */
import type { Layout, Wood } from '@shared/layout/schema';
import { grainTexture } from '../grain/grain-texture';
import { figuresOf } from '../grain/wood-figure';
import { sheetDrawing, type SheetDrawing } from './sheet-drawing';
import type { NumbersShown, Scene, WoodPaint } from './tile-painting';

/** Paints of the woods, in their order; a wood whose colour and figure stayed keeps its texture. */
export class WoodPaints {
  private readonly textures = new Map<string, HTMLCanvasElement>();

  of(woods: readonly Wood[]): WoodPaint[] {
    const figures = figuresOf(woods);
    return woods.map(({ colour }, i) => {
      const figure = figures[i] ?? { mark: 'plain', density: 2 };
      const key = `${colour} ${figure.mark} ${figure.density}`;
      const texture = this.textures.get(key) ?? grainTexture(colour, figure);
      this.textures.set(key, texture);
      return { colour, texture };
    });
  }
}

/** Builds scenes, making anew only what a change of the layout asks for. */
export class SceneBook {
  private readonly paints = new WoodPaints();
  private last: { layout: Layout; numbers: NumbersShown; scene: Scene } | null = null;

  /** The scene of a layout, and whether anything but the wood of tiles differs from the last one. */
  turnTo(layout: Layout, numbers: NumbersShown): { scene: Scene; change: 'cells' | 'all' } {
    const { last } = this;
    const sameSheet =
      last !== null && last.layout.shell === layout.shell && last.layout.joint === layout.joint;
    const sameLook =
      last !== null && last.layout.woods === layout.woods && last.numbers === numbers;
    const drawing: SheetDrawing = sameSheet
      ? last.scene.drawing
      : sheetDrawing(layout.shell, layout.joint);
    const woods = sameLook ? last.scene.woods : this.paints.of(layout.woods);
    const scene = { drawing, cells: layout.cells, woods, numbers };
    this.last = { layout, numbers, scene };
    return { scene, change: sameSheet && sameLook ? 'cells' : 'all' };
  }
}

/** Positions at which two patterns of one size differ. */
export function differing(before: Uint8Array, after: Uint8Array): number[] {
  const positions: number[] = [];
  for (let position = 0; position < after.length; position++) {
    if (before[position] !== after[position]) positions.push(position);
  }
  return positions;
}
