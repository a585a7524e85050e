/**
 * The worker that lays pictures, one wish at a time: while it works only the newest wish waits, so a slider
 * that is dragged never leaves a queue behind.
 */
import { signal } from '@angular/core';
import type { PatternWish } from './picture-pattern';
import type { WorkerAnswer, WorkerRequest } from './picture.worker';
import type { PicturePixels } from './tile-colours';

export class PictureLaying {
  private readonly worker = new Worker(new URL('./picture.worker', import.meta.url), {
    type: 'module',
  });
  private readonly newest = signal<Uint8Array | null>(null);
  private readonly working = signal(false);
  private readonly broken = signal(false);
  private waiting: PatternWish | null = null;

  /** The pattern of the newest wish that was met; null before there is one. */
  readonly pattern = this.newest.asReadonly();
  /** True while `pattern` is not yet that of the last wish. */
  readonly busy = this.working.asReadonly();
  /** True when the worker could not be loaded. */
  readonly failed = this.broken.asReadonly();

  constructor() {
    this.worker.addEventListener('message', ({ data }: MessageEvent<WorkerAnswer>) => {
      this.newest.set(data.pattern);
      const next = this.waiting;
      this.waiting = null;
      if (next) this.send({ kind: 'wish', wish: next });
      else this.working.set(false);
    });
    this.worker.addEventListener('error', () => this.broken.set(true));
  }

  /** Takes another picture; the wish that follows is the first on it. */
  show(pixels: PicturePixels): void {
    this.send({ kind: 'picture', pixels });
  }

  wish(wish: PatternWish): void {
    if (this.working()) {
      this.waiting = wish;
      return;
    }
    this.working.set(true);
    this.send({ kind: 'wish', wish });
  }

  end(): void {
    this.worker.terminate();
  }

  private send(request: WorkerRequest): void {
    this.worker.postMessage(request);
  }
}
