/** Reads a layout's event stream from a listening server, as a browser's EventSource does. */
import { createServer, get, type ClientRequest, type IncomingMessage } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import type { Browser } from './browser';

export interface StreamEvent {
  readonly event: string;
  readonly id: string | null;
  readonly data: unknown;
}

export interface Listening {
  readonly port: number;
  readonly close: () => Promise<void>;
}

/** The app behind a real port: supertest waits for a response's end, and a stream has none. */
export async function listening(app: Express): Promise<Listening> {
  const server = createServer(app);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    port: (server.address() as AddressInfo).port,
    close: () =>
      new Promise((resolve) => {
        server.closeAllConnections();
        server.close(() => resolve());
      }),
  };
}

export class EventStream {
  readonly events: StreamEvent[] = [];
  status = 0;
  contentType = '';
  ended = false;
  private readonly request: ClientRequest;
  private waiting: (() => void)[] = [];
  private rest = '';

  constructor(
    browser: Browser,
    port: number,
    path: string,
    headers: Readonly<Record<string, string>> = {},
  ) {
    const cookie = [...browser.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
    const options = { port, path: `/api${path}`, headers: { cookie, ...headers } };
    this.request = get(options, (response) => this.read(response));
    this.request.on('error', () => undefined);
  }

  /** The first event that passes, those already here included. */
  async until(passes: (event: StreamEvent) => boolean): Promise<StreamEvent> {
    for (;;) {
      const found = this.events.find(passes);
      if (found) return found;
      await new Promise<void>((resolve) => this.waiting.push(resolve));
    }
  }

  edits(): StreamEvent[] {
    return this.events.filter(({ event }) => event === 'edit');
  }

  close(): void {
    this.request.destroy();
  }

  private read(response: IncomingMessage): void {
    this.status = response.statusCode ?? 0;
    this.contentType = response.headers['content-type'] ?? '';
    response.setEncoding('utf8');
    response.on('data', (text: string) => {
      const blocks = (this.rest + text).split('\n\n');
      this.rest = blocks.pop() ?? '';
      for (const block of blocks) this.take(block);
      for (const wake of this.waiting.splice(0)) wake();
    });
    response.on('end', () => (this.ended = true));
    response.on('error', () => undefined);
  }

  private take(block: string): void {
    const fields = new Map(
      block.split('\n').map((line) => {
        const colon = line.indexOf(':');
        return [line.slice(0, colon), line.slice(colon + 1).trim()] as const;
      }),
    );
    const [event, data] = [fields.get('event'), fields.get('data')];
    if (event === undefined || data === undefined) return;
    this.events.push({ event, id: fields.get('id') ?? null, data: JSON.parse(data) as unknown });
  }
}
