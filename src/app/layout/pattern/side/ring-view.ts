import type { ElementRef } from '@angular/core';
import { Component, computed, input, output, viewChild } from '@angular/core';
import { roundStave } from '@shared/layout/cells';
import type { ViewSpan } from '../canvas/view-span';
import { arcPath, staveAngle, stavesTurned, wedgePath } from './ring-geometry';

const INNER = 62;
const OUTER = 82;
const SPAN_RADIUS = 93;

/** Less than this between press and release is a press on a place, not a turn. */
const CLICK_PX = 4;

interface Drag {
  readonly pointer: number;
  readonly startX: number;
  readonly startY: number;
  readonly x: number;
  readonly y: number;
  readonly moved: boolean;
}

/** The ring seen from above in the woods of its top course, with the staves in view; turns the shell. */
@Component({
  selector: 'sl-ring-view',
  template: `
    <svg
      #ring
      viewBox="-100 -100 200 200"
      role="slider"
      tabindex="0"
      aria-label="Stave in the middle of the window"
      aria-valuemin="1"
      [attr.aria-valuemax]="staves()"
      [attr.aria-valuenow]="middleStave()"
      [attr.aria-valuetext]="words()"
      (keydown)="press($event)"
      (pointerdown)="grab($event)"
      (pointermove)="drag($event)"
      (pointerup)="release($event)"
      (pointercancel)="dragging = null"
    >
      @for (wedge of wedges(); track $index) {
        <path class="wedge" [attr.d]="wedge.path" [attr.fill]="wedge.colour" />
      }
      <line class="seam" x1="0" y1="-58" x2="0" y2="-87" />
      @if (span().whole) {
        <circle class="span" r="93" />
      } @else {
        <path class="span" [attr.d]="spanPath()" />
      }
      <text class="words" y="-2">{{ words() }}</text>
      <text class="hint" y="15">drag to turn</text>
    </svg>
  `,
  styleUrl: './ring-view.scss',
})
export class RingView {
  readonly staves = input.required<number>();
  /** Colours of the top course, stave by stave. */
  readonly colours = input.required<readonly string[]>();
  readonly span = input.required<ViewSpan>();
  /** Where the middle of the window shall be, in staves from the seam. */
  readonly turned = output<number>();

  private readonly ring = viewChild.required<ElementRef<SVGSVGElement>>('ring');
  protected dragging: Drag | null = null;

  protected readonly wedges = computed(() =>
    this.colours().map((colour, stave) => ({
      colour,
      path: wedgePath(
        staveAngle(stave, this.staves()),
        staveAngle(stave + 1, this.staves()),
        INNER,
        OUTER,
      ),
    })),
  );
  protected readonly spanPath = computed(() => {
    const { from, width } = this.span();
    const staves = this.staves();
    return arcPath(staveAngle(from, staves), staveAngle(from + width, staves), SPAN_RADIUS);
  });
  private readonly middle = computed(() => this.span().from + this.span().width / 2);
  protected readonly middleStave = computed(
    () => roundStave({ staves: this.staves(), courses: 1 }, Math.floor(this.middle())) + 1,
  );
  protected readonly words = computed(() => {
    const { first, last, whole } = this.span();
    if (whole) return `all ${this.staves()} staves`;
    return first === last ? `stave ${first}` : `staves ${first}–${last}`;
  });

  protected press(event: KeyboardEvent): void {
    const eighth = Math.max(1, Math.round(this.staves() / 8));
    const steps: Partial<Record<string, number>> = {
      ArrowRight: 1,
      ArrowUp: 1,
      ArrowLeft: -1,
      ArrowDown: -1,
      PageUp: eighth,
      PageDown: -eighth,
    };
    const step = event.key === 'Home' ? 0.5 - this.middle() : steps[event.key];
    if (step === undefined) return;
    event.preventDefault();
    this.turned.emit(this.middle() + step);
  }

  protected grab(event: PointerEvent): void {
    this.ring().nativeElement.setPointerCapture(event.pointerId);
    const { clientX: x, clientY: y, pointerId: pointer } = event;
    this.dragging = { pointer, startX: x, startY: y, x, y, moved: false };
  }

  protected drag(event: PointerEvent): void {
    const { dragging } = this;
    if (dragging?.pointer !== event.pointerId) return;
    const { clientX: x, clientY: y } = event;
    const far = Math.hypot(x - dragging.startX, y - dragging.startY) > CLICK_PX;
    if (!dragging.moved && !far) return;
    this.dragging = { ...dragging, x, y, moved: true };
    const by = stavesTurned(this.fromCentre(dragging.x, dragging.y), this.fromCentre(x, y));
    this.turned.emit(this.middle() + by * this.staves());
  }

  protected release(event: PointerEvent): void {
    const { dragging } = this;
    this.dragging = null;
    if (dragging?.pointer !== event.pointerId || dragging.moved) return;
    const top = { x: 0, y: -1 };
    const at = stavesTurned(top, this.fromCentre(event.clientX, event.clientY));
    this.turned.emit(at * this.staves());
  }

  private fromCentre(x: number, y: number): { x: number; y: number } {
    const box = this.ring().nativeElement.getBoundingClientRect();
    return { x: x - box.left - box.width / 2, y: y - box.top - box.height / 2 };
  }
}
