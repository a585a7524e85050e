import { describe, expect, it } from 'vitest';
import { RasterQueue } from './raster-queue';

function queueOf(...distances: number[]): RasterQueue {
  const queue = new RasterQueue();
  distances.forEach((distance, key) => queue.push({ key, distance }));
  return queue;
}

/** A clock that runs only while something is drawn. */
function clock(): { now: () => number; spend: (ms: number) => void } {
  let time = 0;
  return { now: () => time, spend: (ms) => (time += ms) };
}

describe('chunks waiting to be drawn', () => {
  it('are drawn nearest the pointer first', () => {
    const { now, spend } = clock();
    expect(queueOf(30, 10, 20).work(100, () => spend(1), now)).toEqual([1, 2, 0]);
  });

  it('stop when the milliseconds of a frame are used up and go on in the next', () => {
    const { now, spend } = clock();
    const queue = queueOf(1, 2, 3, 4, 5);
    expect(queue.work(4, () => spend(2), now)).toEqual([0, 1]);
    expect(queue.size).toBe(3);
    expect(queue.work(4, () => spend(2), now)).toEqual([2, 3]);
  });

  it('draw one at least, however slow it is', () => {
    const { now, spend } = clock();
    expect(queueOf(1, 2).work(4, () => spend(50), now)).toEqual([0]);
  });

  it('wait once each, and follow the pointer', () => {
    const { now } = clock();
    const queue = queueOf(1, 2, 3);
    queue.push({ key: 0, distance: 9 });
    expect(queue.size).toBe(3);
    queue.reorder((key) => -key);
    expect(queue.work(100, () => undefined, now)).toEqual([2, 1, 0]);
  });
});
