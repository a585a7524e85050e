import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { layStartingPattern } from '@shared/layout/starting-patterns/lay-pattern';
import type { Scatter } from '@shared/layout/starting-patterns/starting-pattern';
import { PatternLaying, type PatternWish } from './pattern-laying';

const grid = { staves: 12, courses: 4 };
const shares = [
  { wood: 0, share: 3 },
  { wood: 1, share: 1 },
];
const scatter = (seed: number): PatternWish => ({
  pattern: { kind: 'scatter', shares, seed } satisfies Scatter,
  grid,
});
const bands: PatternWish = {
  pattern: { kind: 'bands', stripes: [{ wood: 1, width: 1 }] },
  grid,
};

/** Stands for the worker: answers when the test says so. */
class SlowWorker {
  static readonly asked: PatternWish[] = [];
  onmessage: ((event: { data: unknown }) => void) | null = null;
  terminate = vi.fn();

  constructor() {
    answer = () => {
      const wish = SlowWorker.asked.at(-1);
      if (wish) this.onmessage?.({ data: layStartingPattern(wish.pattern, wish.grid) });
    };
  }

  postMessage(wish: PatternWish): void {
    SlowWorker.asked.push(wish);
  }
}
let answer = (): void => undefined;

describe('laying patterns as they are wished', () => {
  beforeEach(() => {
    SlowWorker.asked.length = 0;
    vi.stubGlobal('Worker', SlowWorker);
  });
  afterEach(() => vi.unstubAllGlobals());

  it('lays what is quick at once', () => {
    const laying = new PatternLaying();
    laying.lay(bands);
    expect(laying.busy()).toBe(false);
    expect(laying.laid()?.pattern).toBe(bands.pattern);
  });

  it('is busy with a scatter, and shows the older pattern until it is there', () => {
    const laying = new PatternLaying();
    laying.lay(bands);
    laying.lay(scatter(1));
    expect(laying.busy()).toBe(true);
    expect(laying.laid()?.pattern).toBe(bands.pattern);
    answer();
    expect(laying.busy()).toBe(false);
    expect(laying.laid()?.pattern).toEqual(scatter(1).pattern);
  });

  it('of several wishes made meanwhile works on the newest only', () => {
    const laying = new PatternLaying();
    for (const seed of [1, 2, 3, 4]) laying.lay(scatter(seed));
    answer();
    expect(laying.laid()).toBeNull();
    expect(SlowWorker.asked.map(({ pattern }) => pattern)).toEqual([
      scatter(1).pattern,
      scatter(4).pattern,
    ]);
    answer();
    expect(laying.laid()?.pattern).toEqual(scatter(4).pattern);
  });

  it('forgets a scatter when something quick is wished after it', () => {
    const laying = new PatternLaying();
    laying.lay(scatter(1));
    laying.lay(bands);
    answer();
    expect(laying.laid()?.pattern).toBe(bands.pattern);
    expect(laying.busy()).toBe(false);
  });
});
