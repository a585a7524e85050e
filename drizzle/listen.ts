import { Client } from 'pg';

export interface ListenOptions {
  readonly channels: readonly string[];
  /** A notice came in; the payload is what the sender wrote. */
  readonly onNotice: (channel: string, payload: string) => void;
  /** Listening (again): notices may have been missed before. */
  readonly onListening: () => void;
  readonly onLost: (error: Error) => void;
}

const RETRY_MS = 1_000;

/**
 * Listens to PostgreSQL's notices on a connection of its own (a pool would hand it to others), and again
 * after a second whenever that connection breaks.
 */
export class DatabaseListener {
  private client: Client | null = null;
  private retry: NodeJS.Timeout | undefined;
  private closed = false;

  constructor(
    private readonly databaseUrl: string,
    private readonly options: ListenOptions,
  ) {
    void this.connect();
  }

  async close(): Promise<void> {
    this.closed = true;
    clearTimeout(this.retry);
    await this.client?.end().catch(() => undefined);
  }

  private async connect(): Promise<void> {
    const client = new Client({
      connectionString: this.databaseUrl,
      connectionTimeoutMillis: 3_000,
      keepAlive: true,
    });
    this.client = client;
    client.on('error', (error) => this.lost(client, error));
    client.on('end', () => this.lost(client, new Error('the connection ended')));
    client.on('notification', ({ channel, payload }) =>
      this.options.onNotice(channel, payload ?? ''),
    );
    try {
      await client.connect();
      for (const channel of this.options.channels) {
        await client.query(`LISTEN ${client.escapeIdentifier(channel)}`);
      }
      this.options.onListening();
    } catch (error) {
      await client.end().catch(() => undefined);
      this.lost(client, error as Error);
    }
  }

  /** Once a connection, however many ways it breaks. */
  private lost(client: Client, error: Error): void {
    if (this.client !== client) return;
    this.client = null;
    if (this.closed) return;
    this.options.onLost(error);
    this.retry = setTimeout(() => void this.connect(), RETRY_MS);
  }
}
