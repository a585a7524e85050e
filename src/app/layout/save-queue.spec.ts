import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { SaveQueue, type Attempt, type Savable } from './save-queue';

/** Something to save, whose attempts end as the test says; "done" when nothing is said. */
class Desk implements Savable {
  pending = 0;
  sent: number[] = [];
  private readonly endings: Attempt[] = [];

  constructor(...endings: Attempt[]) {
    this.endings = endings;
  }

  unsaved(): boolean {
    return this.pending > 0;
  }

  pause(): number {
    return 1_000;
  }

  async attempt(): Promise<Attempt> {
    this.sent.push(Date.now());
    const taken = this.pending;
    await new Promise((resolve) => setTimeout(resolve, 100));
    const ending = this.endings.shift() ?? { kind: 'done' };
    if (ending.kind === 'done') this.pending -= taken;
    return ending;
  }
}

const FAILED: Attempt = { kind: 'failed', sentence: 'The server does not answer.' };

beforeEach(() => vi.useFakeTimers({ now: 0 }));
afterEach(() => vi.useRealTimers());

function touch(desk: Desk, queue: SaveQueue): void {
  desk.pending += 1;
  queue.touch();
}

test('a save goes out one second after the last touch', async () => {
  const desk = new Desk();
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(900);
  touch(desk, queue);
  expect(queue.state().kind).toBe('waiting');
  await vi.advanceTimersByTimeAsync(2_000);
  expect(desk.sent).toEqual([1_900]);
  expect(queue.state().kind).toBe('saved');
});

test('a touch during a save waits for its own second, with one request at a time', async () => {
  const desk = new Desk();
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(1_050);
  expect(queue.state().kind).toBe('saving');
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(100);
  expect(queue.state().kind).toBe('waiting');
  await vi.advanceTimersByTimeAsync(2_000);
  expect(desk.sent).toEqual([1_000, 2_100]);
  expect(queue.state().kind).toBe('saved');
});

test('a save that met somebody else’s edit goes out again at once', async () => {
  const desk = new Desk({ kind: 'again' });
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(1_300);
  expect(desk.sent).toEqual([1_000, 1_100]);
});

test('a failed save is said and tried again with growing pauses', async () => {
  const desk = new Desk(FAILED, FAILED);
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(1_100);
  expect(queue.state()).toEqual({
    kind: 'failed',
    sentence: 'The server does not answer.',
    retryAt: 3_100,
  });
  touch(desk, queue);
  expect(queue.state().kind).toBe('failed');
  await vi.advanceTimersByTimeAsync(10_000);
  expect(desk.sent).toEqual([1_000, 3_100, 7_200]);
  expect(queue.state().kind).toBe('saved');
});

test('coming back online tries a failed save at once', async () => {
  const desk = new Desk(FAILED);
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(1_200);
  queue.retry();
  await vi.advanceTimersByTimeAsync(200);
  expect(desk.sent).toEqual([1_000, 1_200]);
  expect(queue.state().kind).toBe('saved');
});

test('flushing saves what waits and what came meanwhile, without pauses', async () => {
  const desk = new Desk();
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  let flushed = false;
  void queue.flush().then(() => (flushed = true));
  touch(desk, queue);
  await vi.advanceTimersByTimeAsync(250);
  expect(flushed).toBe(true);
  expect(desk.sent).toEqual([0, 100]);
  expect(queue.state().kind).toBe('saved');
});

test('flushing ends when a save fails', async () => {
  const desk = new Desk(FAILED);
  const queue = new SaveQueue(desk);
  touch(desk, queue);
  let flushed = false;
  void queue.flush().then(() => (flushed = true));
  await vi.advanceTimersByTimeAsync(150);
  expect(flushed).toBe(true);
  expect(queue.state().kind).toBe('failed');
  queue.stop();
});

test('hurrying while a gesture is still under the hand gives the page back, and saves after it', async () => {
  const desk = new Desk({ kind: 'not-yet' }, { kind: 'not-yet' });
  const queue = new SaveQueue(desk);
  desk.pending = 1;
  let ended = false;
  void queue.flush().then(() => (ended = true));
  await vi.advanceTimersByTimeAsync(300);
  expect(ended).toBe(true);
  expect(queue.state().kind).toBe('waiting');
  await vi.advanceTimersByTimeAsync(3_000);
  expect(queue.state().kind).toBe('saved');
});
