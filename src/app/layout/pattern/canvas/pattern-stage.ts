/**
 * The canvas of the pattern, without Angular: three Konva layers (chunks, live stroke, overlay), none of
 * them listening, and one loop that runs only while there is something to draw. Konva is told when to draw;
 * it never decides by itself.
 */
import { Konva } from 'konva/lib/Global';
import { Stage } from 'konva/lib/Stage';
import { ChunkLayer } from './chunk-layer';
import { OverlayLayer } from './overlay-layer';
import type { CanvasColours, OverlayState } from './overlay-painting';
import { StrokeLayer } from './stroke-layer';
import type { Scene } from './tile-painting';
import type { PointPx, SizePx, Viewport } from './viewport';

/** Milliseconds of a frame spent on chunks: while something moves, and while nothing does. */
const BUDGET_MOVING_MS = 3;
const BUDGET_RESTING_MS = 8;

/** How long the scale must rest before everything is drawn for it. */
const ZOOM_REST_MS = 120;

/** More than two device pixels a pixel cost four times the memory and cannot be told apart. */
const MOST_PIXEL_RATIO = 2;

type LayerName = 'chunks' | 'stroke' | 'overlay';

export interface StageOptions {
  readonly container: HTMLDivElement;
  readonly size: SizePx;
  readonly colours: CanvasColours;
}

export class PatternStage {
  private readonly stage: Stage;
  private readonly chunks: ChunkLayer;
  private readonly stroke: StrokeLayer;
  private readonly overlay: OverlayLayer;
  private readonly dirty = new Set<LayerName>();
  private frameRequest = 0;
  private frameMs = 0;
  private restAt = 0;
  private movedAt = 0;
  private scene: Scene | null = null;
  private view: Viewport | null = null;
  private focus: PointPx | null = null;
  private colours: CanvasColours;
  private marks: OverlayState = {
    preview: [],
    cursor: null,
    overlaid: new Set(),
    people: [],
    trim: null,
  };

  constructor({ container, size, colours }: StageOptions) {
    Konva.autoDrawEnabled = false;
    const ratio = Math.min(MOST_PIXEL_RATIO, window.devicePixelRatio || 1);
    this.colours = colours;
    this.stage = new Stage({ container, ...size, listening: false });
    this.chunks = new ChunkLayer(ratio);
    this.stroke = new StrokeLayer(this.chunks, ratio);
    this.overlay = new OverlayLayer(ratio);
    this.stage.add(this.chunks.layer, this.stroke.layer, this.overlay.layer);
  }

  get size(): SizePx {
    return { width: this.stage.width(), height: this.stage.height() };
  }

  /** True while chunks wait to be drawn or layers to be refreshed. */
  get busy(): boolean {
    return this.frameRequest !== 0;
  }

  /** Milliseconds of script the last frame took. */
  get lastFrameMs(): number {
    return this.frameMs;
  }

  destroy(): void {
    cancelAnimationFrame(this.frameRequest);
    this.stage.destroy();
  }

  resize(size: SizePx): void {
    this.stage.size(size);
    if (this.view) this.setView(this.view);
  }

  setColours(colours: CanvasColours): void {
    this.colours = colours;
    this.invalidate('overlay');
  }

  /** Another shell, joint, set of woods or way of drawing: everything is drawn anew. */
  setScene(scene: Scene): void {
    this.scene = scene;
    this.stroke.clear();
    this.chunks.setScene(scene);
    this.invalidate('chunks', 'stroke', 'overlay');
  }

  /** The same sheet with other woods on some tiles. */
  lay(scene: Scene, positions: readonly number[]): void {
    this.scene = scene;
    this.stroke.lay(scene, positions);
    this.invalidate('stroke');
  }

  /** The stroke is over: its tiles become part of the sheet. */
  strokeDone(): void {
    this.stroke.handOver();
    this.invalidate('chunks', 'stroke');
  }

  setView(view: Viewport): void {
    const now = performance.now();
    if (this.view?.pxPerMm !== view.pxPerMm) this.restAt = this.view ? now + ZOOM_REST_MS : now;
    this.view = view;
    this.movedAt = now;
    this.chunks.setView(view, this.size, this.focus ?? this.middle());
    this.stroke.setView(view, this.size);
    this.invalidate('chunks', 'stroke', 'overlay');
  }

  /** Where the pointer is: chunks near it are drawn first. Null when it has left. */
  setFocus(focus: PointPx | null): void {
    this.focus = focus;
  }

  setMarks(marks: Partial<OverlayState>): void {
    this.marks = { ...this.marks, ...marks };
    this.invalidate('overlay');
  }

  private middle(): PointPx {
    return { x: this.stage.width() / 2, y: this.stage.height() / 2 };
  }

  private invalidate(...layers: LayerName[]): void {
    for (const layer of layers) this.dirty.add(layer);
    this.schedule();
  }

  private schedule(): void {
    if (this.frameRequest !== 0) return;
    this.frameRequest = requestAnimationFrame((time) => this.drawFrame(time));
  }

  private drawFrame(now: number): void {
    const began = performance.now();
    this.frameRequest = 0;
    if (!this.scene || !this.view) return;
    if (this.restAt > 0 && now >= this.restAt) {
      this.restAt = 0;
      this.chunks.sharpen();
      this.dirty.add('chunks');
    }
    const moving = now - this.movedAt < ZOOM_REST_MS;
    if (this.chunks.work(moving ? BUDGET_MOVING_MS : BUDGET_RESTING_MS)) this.dirty.add('chunks');
    if (this.stroke.settle()) this.dirty.add('stroke');
    this.drawDirty();
    this.frameMs = performance.now() - began;
    if (this.chunks.waiting > 0 || this.restAt > 0) this.schedule();
  }

  private drawDirty(): void {
    const { scene, view, colours } = this;
    if (!scene || !view) return;
    if (this.dirty.has('chunks')) this.chunks.layer.draw();
    if (this.dirty.has('stroke')) this.stroke.layer.draw();
    if (this.dirty.has('overlay')) {
      const { drawing } = scene;
      this.overlay.show({ drawing, view, size: this.size, colours, state: this.marks });
      this.overlay.layer.draw();
    }
    this.dirty.clear();
  }
}
