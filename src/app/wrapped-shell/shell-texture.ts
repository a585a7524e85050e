/**
 * The unrolled shell painted as a picture that is wrapped round the ring: every tile with its true outline
 * and grain, the seam at both sides. Laying a tile repaints only what its tabs reach, so the ring follows
 * every stroke; the whole is painted again only when sizes, joints or woods change.
 */
import { pathData } from '@exports/svg/path-data';
import { tileOf, type Grid } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import { tileEdges } from '@shared/pieces/tile-edges';
import { edgesKey, nominalTileOutline } from '@shared/pieces/tile-outline';
import type { Millimetres } from '@shared/units/length';
import { grainColour, grainOf } from '../drawing/grain';

/** Wide enough for 40 pixels a tile on a usual shell, small enough for every graphics chip. */
const WIDTH_MOST = 4096;
const HEIGHT_MOST = 4096;
const PIXELS_PER_MM_MOST = 6;
const LINE = 'rgb(30 20 12 / 62%)';

/** What tiles look like; cells are handed over apart, because they change most often. */
export type TextureLayout = Omit<Layout, 'cells'>;

export class ShellTexture {
  readonly canvas: HTMLCanvasElement;
  private readonly pen: CanvasRenderingContext2D;
  private readonly scale: { readonly x: number; readonly y: number };
  private readonly outlines = new Map<string, Path2D>();
  private readonly woods: readonly HTMLCanvasElement[];

  /** Makes the canvas for a layout; `document` creates it. Throws where the browser draws nothing at all. */
  constructor(
    private readonly layout: TextureLayout,
    private readonly document: Document,
  ) {
    const { staves, courses, tileWidth, tileHeight } = layout.shell;
    const [wide, tall] = [staves * tileWidth, courses * tileHeight];
    const width = Math.round(Math.min(WIDTH_MOST, wide * PIXELS_PER_MM_MOST));
    const height = Math.round(Math.min(HEIGHT_MOST, (width * tall) / wide));
    this.scale = { x: width / wide, y: height / tall };
    [this.canvas, this.pen] = this.makeCanvas(width, Math.max(1, height));
    this.woods = layout.woods.map((wood) => this.woodStrip(wood.colour));
  }

  /** Paints every tile. */
  paintAll(cells: Uint8Array): void {
    for (let position = 0; position < cells.length; position++) this.paintTile(cells, position);
  }

  /** Paints some tiles anew, and as much of their neighbours as they share an edge with. */
  paintTiles(cells: Uint8Array, positions: Iterable<number>): void {
    const { staves, courses } = this.layout.shell;
    const touched = new Set<number>();
    for (const position of positions) {
      const { stave, course } = tileOf(this.grid, position);
      touched.add(position);
      touched.add(course * staves + ((stave + 1) % staves));
      touched.add(course * staves + ((stave + staves - 1) % staves));
      if (course > 0) touched.add(position - staves);
      if (course < courses - 1) touched.add(position + staves);
    }
    for (const position of touched) this.paintTile(cells, position);
  }

  private get grid(): Grid {
    return this.layout.shell;
  }

  private paintTile(cells: Uint8Array, position: number): void {
    const { staves, courses, tileWidth } = this.layout.shell;
    const { stave, course } = tileOf(this.grid, position);
    const key = tileEdges(this.layout.joint.scheme, this.grid, stave, course);
    const outline = this.outlineOf(edgesKey(key), stave, course);
    const wood = this.woods[cells[position] ?? 0];
    if (!wood) return;
    const x = (stave + 0.5) * tileWidth;
    const y = (courses - course - 0.5) * this.layout.shell.tileHeight;
    this.paintAt(outline, wood, x, y, stave * 7 + course * 13);
    const wide = staves * tileWidth;
    if (stave === 0) this.paintAt(outline, wood, x + wide, y, course * 13);
    if (stave === staves - 1) this.paintAt(outline, wood, x - wide, y, stave * 7 + course * 13);
  }

  private paintAt(
    outline: Path2D,
    wood: HTMLCanvasElement,
    x: Millimetres,
    y: Millimetres,
    piece: number,
  ): void {
    const { pen, scale } = this;
    const { tileWidth, tileHeight } = this.layout.shell;
    pen.save();
    pen.setTransform(scale.x, 0, 0, scale.y, x * scale.x, y * scale.y);
    pen.save();
    pen.clip(outline);
    // every piece is sawn from another place of the board
    const shift = ((piece * 0.137) % 1) * tileWidth;
    const [left, top] = [-2 * tileWidth + shift, -tileHeight];
    pen.drawImage(wood, left, top, 2 * tileWidth, 2 * tileHeight);
    pen.drawImage(wood, left + 2 * tileWidth, top, 2 * tileWidth, 2 * tileHeight);
    pen.restore();
    pen.strokeStyle = LINE;
    pen.lineWidth = Math.max(0.25, 1.1 / scale.x);
    pen.stroke(outline);
    pen.restore();
  }

  private outlineOf(key: string, stave: number, course: number): Path2D {
    const known = this.outlines.get(key);
    if (known) return known;
    const edges = tileEdges(this.layout.joint.scheme, this.grid, stave, course);
    const { segments } = nominalTileOutline(this.layout, edges);
    const outline = new Path2D(pathData(segments, { flipY: true }));
    this.outlines.set(key, outline);
    return outline;
  }

  private woodStrip(colour: string): HTMLCanvasElement {
    const [canvas, pen] = this.makeCanvas(192, 8);
    pen.fillStyle = colour;
    pen.fillRect(0, 0, canvas.width, canvas.height);
    for (const line of grainOf(colour)) {
      pen.fillStyle = grainColour(line);
      const width = Math.max(1, line.width * canvas.width);
      pen.fillRect(line.at * canvas.width - width / 2, 0, width, canvas.height);
    }
    return canvas;
  }

  private makeCanvas(width: number, height: number): [HTMLCanvasElement, CanvasRenderingContext2D] {
    const canvas = this.document.createElement('canvas');
    [canvas.width, canvas.height] = [width, height];
    const pen = canvas.getContext('2d');
    if (!pen) throw new Error('This browser has no two-dimensional canvas.');
    return [canvas, pen];
  }
}
