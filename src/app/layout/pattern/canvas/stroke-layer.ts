/**
 * Tiles just laid, drawn over the chunks until these have been drawn again: a stroke shows at once and costs
 * no more than its own tiles. While a stroke is under the hand its chunks wait, so that they are drawn once
 * and not at every move; a long stroke hands its tiles over on the way.
 */
import { Layer } from 'konva/lib/Layer';
import { Shape } from 'konva/lib/Shape';
import { tileOf } from '@shared/layout/cells';
import type { ChunkLayer } from './chunk-layer';
import { paintTiles, type PaintedTile, type Scene } from './tile-painting';
import { turnsInView, type SizePx, type Viewport } from './viewport';

/** Tiles drawn one by one before their chunks take over. */
const MOST_LIVE_TILES = 256;

export class StrokeLayer {
  readonly layer = new Layer({ listening: false });
  private readonly live = new Set<number>();
  private readonly handedOver = new Set<number>();
  private scene: Scene | null = null;
  private view: Viewport | null = null;
  private size: SizePx = { width: 0, height: 0 };

  constructor(
    private readonly chunks: ChunkLayer,
    private readonly ratio: number,
  ) {
    this.layer.getCanvas().setPixelRatio(ratio);
    const tiles = new Shape({
      listening: false,
      perfectDrawEnabled: false,
      sceneFunc: () => this.paint(),
    });
    this.layer.add(tiles);
  }

  /** Shows tiles as they are in the scene from now on. */
  lay(scene: Scene, positions: readonly number[]): void {
    this.scene = scene;
    for (const position of positions) this.live.add(position);
    if (this.live.size > MOST_LIVE_TILES) this.handOver();
  }

  /** The hand has been lifted: the chunks take over. */
  handOver(): void {
    if (!this.scene || this.live.size === 0) return;
    this.chunks.repaint(this.scene, this.live);
    for (const position of this.live) this.handedOver.add(position);
    this.live.clear();
  }

  /** Everything is drawn anew by the chunks. */
  clear(): void {
    this.live.clear();
    this.handedOver.clear();
  }

  /** Lets go of tiles whose chunks are drawn; true when there were any. */
  settle(): boolean {
    const before = this.handedOver.size;
    for (const position of this.handedOver) {
      if (!this.chunks.isStale(position)) this.handedOver.delete(position);
    }
    return this.handedOver.size !== before;
  }

  setView(view: Viewport, size: SizePx): void {
    this.view = view;
    this.size = size;
  }

  private paint(): void {
    const { scene, view } = this;
    const context = this.layer.getNativeCanvasElement().getContext('2d');
    if (!scene || !view || context === null || this.live.size + this.handedOver.size === 0) return;
    const { circumference, height } = scene.drawing.size;
    const pxPerMm = view.pxPerMm * this.ratio;
    const tiles = this.tiles(scene);
    context.save();
    for (const turn of turnsInView(view, this.size, scene.drawing.size)) {
      paintTiles(
        context,
        scene,
        {
          pxPerMm,
          ratio: this.ratio,
          seamX: Math.round((turn * circumference - view.leftMm) * pxPerMm),
          topY: Math.round((view.topMm - height) * pxPerMm),
        },
        tiles,
      );
    }
    context.restore();
  }

  private tiles({ drawing }: Scene): PaintedTile[] {
    return [...this.handedOver, ...this.live].map((position) => tileOf(drawing.grid, position));
  }
}
