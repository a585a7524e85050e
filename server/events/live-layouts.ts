/**
 * Live layouts: each open browser tab holds one stream. Notices from PostgreSQL only say which layout
 * changed; every stream then reads what it has not sent yet from the log of edits, so nothing is lost or
 * sent twice whatever happens to connections, processes or notices on the way. Cost: one query a stream for
 * each edit, which suits a workshop, not a crowd.
 */
import type { OpenDatabase } from '@drizzle/database';
import { DatabaseListener } from '@drizzle/listen';
import type { Logger } from 'pino';
import { openSessions } from '../accounts/sessions-store';
import type { LayoutStream } from './layout-stream';
import { renewPresence } from './presence-store';

/** How often signs of life are sent, presence renewed and sessions looked at. */
const RENEW_MS = 8_000;

/** The streams of this process, fed by the notices of the database. */
export class LiveLayouts {
  private readonly streams = new Map<string, Set<LayoutStream>>();
  private readonly listener: DatabaseListener;
  private readonly renewing: NodeJS.Timeout;

  constructor(
    private readonly open: OpenDatabase,
    databaseUrl: string,
    private readonly logger: Logger,
  ) {
    this.listener = new DatabaseListener(databaseUrl, {
      channels: ['layout_edited', 'layout_people'],
      onNotice: (channel, layoutId) => this.notice(channel, layoutId),
      onListening: () => this.catchUp(),
      onLost: (error) => logger.warn({ err: error }, 'not listening to the database'),
    });
    this.renewing = setInterval(() => void this.renew(), RENEW_MS);
    this.renewing.unref();
  }

  /** Takes a stream in until its browser goes. */
  add(stream: LayoutStream): void {
    const { layoutId } = stream.watcher;
    const beside = this.streams.get(layoutId) ?? new Set<LayoutStream>();
    this.streams.set(layoutId, beside.add(stream));
    stream.onClosed(() => {
      beside.delete(stream);
      if (beside.size === 0) this.streams.delete(layoutId);
    });
    stream.tellEdits();
    stream.tellPeople();
  }

  /** Ends every stream; browsers come back to another process. */
  async close(): Promise<void> {
    clearInterval(this.renewing);
    for (const stream of this.all()) stream.end();
    await this.listener.close();
  }

  private notice(channel: string, layoutId: string): void {
    for (const stream of this.streams.get(layoutId) ?? []) {
      if (channel === 'layout_edited') stream.tellEdits();
      else stream.tellPeople();
    }
  }

  private catchUp(): void {
    for (const stream of this.all()) {
      stream.tellEdits();
      stream.tellPeople();
    }
  }

  private async renew(): Promise<void> {
    const open = this.all();
    for (const stream of open) stream.beat();
    try {
      await renewPresence(
        this.open.database,
        open.map(({ watcher }) => watcher.connection),
      );
      await this.endWithSessions(open);
    } catch (error) {
      this.logger.warn({ err: error }, 'presence was not renewed');
    }
  }

  /** Whoever has signed out, here or at another process, sees no more of the layout. */
  private async endWithSessions(streams: readonly LayoutStream[]): Promise<void> {
    const ids = new Set(streams.map(({ watcher }) => watcher.sessionId));
    const open = await openSessions(this.open.database, [...ids]);
    for (const stream of streams) {
      if (!open.has(stream.watcher.sessionId)) stream.end();
    }
  }

  private all(): LayoutStream[] {
    return [...this.streams.values()].flatMap((streams) => [...streams]);
  }
}
