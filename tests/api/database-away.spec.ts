/** PostgreSQL stopped in the middle of work, and back again. */
import { healthSchema } from '@shared/api/health';
import { seedDatabase } from '@seeds/seed';
import { migrateDatabase } from '@drizzle/migrate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  startThrowawayPostgres,
  type ThrowawayPostgres,
} from '../../scripts/postgres/throwaway.mjs';
import { Browser, signedIn, type Answer } from './browser';
import { editOf, laid, newCommission, openLayout, problem, saved } from './demonstration';
import { appOn, type RunningApp } from './running-app';

let postgres: ThrowawayPostgres;
let running: RunningApp;
beforeAll(async () => {
  postgres = await startThrowawayPostgres();
  await migrateDatabase(postgres.url);
  await seedDatabase(postgres.url, { amongOthers: 'leave alone' });
  running = appOn(postgres.url);
}, 60_000);
afterAll(async () => {
  await running.close();
  await postgres.remove();
});

async function timed(asking: Promise<Answer>): Promise<[Answer, number]> {
  const begun = performance.now();
  return [await asking, performance.now() - begun];
}

describe('while PostgreSQL is stopped', () => {
  it('says so within seconds, keeps nothing half done, and goes on when it is back', async () => {
    const designer = await signedIn(running.app, 'designer');
    const stranger = new Browser(running.app);
    await stranger.get('/session');
    const { layoutId } = await newCommission(designer);
    const path = `/layouts/${layoutId}`;
    saved(await designer.patch(path, editOf(0, laid(1))));
    const unsaved = editOf(1, laid(2));

    await postgres.interrupt();
    const credentials = { email: 'bela@quarrylane.example', password: 'ring-of-staves' };
    for (const asking of [
      designer.get(path),
      designer.patch(path, unsaved),
      designer.get('/session'),
      stranger.post('/session', credentials),
    ]) {
      const [answer, milliseconds] = await timed(asking);
      const { code, message } = problem(answer, 503);
      expect(code).toBe('unavailable');
      expect(message).not.toMatch(/ECONN|select|postgres|127\.0\.0\.1/i);
      expect(answer.headers['retry-after']).toBe('5');
      expect(milliseconds).toBeLessThan(4_000);
    }
    const health = await designer.get('/health');
    expect(health.status).toBe(503);
    expect(healthSchema.parse(health.body)).toEqual({ status: 'unavailable', database: 'down' });

    await postgres.resume();
    expect((await designer.get('/health')).body).toEqual({ status: 'ok', database: 'up' });
    expect((await openLayout(designer, layoutId)).revision).toBe(1);
    expect(saved(await designer.patch(path, unsaved))).toEqual({ revision: 2, others: [] });
    expect((await stranger.post('/session', credentials)).status).toBe(200);
  }, 60_000);
});
