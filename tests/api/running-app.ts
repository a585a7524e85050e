/** The server's app on a fresh database with the demonstration in it, and people to talk to it. */
import { openDatabase, type OpenDatabase } from '@drizzle/database';
import { seedDatabase } from '@seeds/seed';
import { DEMONSTRATION_PASSWORD } from '@seeds/demonstration';
import { createApp } from '@server/app';
import { readConfig, type Config } from '@server/config';
import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { freshDatabase } from '../database';

export interface RunningApp {
  readonly app: Express;
  readonly open: OpenDatabase;
  readonly databaseUrl: string;
  /** A second server process on the same database, as behind a proxy. */
  another(): RunningApp;
  close(): Promise<void>;
}

/** The demonstration on a database of its own. */
export async function runningApp(): Promise<RunningApp> {
  const fresh = await freshDatabase();
  await seedDatabase(fresh.url, { amongOthers: 'leave alone' });
  const running = appOn(fresh.url);
  return {
    ...running,
    close: async () => {
      await running.close();
      await fresh.drop();
    },
  };
}

/** The app on a database that is there already. */
export function appOn(databaseUrl: string): RunningApp {
  const config = testConfig(databaseUrl);
  const open = openDatabase(databaseUrl, { connections: 5, onConnectionLost: () => undefined });
  const others: RunningApp[] = [];
  return {
    app: createApp({ config, open, logger: pino({ level: 'silent' }) }),
    open,
    databaseUrl,
    another: () => {
      const other = appOn(databaseUrl);
      others.push(other);
      return other;
    },
    close: async () => {
      await Promise.all(others.map((other) => other.close()));
      await open.close();
    },
  };
}

function testConfig(databaseUrl: string): Config {
  const read = readConfig({
    NODE_ENV: 'test',
    DATABASE_URL: databaseUrl,
    SESSION_SECRET: 'only for tests, and long enough to pass',
    TRUST_PROXY: '1',
    LOG_LEVEL: 'silent',
    APP_FOLDER: 'tests/api/fixtures/app',
  });
  if (!read.ok) throw new Error(read.sentence);
  return read.config;
}

export const EMAILS = {
  owner: 'runa@quarrylane.example',
  designerAndMaker: 'ines@quarrylane.example',
  designer: 'bela@quarrylane.example',
  maker: 'tomas@quarrylane.example',
  client: 'harriet@harbourtrust.example',
  elsewhere: 'jonah@saltmarsh.example',
} as const;
export type Somebody = keyof typeof EMAILS;

/** A browser: keeps cookies, and sends the token back as Angular's HttpClient does. */
export class Browser {
  private readonly agent: ReturnType<typeof request.agent>;
  token = '';
  /** Every Set-Cookie seen, newest last. */
  readonly cookies = new Map<string, string>();

  constructor({ app }: Pick<RunningApp, 'app'>) {
    this.agent = request.agent(app);
  }

  /** The same cookies at another server process. */
  at({ app }: Pick<RunningApp, 'app'>): Browser {
    const twin = new Browser({ app });
    for (const [name, value] of this.cookies) {
      twin.cookies.set(name, value);
      twin.agent.jar.setCookie(`${name}=${value}; path=/`, '127.0.0.1', '/');
    }
    twin.token = this.token;
    return twin;
  }

  get(path: string) {
    return this.read(this.agent.get(`/api${path}`));
  }

  async send(method: 'post' | 'patch' | 'delete', path: string, body?: unknown) {
    const sent = this.agent[method](`/api${path}`).set('X-XSRF-TOKEN', this.token);
    return this.read(body === undefined ? sent : sent.send(body as object));
  }

  post(path: string, body?: unknown) {
    return this.send('post', path, body);
  }

  patch(path: string, body?: unknown) {
    return this.send('patch', path, body);
  }

  delete(path: string) {
    return this.send('delete', path);
  }

  private async read(sent: request.Test): Promise<request.Response> {
    const response = await sent;
    const set = (response.headers as Record<string, unknown>)['set-cookie'];
    for (const line of Array.isArray(set) ? (set as string[]) : []) {
      const [, name, value] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
      if (name) this.cookies.set(name, value ?? '');
    }
    this.token = this.cookies.get('XSRF-TOKEN') ?? this.token;
    return response;
  }
}

/** Somebody's browser after signing in. */
export async function signedIn(
  running: Pick<RunningApp, 'app'>,
  somebody: Somebody,
): Promise<Browser> {
  const browser = new Browser(running);
  await browser.get('/session');
  const email = EMAILS[somebody];
  const answer = await browser.post('/session', { email, password: DEMONSTRATION_PASSWORD });
  if (answer.status !== 200) throw new Error(`${email} could not sign in: ${answer.text}`);
  return browser;
}
