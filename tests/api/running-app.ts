/** The server's app on a fresh database with the demonstration in it. */
import { openDatabase, type OpenDatabase } from '@drizzle/database';
import { seedDatabase } from '@seeds/seed';
import { createApp } from '@server/app';
import { LiveLayouts } from '@server/events/live-layouts';
import { readConfig, type Config } from '@server/config';
import type { Express } from 'express';
import { pino } from 'pino';
import { freshDatabase } from '../database';

export interface RunningApp {
  readonly app: Express;
  readonly open: OpenDatabase;
  readonly databaseUrl: string;
  readonly close: () => Promise<void>;
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

/** The app on a database that is there already: what one server process of several is. */
export function appOn(databaseUrl: string): RunningApp {
  const config = testConfig(databaseUrl);
  const open = openDatabase(databaseUrl, { connections: 5, onConnectionLost: () => undefined });
  const logger = pino({ level: 'silent' });
  const live = new LiveLayouts(open, databaseUrl, logger);
  const app = createApp({ config, open, logger, live });
  return {
    app,
    open,
    databaseUrl,
    close: async () => {
      await live.close();
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
