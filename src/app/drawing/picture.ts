import {
  afterNextRender,
  Component,
  computed,
  DestroyRef,
  effect,
  type ElementRef,
  inject,
  input,
  signal,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import { SVG, type Svg } from '@svgdotjs/svg.js';
import { paintPicture } from './paint-picture';
import type { Picture, PixelSize } from './picture-model';

/** Makes the picture for a size in pixels. */
export type PictureMaker = (size: PixelSize) => Picture;

/** A live drawing: fills its box, and is drawn anew when the box or what it shows changes. */
@Component({
  selector: 'sl-picture',
  template: `
    <h2 class="over">{{ picture()?.caption }}</h2>
    <div
      #sheet
      class="sheet"
      role="img"
      [style.height.px]="height()"
      [attr.aria-label]="picture()?.title"
    ></div>
  `,
  styleUrl: './picture.scss',
  // svg.js makes the elements, so the styles cannot be tied to the template.
  encapsulation: ViewEncapsulation.None,
})
export class PictureView {
  private readonly sheet = viewChild.required<ElementRef<HTMLElement>>('sheet');
  private readonly destroyed = inject(DestroyRef);
  private readonly size = signal<PixelSize | null>(null);
  private svg: Svg | null = null;

  readonly maker = input.required<PictureMaker>();
  /** Height of the drawing in pixels; null when the box it stands in gives it. */
  readonly height = input<number | null>(null);

  protected readonly picture = computed(() => {
    const size = this.size();
    return size && this.maker()(size);
  });

  constructor() {
    afterNextRender(() => this.watch(this.sheet().nativeElement));
    effect(() => {
      const [picture, size] = [this.picture(), this.size()];
      if (!picture || !size) return;
      this.svg ??= this.drawingOn(this.sheet().nativeElement);
      paintPicture(this.svg, picture, size);
    });
  }

  private watch(element: HTMLElement): void {
    const observer = new ResizeObserver(() => {
      const { clientWidth: width, clientHeight: height } = element;
      if (width > 0 && height > 0) this.size.set({ width, height });
    });
    observer.observe(element);
    this.destroyed.onDestroy(() => observer.disconnect());
  }

  /** The drawing itself is hidden from screen readers: the sheet's label says what it shows. */
  private drawingOn(element: HTMLElement): Svg {
    return SVG().addTo(element).attr({ 'aria-hidden': 'true', focusable: 'false' });
  }
}
