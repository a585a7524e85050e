import { randomBytes } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { endChild } from '../../../scripts/children.mjs';
import { migrate, seed } from '../../../scripts/database.mjs';
import { freePort } from '../../../scripts/free-port.mjs';
import { startThrowawayPostgres } from '../../../scripts/postgres/throwaway.mjs';
import { projectFolder } from '../../../scripts/project.mjs';
import { startServer } from '../../../scripts/server.mjs';
import { freshDatabase } from '../../database';

export interface RunningProgram {
  /** Where it is served, without a slash at the end. */
  readonly address: string;
  readonly databaseUrl: string;
  end(): Promise<void>;
}

/** A program whose PostgreSQL no other spec uses, so that it can be stopped in the middle. */
export interface ProgramWithPostgres extends RunningProgram {
  stopPostgres(): Promise<void>;
  /** Starts it again at the same address, with what it held. */
  startPostgres(): Promise<void>;
}

/** Serves the built program on a free port, on a seeded database of its own. */
export async function startProgram(): Promise<RunningProgram> {
  const database = await freshDatabase();
  await seed(database.url);
  const server = await serve(database.url);
  return {
    ...server,
    end: async () => {
      await server.end();
      await database.drop();
    },
  };
}

/** A server process that can be ended and started again at the same address, with the sessions it knew. */
export interface ServerBeside {
  readonly address: string;
  stop(): Promise<void>;
  start(): Promise<void>;
}

/** Another server process on the database of a program that runs already. */
export async function startServerBeside(program: RunningProgram): Promise<ServerBeside> {
  const sessionSecret = randomBytes(32).toString('hex');
  let server = await serve(program.databaseUrl, { sessionSecret });
  const { address } = server;
  const port = Number(new URL(address).port);
  return {
    address,
    stop: () => server.end(),
    start: async () => {
      server = await serve(program.databaseUrl, { sessionSecret, port });
    },
  };
}

/** As startProgram, with a PostgreSQL of its own that the spec may stop and start. Takes 2 s longer. */
export async function startProgramWithPostgres(): Promise<ProgramWithPostgres> {
  const postgres = await startThrowawayPostgres();
  await migrate(postgres.url);
  await seed(postgres.url);
  const server = await serve(postgres.url);
  return {
    ...server,
    stopPostgres: () => postgres.interrupt(),
    startPostgres: () => postgres.resume(),
    end: async () => {
      await server.end();
      await postgres.remove();
    },
  };
}

interface ServeOptions {
  readonly sessionSecret?: string;
  /** A free one when not said. */
  readonly port?: number;
}

async function serve(databaseUrl: string, options: ServeOptions = {}): Promise<RunningProgram> {
  const { sessionSecret = randomBytes(32).toString('hex') } = options;
  const logs = join(projectFolder, 'out', 'logs');
  mkdirSync(logs, { recursive: true });
  const port = options.port ?? (await freePort());
  const { child, address } = await startServer({
    port,
    databaseUrl,
    sessionSecret,
    log: join(logs, `server-${process.pid}-${port}.log`),
    environment: { HOST: '127.0.0.1' },
  });
  return { address, databaseUrl, end: () => endChild(child) };
}
