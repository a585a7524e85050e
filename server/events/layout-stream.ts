import type { Database } from '@drizzle/database';
import type { RecordedEdit } from '@shared/api/layout';
import type { Response } from 'express';
import type { Logger } from 'pino';
import { nextEdits } from '../layouts/layouts-store';
import { peopleAt, removePresence } from './presence-store';

/** A stream lives this long; the browser then connects again, and its session is looked at anew. */
const LIFE_MS = 15 * 60_000;
/** Edits read at once: a browser that has been away long must not bring a whole log into memory. */
const BATCH = 50;
/** What the browser waits before it connects again. */
const RETRY_MS = 1_500;

/** Who watches what, from which tab. */
export interface Watcher {
  readonly layoutId: string;
  readonly personId: string;
  /** The stream ends with the session that opened it. */
  readonly sessionId: string;
  /** The browser tab. */
  readonly connection: string;
  /** The revision the browser has. */
  readonly since: number;
}

/** One browser tab's stream of a layout's edits and people, as text/event-stream. */
export class LayoutStream {
  private sent: number;
  private writing: Promise<void> = Promise.resolve();
  private open = true;
  private readonly life: NodeJS.Timeout;

  constructor(
    private readonly database: Database,
    private readonly response: Response,
    private readonly logger: Logger,
    readonly watcher: Watcher,
  ) {
    const { layoutId, personId, connection } = watcher;
    this.sent = watcher.since;
    response.set({
      'Content-Type': 'text/event-stream; charset=utf-8',
      // no-transform keeps compression, ours or a proxy's, from holding events back
      'Cache-Control': 'no-store, no-transform',
      'X-Accel-Buffering': 'no',
    });
    response.flushHeaders();
    response.write(`retry: ${RETRY_MS}\n\n`);
    this.life = setTimeout(() => this.end(), LIFE_MS);
    this.life.unref();
    response.on('close', () => {
      this.open = false;
      clearTimeout(this.life);
      removePresence(database, layoutId, personId, connection).catch((error: unknown) => {
        // the row is forgotten by itself when nobody renews it
        this.logger.debug({ err: error }, 'presence was not removed');
      });
    });
  }

  /** Calls back once when the browser has gone or the stream was ended. */
  onClosed(callback: () => void): void {
    this.response.on('close', callback);
  }

  /** Sends the edits recorded since the last one sent. */
  tellEdits(): void {
    this.queue(async () => {
      let batch: RecordedEdit[];
      do {
        batch = await nextEdits(this.database, this.watcher.layoutId, this.sent, BATCH);
        for (const edit of batch) {
          this.write('edit', edit, edit.revision);
          this.sent = edit.revision;
        }
      } while (batch.length === BATCH && this.open);
    });
  }

  /** Sends who is here. */
  tellPeople(): void {
    this.queue(async () => {
      this.write('people', { people: await peopleAt(this.database, this.watcher.layoutId) });
    });
  }

  /** A sign of life, so that proxies keep the connection and a dead one is noticed. */
  beat(): void {
    if (this.open) this.response.write(': beat\n\n');
  }

  end(): void {
    if (this.open) this.response.end();
  }

  /** One after another, in order. A failure ends the stream: the browser comes back and misses nothing. */
  private queue(work: () => Promise<void>): void {
    this.writing = this.writing.then(async () => {
      if (!this.open) return;
      try {
        await work();
      } catch (error) {
        this.logger.warn({ err: error }, 'a live stream ended early');
        this.end();
      }
    });
  }

  private write(event: string, data: unknown, id?: number): void {
    if (!this.open) return;
    const head = id === undefined ? '' : `id: ${id}\n`;
    this.response.write(`${head}event: ${event}\ndata: ${JSON.stringify(data)}\n\n`);
  }
}
