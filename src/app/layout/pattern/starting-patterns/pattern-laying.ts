import { computed, signal } from '@angular/core';
import type { Grid } from '@shared/layout/cells';
import { layStartingPattern } from '@shared/layout/starting-patterns/lay-pattern';
import type {
  LaidPattern,
  StartingPattern,
} from '@shared/layout/starting-patterns/starting-pattern';

export interface PatternWish {
  readonly pattern: StartingPattern;
  readonly grid: Grid;
}

/** A wish with what came of it. */
export interface PatternLaid extends PatternWish {
  readonly laid: LaidPattern;
}

/**
 * Lays wished patterns, the last one wished in the end. What takes long goes to a worker; while it works only
 * the newest wish waits.
 */
export class PatternLaying {
  private readonly result = signal<PatternLaid | null>(null);
  private readonly working = signal<PatternWish | null>(null);
  private waiting: PatternWish | null = null;
  private worker: Worker | null = null;

  /** The last pattern laid; an older one stays while a newer one is worked on. */
  readonly laid = this.result.asReadonly();
  /** True while what `laid` shows is not what was wished last. */
  readonly busy = computed(() => this.working() !== null);

  lay(wish: PatternWish): void {
    if (this.working()) {
      this.waiting = wish;
    } else if (wish.pattern.kind === 'scatter') {
      this.send(wish);
    } else {
      this.result.set({ ...wish, laid: layStartingPattern(wish.pattern, wish.grid) });
    }
  }

  stop(): void {
    this.worker?.terminate();
    this.worker = null;
  }

  private send(wish: PatternWish): void {
    this.working.set(wish);
    this.worker ??= this.startWorker();
    this.worker.postMessage(wish);
  }

  private startWorker(): Worker {
    const worker = new Worker(new URL('./lay-pattern.worker', import.meta.url), { type: 'module' });
    worker.onmessage = ({ data }: MessageEvent<LaidPattern>) => this.take(data);
    return worker;
  }

  private take(laid: LaidPattern): void {
    const wish = this.working();
    const next = this.waiting;
    this.waiting = null;
    this.working.set(null);
    if (next) this.lay(next);
    else if (wish) this.result.set({ ...wish, laid });
  }
}
