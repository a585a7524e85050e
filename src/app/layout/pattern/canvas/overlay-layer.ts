/** The uppermost layer: one shape that paints everything lying over the tiles. */
import { Layer } from 'konva/lib/Layer';
import { Shape } from 'konva/lib/Shape';
import { paintOverlay, type OverlayFrame } from './overlay-painting';

export class OverlayLayer {
  readonly layer = new Layer({ listening: false });
  private frame: OverlayFrame | null = null;

  constructor(private readonly ratio: number) {
    this.layer.getCanvas().setPixelRatio(ratio);
    const marks = new Shape({
      listening: false,
      perfectDrawEnabled: false,
      sceneFunc: () => this.paint(),
    });
    this.layer.add(marks);
  }

  /** Shows another frame when the layer is drawn next. */
  show(frame: OverlayFrame): void {
    this.frame = frame;
  }

  private paint(): void {
    const context = this.layer.getNativeCanvasElement().getContext('2d');
    if (context === null || !this.frame) return;
    context.save();
    context.setTransform(this.ratio, 0, 0, this.ratio, 0, 0);
    paintOverlay(context, this.frame);
    context.restore();
  }
}
