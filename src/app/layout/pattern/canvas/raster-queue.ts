/**
 * Chunks waiting to be drawn. They are taken nearest first, a few milliseconds' worth a frame, so that a
 * large sheet fills in from where the pointer is without making any frame late.
 */

export interface RasterJob {
  /** Names the job; pushing it again only moves it. */
  readonly key: number;
  /** Least first. */
  readonly distance: number;
}

export class RasterQueue {
  private readonly waiting = new Map<number, number>();

  get size(): number {
    return this.waiting.size;
  }

  has(key: number): boolean {
    return this.waiting.has(key);
  }

  push(job: RasterJob): void {
    this.waiting.set(job.key, job.distance);
  }

  drop(key: number): void {
    this.waiting.delete(key);
  }

  clear(): void {
    this.waiting.clear();
  }

  /** Gives every waiting job a new distance, for when the pointer or the view has moved. */
  reorder(distanceOf: (key: number) => number): void {
    for (const key of this.waiting.keys()) this.waiting.set(key, distanceOf(key));
  }

  /**
   * Draws nearest first until `budgetMs` is used up, at least one job; returns the keys drawn. A job that
   * has begun is finished: one may overrun the budget.
   */
  work(budgetMs: number, draw: (key: number) => void, now: () => number): number[] {
    const end = now() + budgetMs;
    const drawn: number[] = [];
    const order = [...this.waiting].sort(([, a], [, b]) => a - b);
    for (const [key] of order) {
      if (drawn.length > 0 && now() >= end) break;
      this.waiting.delete(key);
      draw(key);
      drawn.push(key);
    }
    return drawn;
  }
}
