/**
 * The sheet on the screen: bitmaps of chunks, one `Konva.Image` for each chunk on each turn of the shell in
 * view, none listening. While zooming the bitmaps at hand are stretched; when the scale has come to rest a
 * new generation is drawn over them, nearest the pointer first, and the old one goes when nothing of it
 * shows any more. Under both lies the pattern at one pixel a tile, so nothing is ever blank.
 */
import { Group } from 'konva/lib/Group';
import { Layer } from 'konva/lib/Layer';
import { Image } from 'konva/lib/shapes/Image';
import { chunksTouchedBy } from './chunk-grid';
import { chunkRaster, drawChunk, type ChunkRaster } from './chunk-raster';
import { RasterQueue } from './raster-queue';
import type { Scene } from './tile-painting';
import { turnsInView, type PointPx, type SizePx, type Viewport } from './viewport';
import { Underlay } from './underlay';

/** Device pixels of bitmaps kept for places out of view. */
const SPARE_PIXELS = 24_000_000;

interface Generation {
  readonly raster: ChunkRaster;
  readonly group: Group;
  readonly bitmaps: Map<number, HTMLCanvasElement>;
  /** By chunk and turn. */
  readonly images: Map<string, Image>;
}

interface Seen {
  readonly chunk: number;
  readonly turn: number;
  /** From the focus, in CSS pixels squared. */
  readonly distance: number;
}

export class ChunkLayer {
  readonly layer = new Layer({ listening: false });
  private readonly underlay = new Underlay();
  private readonly queue = new RasterQueue();
  private current: Generation | null = null;
  private former: Generation | null = null;
  private scene: Scene | null = null;
  private view: Viewport | null = null;
  private size: SizePx = { width: 0, height: 0 };
  private focus: PointPx = { x: 0, y: 0 };
  private seen: readonly Seen[] = [];

  constructor(private readonly ratio: number) {
    this.layer.getCanvas().setPixelRatio(ratio);
    this.layer.add(this.underlay.group);
  }

  /** Chunks still to be drawn before the view is sharp. */
  get waiting(): number {
    return this.queue.size;
  }

  /** Another layout, wood or way of drawing: everything is drawn anew, the old picture stays until then. */
  setScene(scene: Scene): void {
    const resized = this.scene?.drawing !== scene.drawing;
    this.scene = scene;
    this.underlay.draw(scene);
    if (resized) this.forget();
    this.startGeneration();
  }

  /** Tiles were laid: their chunks wait to be drawn again, keeping their old bitmap until then. */
  repaint(scene: Scene, positions: Iterable<number>): void {
    this.scene = scene;
    this.underlay.draw(scene);
    const { current } = this;
    if (!current) return;
    for (const position of positions) {
      for (const chunk of chunksTouchedBy(current.raster.chunks, position)) this.request(chunk);
    }
  }

  /** True when a chunk on which the tile shows still waits to be drawn. */
  isStale(position: number): boolean {
    if (!this.current) return true;
    for (const chunk of chunksTouchedBy(this.current.raster.chunks, position)) {
      if (this.queue.has(chunk)) return true;
    }
    return false;
  }

  /** Where the window looks; the focus is drawn first. */
  setView(view: Viewport, size: SizePx, focus: PointPx): void {
    this.view = view;
    this.size = size;
    this.focus = focus;
    this.place();
  }

  /** The scale has come to rest: draw for it. */
  sharpen(): void {
    const { view, current } = this;
    if (view && current?.raster.scale.pxPerMm !== view.pxPerMm) this.startGeneration();
  }

  /** Draws waiting chunks for about so many milliseconds; true when the picture has changed. */
  work(budgetMs: number): boolean {
    const { current, scene } = this;
    if (!current || !scene || this.queue.size === 0) return false;
    const drawn = this.queue.work(
      budgetMs,
      (chunk) => {
        const bitmap = drawChunk(current.raster, scene, chunk, current.bitmaps.get(chunk));
        current.bitmaps.set(chunk, bitmap);
      },
      () => performance.now(),
    );
    if (this.queue.size === 0) this.dropFormer();
    this.place();
    return drawn.length > 0;
  }

  private startGeneration(): void {
    const { scene, view } = this;
    if (!scene || !view) return;
    this.keepOnePicture();
    this.queue.clear();
    const group = new Group({ listening: false });
    this.layer.add(group);
    const raster = chunkRaster(scene.drawing, { pxPerMm: view.pxPerMm, ratio: this.ratio });
    this.current = { raster, group, bitmaps: new Map(), images: new Map() };
    this.place();
  }

  /** Of two pictures the whole one stays behind the next: an unfinished one only when there is no other. */
  private keepOnePicture(): void {
    if (this.former && this.queue.size > 0) {
      this.current?.group.destroy();
    } else {
      this.dropFormer();
      this.former = this.current;
    }
  }

  private forget(): void {
    this.dropFormer();
    this.current?.group.destroy();
    this.current = null;
  }

  private dropFormer(): void {
    this.former?.group.destroy();
    this.former = null;
  }

  private request(chunk: number): void {
    const distances = this.seen.filter((s) => s.chunk === chunk).map((s) => s.distance);
    this.queue.push({ key: chunk, distance: Math.min(Number.MAX_VALUE, ...distances) });
  }

  /** Puts what is in view in its place and asks for what is missing. */
  private place(): void {
    const { view, current, former, scene } = this;
    if (!view || !scene) return;
    const turns = turnsInView(view, this.size, scene.drawing.size);
    this.underlay.place(scene.drawing, view, turns);
    if (former) this.placeGeneration(former, view, this.seenOf(former.raster, view, turns));
    if (!current) return;
    this.seen = this.seenOf(current.raster, view, turns);
    this.placeGeneration(current, view, this.seen);
    for (const { chunk } of this.seen) {
      if (!current.bitmaps.has(chunk)) this.request(chunk);
    }
    this.forgetOutOfView(current);
  }

  private seenOf({ boxes, scale }: ChunkRaster, view: Viewport, turns: readonly number[]): Seen[] {
    const seen: Seen[] = [];
    const stretch = view.pxPerMm / scale.pxPerMm / scale.ratio;
    const origin = originOf(view, this.scene, this.ratio);
    for (const turn of turns) {
      const turnX = this.turnOffset(scale.pxPerMm, turn) * scale.ratio;
      boxes.forEach((box, chunk) => {
        const left = origin.x + (box.left + turnX) * stretch;
        const top = origin.y + box.top * stretch;
        const right = left + box.width * stretch;
        const bottom = top + box.height * stretch;
        const inView = right > 0 && left < this.size.width && bottom > 0 && top < this.size.height;
        if (!inView) return;
        const dx = Math.max(left - this.focus.x, 0, this.focus.x - right);
        const dy = Math.max(top - this.focus.y, 0, this.focus.y - bottom);
        seen.push({ chunk, turn, distance: dx * dx + dy * dy });
      });
    }
    return seen;
  }

  /** How far a turn of the shell lies from turn 0, in CSS pixels on whole device pixels. */
  private turnOffset(pxPerMm: number, turn: number): number {
    const around = (this.scene?.drawing.size.circumference ?? 0) * pxPerMm;
    return Math.round(turn * around * this.ratio) / this.ratio;
  }

  private placeGeneration(generation: Generation, view: Viewport, seen: readonly Seen[]): void {
    const { raster, group, bitmaps, images } = generation;
    const stretch = view.pxPerMm / raster.scale.pxPerMm;
    group.setAttrs({ ...originOf(view, this.scene, this.ratio), scaleX: stretch, scaleY: stretch });
    const wanted = new Set<string>();
    for (const { chunk, turn } of seen) {
      const bitmap = bitmaps.get(chunk);
      const box = raster.boxes[chunk];
      if (!bitmap || !box) continue;
      const key = `${chunk} ${turn}`;
      wanted.add(key);
      if (images.has(key)) continue;
      const image = new Image({
        image: bitmap,
        x: box.left / this.ratio + this.turnOffset(raster.scale.pxPerMm, turn),
        y: box.top / this.ratio,
        width: box.width / this.ratio,
        height: box.height / this.ratio,
        listening: false,
        perfectDrawEnabled: false,
      });
      images.set(key, image);
      group.add(image);
    }
    for (const [key, image] of images) {
      if (wanted.has(key)) continue;
      image.destroy();
      images.delete(key);
    }
  }

  private forgetOutOfView({ bitmaps }: Generation): void {
    const inView = new Set(this.seen.map(({ chunk }) => chunk));
    let spare = 0;
    for (const [chunk, bitmap] of [...bitmaps].reverse()) {
      if (inView.has(chunk)) continue;
      spare += bitmap.width * bitmap.height;
      if (spare <= SPARE_PIXELS) continue;
      bitmaps.delete(chunk);
      this.queue.drop(chunk);
    }
  }
}

/** Where the seam and the top of the sheet lie on the screen, on whole device pixels. */
function originOf(view: Viewport, scene: Scene | null, ratio: number): PointPx {
  const height = scene?.drawing.size.height ?? 0;
  return {
    x: Math.round(-view.leftMm * view.pxPerMm * ratio) / ratio,
    y: Math.round((view.topMm - height) * view.pxPerMm * ratio) / ratio,
  };
}
