/**
 * Pointer, wheel and touch turned into what they mean on the canvas. One finger, a pen or the left button
 * lays; two fingers, the middle button or the left one while Space is held pan; the wheel pans, with Ctrl
 * (what trackpads send for a pinch) it zooms. Where nothing may be laid, every drag pans.
 */
import type { PointPx } from './viewport';

export interface PointerMeaning {
  hover(point: PointPx | null): void;
  strokeStart(point: PointPx): void;
  /** Every sample since the last call, those between two frames included. */
  strokeMove(points: readonly PointPx[]): void;
  strokeEnd(): void;
  strokeCancel(): void;
  pan(dx: number, dy: number): void;
  zoom(factor: number, about: PointPx): void;
}

export interface PointerRules {
  /** True when the next drag pans instead of laying. */
  readonly pansOnly: () => boolean;
}

type Hand =
  | { readonly kind: 'idle' }
  /** A finger is down and may yet become a tap, a stroke or half of a pinch. */
  | { readonly kind: 'waiting'; readonly pointer: number; readonly at: PointPx }
  | { readonly kind: 'stroke'; readonly pointer: number }
  | { readonly kind: 'pan'; readonly pointer: number; readonly at: PointPx }
  | { readonly kind: 'pinch' };

/** A finger that moves less than this has tapped. */
const TAP_PX = 7;

/** Pixels a line of a wheel that counts in lines (DOM_DELTA_LINE). */
const WHEEL_LINE_PX = 16;

export class PointerInput {
  private hand: Hand = { kind: 'idle' };
  private readonly touches = new Map<number, PointPx>();
  private readonly ended = new AbortController();

  constructor(
    private readonly target: HTMLElement,
    private readonly meaning: PointerMeaning,
    private readonly rules: PointerRules,
  ) {
    const signal = this.ended.signal;
    target.addEventListener('pointerdown', (event) => this.down(event), { signal });
    target.addEventListener('pointermove', (event) => this.move(event), { signal });
    target.addEventListener('pointerup', (event) => this.up(event), { signal });
    target.addEventListener('pointercancel', (event) => this.cancelled(event), { signal });
    target.addEventListener('pointerleave', () => this.meaning.hover(null), { signal });
    target.addEventListener('wheel', (event) => this.wheel(event), { signal, passive: false });
    target.addEventListener('auxclick', (event) => event.preventDefault(), { signal });
  }

  destroy(): void {
    this.ended.abort();
  }

  /** Ends a stroke under the hand without an end of its own: Esc took it back. */
  letGo(): void {
    this.hand = { kind: 'idle' };
  }

  private down(event: PointerEvent): void {
    const at = this.pointOf(event);
    if (event.pointerType === 'touch') {
      this.touches.set(event.pointerId, at);
      if (this.touches.size === 2) {
        this.startPinch();
        return;
      }
      if (this.touches.size > 2) return;
    }
    if (this.hand.kind !== 'idle' || (event.button !== 0 && event.button !== 1)) return;
    this.target.setPointerCapture(event.pointerId);
    if (event.button === 1 || this.rules.pansOnly()) {
      event.preventDefault();
      this.hand = { kind: 'pan', pointer: event.pointerId, at };
    } else if (event.pointerType === 'touch') {
      this.hand = { kind: 'waiting', pointer: event.pointerId, at };
    } else {
      this.startStroke(event.pointerId, at);
    }
  }

  private startStroke(pointer: number, at: PointPx): void {
    this.hand = { kind: 'stroke', pointer };
    this.meaning.strokeStart(at);
  }

  private startPinch(): void {
    if (this.hand.kind === 'stroke') this.meaning.strokeEnd();
    this.hand = { kind: 'pinch' };
  }

  private move(event: PointerEvent): void {
    const at = this.pointOf(event);
    if (event.pointerType !== 'touch') this.meaning.hover(at);
    if (this.hand.kind === 'pinch') {
      this.pinch(event.pointerId, at);
      return;
    }
    if (this.hand.kind === 'idle' || this.hand.pointer !== event.pointerId) return;
    if (this.hand.kind === 'pan') {
      const before = this.hand.at;
      this.hand = { ...this.hand, at };
      this.meaning.pan(at.x - before.x, at.y - before.y);
      return;
    }
    if (this.hand.kind === 'waiting') {
      if (Math.hypot(at.x - this.hand.at.x, at.y - this.hand.at.y) < TAP_PX) return;
      this.startStroke(event.pointerId, this.hand.at);
    }
    const samples = event.getCoalescedEvents();
    this.meaning.strokeMove(samples.length > 0 ? samples.map((s) => this.pointOf(s)) : [at]);
  }

  private pinch(pointer: number, at: PointPx): void {
    const before = this.touches.get(pointer);
    const other = [...this.touches].find(([id]) => id !== pointer)?.[1];
    if (!before) return;
    this.touches.set(pointer, at);
    if (!other) return;
    const spread = Math.hypot(at.x - other.x, at.y - other.y);
    const spreadBefore = Math.hypot(before.x - other.x, before.y - other.y);
    const about = { x: (at.x + other.x) / 2, y: (at.y + other.y) / 2 };
    this.meaning.pan((at.x - before.x) / 2, (at.y - before.y) / 2);
    if (spreadBefore > 0) this.meaning.zoom(spread / spreadBefore, about);
  }

  private up(event: PointerEvent): void {
    this.touches.delete(event.pointerId);
    const { hand } = this;
    if (hand.kind === 'pinch') {
      if (this.touches.size === 0) this.hand = { kind: 'idle' };
      return;
    }
    if (hand.kind === 'idle' || hand.pointer !== event.pointerId) return;
    this.hand = { kind: 'idle' };
    if (hand.kind === 'pan') return;
    if (hand.kind === 'waiting') this.meaning.strokeStart(hand.at);
    this.meaning.strokeEnd();
  }

  private cancelled(event: PointerEvent): void {
    this.touches.delete(event.pointerId);
    if (this.hand.kind === 'stroke' && this.hand.pointer === event.pointerId) {
      this.meaning.strokeCancel();
    }
    if (this.hand.kind !== 'pinch' || this.touches.size === 0) this.hand = { kind: 'idle' };
  }

  private wheel(event: WheelEvent): void {
    event.preventDefault();
    const unit = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? WHEEL_LINE_PX : 1;
    const dx = event.deltaX * unit;
    const dy = event.deltaY * unit;
    if (event.ctrlKey || event.metaKey) {
      this.meaning.zoom(Math.exp(-Math.max(-60, Math.min(60, dy)) * 0.01), this.pointOf(event));
    } else if (event.shiftKey && dx === 0) {
      this.meaning.pan(-dy, 0);
    } else {
      this.meaning.pan(-dx, -dy);
    }
  }

  private pointOf(event: MouseEvent): PointPx {
    const box = this.target.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  }
}
