/** The whole pattern at one pixel a tile, stretched under the chunks: colours at once, before any chunk is drawn. */
import { Group } from 'konva/lib/Group';
import { Image } from 'konva/lib/shapes/Image';
import type { SheetDrawing } from './sheet-drawing';
import type { Scene } from './tile-painting';
import type { Viewport } from './viewport';

export class Underlay {
  readonly group = new Group({ listening: false });
  private readonly images: Image[] = [];
  private readonly bitmap = document.createElement('canvas');

  /** Draws every tile's colour. */
  draw({ drawing, cells, woods }: Scene): void {
    const { staves, courses } = drawing.grid;
    if (this.bitmap.width !== staves || this.bitmap.height !== courses) {
      this.bitmap.width = staves;
      this.bitmap.height = courses;
    }
    const context = this.bitmap.getContext('2d');
    if (context === null || cells.length === 0) return;
    const colours = woods.map(({ colour }) => Number.parseInt(colour.slice(1), 16));
    const picture = context.createImageData(staves, courses);
    cells.forEach((wood, position) => {
      const colour = colours[wood] ?? 0;
      const row = courses - 1 - Math.floor(position / staves);
      const at = (row * staves + (position % staves)) * 4;
      picture.data[at] = colour >> 16;
      picture.data[at + 1] = (colour >> 8) & 255;
      picture.data[at + 2] = colour & 255;
      picture.data[at + 3] = 255;
    });
    context.putImageData(picture, 0, 0);
  }

  /** One picture a turn in view. */
  place(drawing: SheetDrawing, view: Viewport, turns: readonly number[]): void {
    const { circumference, height } = drawing.size;
    while (this.images.length < turns.length) this.addImage();
    for (const image of this.images.splice(turns.length)) image.destroy();
    turns.forEach((turn, i) => {
      this.images[i]
        ?.x((turn * circumference - view.leftMm) * view.pxPerMm)
        .y((view.topMm - height) * view.pxPerMm)
        .width(circumference * view.pxPerMm)
        .height(height * view.pxPerMm);
    });
  }

  private addImage(): void {
    const image = new Image({ image: this.bitmap, listening: false, perfectDrawEnabled: false });
    this.images.push(image);
    this.group.add(image);
  }
}
