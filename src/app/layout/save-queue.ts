/**
 * When the draft is saved: a short pause after the last touch, one request at a time, again with growing
 * pauses while it fails, and at once when the browser comes back online. What a save carries and what its
 * answer means is the draft's business.
 */
import { signal } from '@angular/core';

/** How one attempt ended. */
export type Attempt =
  | { readonly kind: 'done' }
  /** Nothing could be sent: what is unsaved is still under the hand. */
  | { readonly kind: 'not-yet' }
  /** Answered, but it has to be sent again at once: somebody else's edit came first. */
  | { readonly kind: 'again' }
  /** Worth trying again later: no connection, or the server is not ready. */
  | { readonly kind: 'failed'; readonly sentence: string };

export type SaveState =
  | { readonly kind: 'saved' }
  | { readonly kind: 'waiting' }
  | { readonly kind: 'saving' }
  /** `retryAt` is when it is tried again, ms since 1970. */
  | { readonly kind: 'failed'; readonly sentence: string; readonly retryAt: number };

/** What the queue needs of the draft it saves. */
export interface Savable {
  /** True while there is something the server does not have. */
  unsaved(): boolean;
  /** Sends what waits, or the same save again, and digests the answer. */
  attempt(): Promise<Attempt>;
  /** How long after the last touch it is saved, ms. */
  pause(): number;
}

const RETRY_FIRST = 2_000;
const RETRY_MOST = 60_000;

export class SaveQueue {
  private readonly current = signal<SaveState>({ kind: 'saved' });
  private timer: ReturnType<typeof setTimeout> | undefined;
  private failures = 0;
  private running: Promise<void> | null = null;
  /** Somebody waits for everything to be saved: no pauses. */
  private hurried = false;

  readonly state = this.current.asReadonly();

  constructor(private readonly savable: Savable) {}

  /** Something changed: save a second from now unless it changes again. A failed save keeps its own pace. */
  touch(): void {
    if (this.running || this.current().kind === 'failed') return;
    this.wait();
  }

  /** Saves everything now. Resolves when all is saved or an attempt failed: `state` says which. */
  async flush(): Promise<void> {
    this.hurried = true;
    await this.run();
    if (this.savable.unsaved() && this.current().kind !== 'failed') await this.run();
    this.hurried = false;
  }

  /** Tries again now, as when the browser comes back online. */
  retry(): void {
    if (this.current().kind === 'failed') void this.run();
  }

  /** Forgets what was planned, as when the layout is left. */
  stop(): void {
    clearTimeout(this.timer);
  }

  private wait(): void {
    this.current.set({ kind: 'waiting' });
    this.plan(this.savable.pause());
  }

  private plan(delay: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.run(), delay);
  }

  private run(): Promise<void> {
    clearTimeout(this.timer);
    this.running ??= this.saveAll().finally(() => (this.running = null));
    return this.running;
  }

  private async saveAll(): Promise<void> {
    while (this.savable.unsaved()) {
      this.current.set({ kind: 'saving' });
      const attempt = await this.savable.attempt();
      if (attempt.kind === 'failed') {
        this.fail(attempt.sentence);
        return;
      }
      this.failures = 0;
      // asked again at once, a gesture under the hand would keep the page from ever letting go of it
      const calm = attempt.kind === 'not-yet' || (attempt.kind === 'done' && !this.hurried);
      if (calm && this.savable.unsaved()) {
        this.wait();
        return;
      }
    }
    this.current.set({ kind: 'saved' });
  }

  private fail(sentence: string): void {
    const delay = Math.min(RETRY_FIRST * 2 ** this.failures, RETRY_MOST);
    this.failures += 1;
    this.current.set({ kind: 'failed', sentence, retryAt: Date.now() + delay });
    this.plan(delay);
  }
}
