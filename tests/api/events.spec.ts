import { randomUUID } from 'node:crypto';
import { liveEventSchemas } from '@shared/api/live';
import { recordedEditSchema } from '@shared/api/layout';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { Browser, signedIn } from './browser';
import { editOf, laid, newCommission, problem } from './demonstration';
import { EventStream, listening, type Listening } from './event-stream';
import { appOn, runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let beside: RunningApp;
let here: Listening;
let there: Listening;
let designer: Browser;
let maker: Browser;
const streams: EventStream[] = [];

beforeAll(async () => {
  running = await runningApp();
  beside = appOn(running.databaseUrl);
  here = await listening(running.app);
  there = await listening(beside.app);
  designer = await signedIn(running.app, 'designer');
  maker = await signedIn(running.app, 'maker');
});
afterAll(async () => {
  for (const stream of streams) stream.close();
  await here.close();
  await there.close();
  await beside.close();
  await running.close();
});

async function newLayout(): Promise<string> {
  return (await newCommission(designer)).layoutId;
}

function watch(
  browser: Browser,
  server: Listening,
  layoutId: string,
  options: { since?: number; connection?: string; headers?: Record<string, string> } = {},
): EventStream {
  const { since = 0, connection = randomUUID(), headers } = options;
  const path = `/layouts/${layoutId}/events?since=${since}&connection=${connection}`;
  const stream = new EventStream(browser, server.port, path, headers);
  streams.push(stream);
  return stream;
}

const isRevision = (revision: number) => (event: { id: string | null }) =>
  event.id === String(revision);

describe('watching a layout', () => {
  it('brings an edit that another server process saved, with its key and author', async () => {
    const id = await newLayout();
    const stream = watch(maker, there, id);
    await stream.until(({ event }) => event === 'people');
    const edit = editOf(0, laid(3, 4));
    await designer.patch(`/layouts/${id}`, edit);
    const event = await stream.until(isRevision(1));
    expect(stream.contentType).toContain('text/event-stream');
    expect(recordedEditSchema.parse(event.data)).toMatchObject({
      revision: 1,
      by: { name: 'Bela Novak' },
      idempotencyKey: edit.idempotencyKey,
    });
  });

  it('goes on after a cut connection without loss and without anything twice', async () => {
    const id = await newLayout();
    const first = watch(maker, there, id);
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1)));
    await first.until(isRevision(1));
    first.close();
    await designer.patch(`/layouts/${id}`, editOf(1, laid(2)));
    await designer.patch(`/layouts/${id}`, editOf(2, laid(3)));
    const again = watch(maker, here, id, { headers: { 'Last-Event-ID': '1' } });
    await designer.patch(`/layouts/${id}`, editOf(3, laid(4)));
    await again.until(isRevision(4));
    expect(again.edits().map((event) => event.id)).toEqual(['2', '3', '4']);
  });

  it('brings everything to a browser that has been away for long', async () => {
    const id = await newLayout();
    for (let base = 0; base < 60; base++) {
      await designer.patch(`/layouts/${id}`, editOf(base, laid(base)));
    }
    const stream = watch(maker, there, id);
    await stream.until(isRevision(60));
    const revisions = Array.from({ length: 60 }, (_, i) => String(i + 1));
    expect(stream.edits().map((event) => event.id)).toEqual(revisions);
  });

  it('goes on when the connection that listens to the database was broken', async () => {
    const id = await newLayout();
    const stream = watch(maker, there, id);
    await stream.until(({ event }) => event === 'people');
    await running.open.database.execute(
      sql`select pg_terminate_backend(pid) from pg_stat_activity
          where query like 'LISTEN%' and datname = current_database()`,
    );
    await designer.patch(`/layouts/${id}`, editOf(0, laid(5)));
    await stream.until(isRevision(1));
    expect(stream.edits()).toHaveLength(1);
  });

  it('is not for other workshops, nor without a session', async () => {
    const id = await newLayout();
    const stranger = await signedIn(running.app, 'elsewhere');
    const path = `/layouts/${id}/events?since=0&connection=${randomUUID()}`;
    expect(problem(await stranger.get(path), 404).code).toBe('not-found');
    const nobody = await signedIn(running.app, 'client');
    expect(problem(await nobody.get(path), 403).code).toBe('not-allowed');
    const unknown = new Browser(running.app);
    expect(problem(await unknown.get(path), 401).code).toBe('not-signed-in');
  });

  it('ends soon after its session did', async () => {
    const id = await newLayout();
    const leaving = await signedIn(running.app, 'maker');
    const stream = watch(leaving, there, id);
    await stream.until(({ event }) => event === 'people');
    await leaving.delete('/session');
    await vi.waitFor(() => expect(stream.ended).toBe(true), { timeout: 20_000, interval: 200 });
  });

  it('refuses a revision that is no number by its name', async () => {
    const id = await newLayout();
    const answer = await maker.get(`/layouts/${id}/events?since=last&connection=here`);
    expect(problem(answer, 400).fields?.map(({ field }) => field)).toEqual(['since', 'connection']);
  });
});

describe('who is here', () => {
  it('sees people of another process come, move and go', async () => {
    const id = await newLayout();
    const mine = watch(designer, here, id);
    const connection = randomUUID();
    const theirs = watch(maker, there, id, { connection });
    const tile = { stave: 4, course: 2 };
    await maker.post(`/layouts/${id}/here`, { connection, station: 'pattern', tile });
    const seen = await mine.until((event) => peopleIn(event).length === 1);
    expect(peopleIn(seen)).toMatchObject([
      { person: { name: 'Tomas Okoye' }, station: 'pattern', tile },
    ]);
    theirs.close();
    const after = mine.events.length;
    await mine.until(
      (event) => mine.events.indexOf(event) >= after && peopleIn(event).length === 0,
    );
  });
});

describe('the name of somebody else’s connection', () => {
  it('does not let anybody move them or make them go', async () => {
    const id = await newLayout();
    const mine = watch(designer, here, id);
    const connection = randomUUID();
    watch(maker, there, id, { connection });
    await maker.post(`/layouts/${id}/here`, { connection, station: 'joint', tile: null });
    await mine.until((event) => peopleIn(event).length === 1);
    const claimed = watch(designer, here, id, { connection });
    await claimed.until(({ event }) => event === 'people');
    const tomas = [{ person: { name: 'Tomas Okoye' }, station: 'joint' }];
    const told = async (what: () => unknown) => {
      const before = mine.events.length;
      await what();
      return peopleIn(await mine.until((event) => mine.events.indexOf(event) >= before));
    };
    const move = { connection, station: 'shell', tile: null };
    expect(await told(() => designer.post(`/layouts/${id}/here`, move))).toMatchObject(tomas);
    expect(await told(() => claimed.close())).toMatchObject(tomas);
  });
});

function peopleIn(event: { event: string; data: unknown }) {
  return event.event === 'people' ? liveEventSchemas.people.parse(event.data).people : [];
}
