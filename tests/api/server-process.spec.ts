/** The server as a process of its own: how it starts, refuses to start, and ends. */
import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { freshDatabase, type FreshDatabase } from '../database';

let fresh: FreshDatabase;
const children: ChildProcess[] = [];
beforeAll(async () => {
  fresh = await freshDatabase();
});
afterAll(async () => {
  for (const child of children) child.kill('SIGKILL');
  await fresh.drop();
});

const SECRET = 'only for tests, and long enough to pass';

function start(environment: Record<string, string>): ChildProcess {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    env: { PATH: process.env['PATH'], PORT: '0', NODE_ENV: 'test', ...environment },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  children.push(child);
  return child;
}

/** The address in the log line that says it listens. */
async function addressOf(child: ChildProcess): Promise<string> {
  let text = '';
  for await (const chunk of child.stdout ?? []) {
    text += String(chunk);
    const [, address] = /"url":"([^"]+)"/.exec(text) ?? [];
    if (address !== undefined) return address;
  }
  throw new Error(`it does not listen: ${text}`);
}

async function ended(child: ChildProcess): Promise<number | null> {
  const [code] = (await once(child, 'exit')) as [number | null];
  return code;
}

describe('the server', () => {
  it('refuses to start with one sentence that names the variable', async () => {
    const child = start({ DATABASE_URL: fresh.url, SESSION_SECRET: 'short' });
    let said = '';
    child.stderr?.on('data', (chunk) => (said += String(chunk)));
    expect(await ended(child)).toBe(1);
    expect(said).toBe('SESSION_SECRET must be at least 32 characters long.\n');
  });

  it.each(['SIGTERM', 'SIGINT'] as const)('ends cleanly on %s', async (signal) => {
    const child = start({ DATABASE_URL: fresh.url, SESSION_SECRET: SECRET });
    const address = await addressOf(child);
    expect((await fetch(`${address}/api/health`)).status).toBe(200);
    child.kill(signal);
    expect(await ended(child)).toBe(0);
    await expect(fetch(`${address}/api/health`)).rejects.toThrow();
  });

  it('starts without its database and says that it is away', async () => {
    const child = start({ DATABASE_URL: 'postgres://x@127.0.0.1:9/none', SESSION_SECRET: SECRET });
    const answer = await fetch(`${await addressOf(child)}/api/health`);
    expect(answer.status).toBe(503);
  });

  it('says in a sentence that its port is taken', async () => {
    const first = start({ DATABASE_URL: fresh.url, SESSION_SECRET: SECRET });
    const { port } = new URL(await addressOf(first));
    const second = start({ DATABASE_URL: fresh.url, SESSION_SECRET: SECRET, PORT: port });
    let said = '';
    second.stderr?.on('data', (chunk) => (said += String(chunk)));
    expect(await ended(second)).toBe(1);
    expect(said).toContain(`cannot listen on 127.0.0.1:${port}`);
  });
});
