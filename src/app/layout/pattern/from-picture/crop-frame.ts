import type { ElementRef } from '@angular/core';
import {
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { Announcer } from '../../../platform/announcer';
import { movedCrop, turnedSize, zoomedCrop, type Crop, type Framed, type Point } from './crop';

/** The room round picture and frame, as a share of it. */
const MARGIN = 0.04;
const ZOOM_STEP = 1.06;

interface Box {
  readonly width: number;
  readonly height: number;
}

interface Drag {
  readonly kind: 'move' | 'size';
  readonly from: Point;
  readonly crop: Crop;
}

/** A picture with the frame of the shell over it: dragged, sized at its corners or with the wheel, or by keys. */
@Component({
  selector: 'sl-crop-frame',
  templateUrl: './crop-frame.html',
  styleUrl: './crop-frame.scss',
})
export class CropFrame {
  private readonly announcer = inject(Announcer);
  readonly picture = input.required<Blob>();
  readonly framed = input.required<Framed>();
  readonly crop = input.required<Crop>();
  readonly changed = output<Crop>();

  protected readonly source = signal('');
  private readonly drawing = viewChild.required<ElementRef<SVGSVGElement>>('drawing');
  private readonly held = signal<{ readonly drag: Drag; readonly view: Box } | null>(null);
  private readonly shownSize = signal<Box>({ width: 480, height: 320 });

  protected readonly frame = computed(() => {
    const { x, y, width } = this.crop();
    const height = width / this.framed().aspect;
    return { left: x - width / 2, top: y - height / 2, width, height };
  });
  private readonly wholeView = computed<Box>(() => {
    const picture = turnedSize(this.framed().size, this.crop().turn);
    const { left, top, width, height } = this.frame();
    const reach = (start: number, length: number) =>
      2 * Math.max(Math.abs(start), Math.abs(start + length));
    return {
      width: Math.max(picture.width, reach(left, width)) * (1 + 2 * MARGIN),
      height: Math.max(picture.height, reach(top, height)) * (1 + 2 * MARGIN),
    };
  });
  /** What is seen; it stands still while something is dragged over it. */
  private readonly view = computed(() => this.held()?.view ?? this.wholeView());
  protected readonly viewBox = computed(() => {
    const { width, height } = this.view();
    return `${-width / 2} ${-height / 2} ${width} ${height}`;
  });
  /** Picture pixels a pixel of the screen. */
  protected readonly unit = computed(() => {
    const [view, shown] = [this.view(), this.shownSize()];
    return Math.max(view.width / shown.width, view.height / shown.height);
  });
  protected readonly shade = computed(() => {
    const { width, height } = this.view();
    const { left, top, width: across, height: down } = this.frame();
    // far beyond the view: what lies beside it shows as well
    return (
      `M${-2 * width} ${-2 * height}h${4 * width}v${4 * height}h${-4 * width}z` +
      `M${left} ${top}v${down}h${across}v${-down}z`
    );
  });
  protected readonly corners = computed(() => {
    const { left, top, width, height } = this.frame();
    const [right, bottom] = [left + width, top + height];
    return [
      { x: left, y: top, cursor: 'nwse-resize' },
      { x: right, y: top, cursor: 'nesw-resize' },
      { x: right, y: bottom, cursor: 'nwse-resize' },
      { x: left, y: bottom, cursor: 'nesw-resize' },
    ];
  });

  constructor() {
    effect((onCleanup) => {
      const address = URL.createObjectURL(this.picture());
      this.source.set(address);
      onCleanup(() => URL.revokeObjectURL(address));
    });
    effect((onCleanup) => {
      const element = this.drawing().nativeElement;
      const observer = new ResizeObserver(([entry]) => {
        if (entry && entry.contentRect.width > 0) this.shownSize.set(entry.contentRect);
      });
      observer.observe(element);
      onCleanup(() => observer.disconnect());
    });
  }

  protected grasp(event: PointerEvent, kind: Drag['kind']): void {
    if (event.button !== 0) return;
    event.stopPropagation();
    this.drawing().nativeElement.setPointerCapture(event.pointerId);
    const drag = { kind, from: this.placeOf(event), crop: this.crop() };
    this.held.set({ drag, view: this.view() });
  }

  protected drag(event: PointerEvent): void {
    const drag = this.held()?.drag;
    if (!drag) return;
    const to = this.placeOf(event);
    if (drag.kind === 'move') {
      const by = { x: to.x - drag.from.x, y: to.y - drag.from.y };
      this.changed.emit(movedCrop(drag.crop, by, this.framed()));
    } else {
      const before = distance(drag.from, drag.crop);
      const factor = before === 0 ? 1 : distance(to, drag.crop) / before;
      this.changed.emit(zoomedCrop(drag.crop, factor, this.framed()));
    }
  }

  protected release(): void {
    this.held.set(null);
  }

  protected wheel(event: WheelEvent): void {
    event.preventDefault();
    if (this.held()) return;
    const factor = event.deltaY > 0 ? ZOOM_STEP : 1 / ZOOM_STEP;
    this.changed.emit(zoomedCrop(this.crop(), factor, this.framed()));
  }

  protected press(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const crop = this.keyed(event.key, event.shiftKey ? 0.1 : 0.02);
    if (!crop) return;
    event.preventDefault();
    this.changed.emit(crop);
    this.announcer.speak(this.placeWords(crop));
  }

  private keyed(key: string, step: number): Crop | null {
    const by = step * this.crop().width;
    switch (key) {
      case 'ArrowLeft':
        return movedCrop(this.crop(), { x: -by, y: 0 }, this.framed());
      case 'ArrowRight':
        return movedCrop(this.crop(), { x: by, y: 0 }, this.framed());
      case 'ArrowUp':
        return movedCrop(this.crop(), { x: 0, y: -by }, this.framed());
      case 'ArrowDown':
        return movedCrop(this.crop(), { x: 0, y: by }, this.framed());
      case '+':
      case '=':
        return zoomedCrop(this.crop(), ZOOM_STEP, this.framed());
      case '-':
        return zoomedCrop(this.crop(), 1 / ZOOM_STEP, this.framed());
      default:
        return null;
    }
  }

  private placeWords({ x, y, width, turn }: Crop): string {
    const box = turnedSize(this.framed().size, turn);
    const percent = (share: number) => `${Math.round(100 * share)} %`;
    return (
      `Frame ${percent(width / box.width)} of the picture wide, its middle ` +
      `${percent(0.5 + x / box.width)} from the left and ${percent(0.5 + y / box.height)} from the top.`
    );
  }

  private placeOf(event: PointerEvent): Point {
    const matrix = this.drawing().nativeElement.getScreenCTM();
    return matrix
      ? new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse())
      : { x: 0, y: 0 };
  }
}

function distance(a: Point, b: Point): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}
