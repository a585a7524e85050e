import { people, rateLimits } from '@drizzle/schema/index';
import { sessionSchema } from '@shared/api/session';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Browser, EMAILS, signedIn } from './browser';
import { problem } from './demonstration';
import { appOn, runningApp, type RunningApp } from './running-app';

let running: RunningApp;
beforeAll(async () => {
  running = await runningApp();
});
afterAll(() => running.close());

const SESSION = 'staveloom.sid';
const TOKEN = 'XSRF-TOKEN';
const ines = { email: EMAILS.designerAndMaker, password: 'ring-of-staves' };

async function fresh(headers?: Record<string, string>): Promise<Browser> {
  const browser = new Browser(running.app, headers);
  await browser.get('/session');
  return browser;
}

describe('signing in', () => {
  it('answers who is signed in, with all roles and the workshop', async () => {
    const browser = new Browser(running.app);
    expect((await browser.get('/session')).body).toEqual({ person: null });
    const answer = await browser.post('/session', ines);
    expect(answer.status).toBe(200);
    expect(sessionSchema.parse(answer.body).person).toMatchObject({
      name: 'Ines Marlow',
      roles: ['designer', 'maker'],
      workshop: { name: 'Quarry Lane Shells' },
    });
    expect((await browser.get('/session')).body).toEqual(answer.body);
  });

  it('takes the e-mail address in capitals too', async () => {
    const answer = await (
      await fresh()
    ).post('/session', { ...ines, email: ines.email.toUpperCase() });
    expect(answer.status).toBe(200);
  });

  it('answers a wrong password and an unknown address alike', async () => {
    const browser = await fresh();
    const wrong = problem(await browser.post('/session', { ...ines, password: 'guess' }), 401);
    const nobody = { email: 'nobody@quarrylane.example', password: 'guess' };
    const unknown = problem(await browser.post('/session', nobody), 401);
    expect(wrong).toMatchObject({ code: 'wrong-credentials' });
    expect({ ...unknown, requestId: '' }).toEqual({ ...wrong, requestId: '' });
  });

  it('takes the same work for an unknown address as for a wrong password', async () => {
    const browser = await fresh({ 'X-Forwarded-For': '198.51.100.40' });
    const median = async (email: string) => {
      const times: number[] = [];
      for (let i = 0; i < 4; i++) {
        const begun = performance.now();
        await browser.post('/session', { email, password: 'guess' });
        times.push(performance.now() - begun);
      }
      return times.sort((a, b) => a - b)[1] ?? 0;
    };
    const known = await median(EMAILS.maker);
    const unknown = await median('nobody.at.all@quarrylane.example');
    expect(unknown).toBeGreaterThan(known / 3);
  });

  it('keeps passwords only as argon2id', async () => {
    const rows = await running.open.database.select({ hash: people.passwordHash }).from(people);
    expect(rows).toHaveLength(6);
    for (const { hash } of rows) expect(hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it.each([
    [{ email: 'not an address', password: 'x' }, 'email', 'must be an e-mail address'],
    [{ email: 'a@b.example' }, 'password', 'must be text'],
    [
      { email: 'a@b.example', password: 'x'.repeat(201) },
      'password',
      'must be at most 200 characters',
    ],
    [{ email: 'a@b.example', password: 7 }, 'password', 'must be text'],
    [{ ...ines, remember: true }, 'remember', 'is not a known key here'],
    [{ ...ines, email: { toString: 1 } }, 'email', 'must be an e-mail address'],
    [{ ...ines, email: 'nul\u0000@b.example' }, 'email', 'must be an e-mail address'],
  ])('refuses %o and names the field', async (body, field, message) => {
    const refused = problem(await (await fresh()).post('/session', body), 400);
    expect(refused).toMatchObject({ code: 'bad-input', fields: [{ field, message }] });
  });
});

describe('the session', () => {
  it('gets a new id at sign-in, and the old one is worth nothing', async () => {
    const browser = await signedIn(running.app, 'designerAndMaker');
    const first = browser.cookies.get(SESSION);
    const stale = browser.before(running.app);
    expect((await browser.post('/session', ines)).status).toBe(200);
    expect(browser.cookies.get(SESSION)).not.toBe(first);
    expect((await stale.get('/session')).body).toEqual({ person: null });
  });

  it('does not adopt an id that was planted', async () => {
    const browser = await fresh();
    browser.cookies.set(SESSION, 's%3Aplanted.by-somebody-else');
    await browser.get('/session');
    await browser.post('/session', ines);
    expect(browser.cookies.get(SESSION)).not.toContain('planted');
  });

  it('ends at sign-out, also for whoever copied its cookie', async () => {
    const browser = await signedIn(running.app, 'owner');
    const copied = browser.before(running.app);
    expect((await browser.delete('/session')).status).toBe(204);
    expect(browser.cookies.has(SESSION)).toBe(false);
    expect((await copied.get('/session')).body).toEqual({ person: null });
    expect(problem(await copied.get('/commissions'), 401).code).toBe('not-signed-in');
  });

  it('can be signed in again at once after sign-out', async () => {
    const browser = await signedIn(running.app, 'owner');
    await browser.delete('/session');
    expect((await browser.post('/session', ines)).status).toBe(200);
  });

  it('holds before another server process on the same database', async () => {
    const browser = await signedIn(running.app, 'owner');
    const other = appOn(running.databaseUrl);
    expect((await browser.before(other.app).get('/commissions')).status).toBe(200);
    await other.close();
  });

  it('is kept in a cookie that scripts cannot read and other sites do not send', async () => {
    const browser = await fresh({ 'X-Forwarded-Proto': 'https' });
    const answer = await browser.post('/session', ines);
    const cookies = String(answer.headers['set-cookie']);
    expect(cookies).toMatch(
      /staveloom\.sid=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; Secure; SameSite=Lax/,
    );
  });
});

describe('the token against forged requests', () => {
  it('is handed out once and then stays while the session does', async () => {
    const browser = await fresh();
    const token = browser.cookies.get(TOKEN);
    await browser.get('/session');
    expect(browser.cookies.get(TOKEN)).toBe(token);
    await browser.post('/session', ines);
    expect(browser.cookies.get(TOKEN)).not.toBe(token);
  });

  it('is demanded for signing in', async () => {
    const answer = await new Browser(running.app).post('/session', ines);
    expect(problem(answer, 403).code).toBe('forged-request');
  });

  it.each(['', 'made-up', 'made.up'])('is refused when the header says "%s"', async (token) => {
    const browser = await signedIn(running.app, 'owner');
    const body = { title: 'From another site' };
    const answer = await browser.send('post', '/commissions', body, { 'X-XSRF-TOKEN': token });
    expect(problem(answer, 403).code).toBe('forged-request');
  });

  it('is refused when it was made for another session', async () => {
    const owner = await signedIn(running.app, 'owner');
    const other = await signedIn(running.app, 'elsewhere');
    owner.cookies.set(TOKEN, other.cookies.get(TOKEN) ?? '');
    expect(problem(await owner.post('/commissions', { title: 'x' }), 403).code).toBe(
      'forged-request',
    );
  });

  it('is handed out anew with the refusal, so that trying again works', async () => {
    const browser = await signedIn(running.app, 'owner');
    browser.cookies.delete(TOKEN);
    expect((await browser.post('/commissions', { title: 'Second try' })).status).toBe(403);
    expect((await browser.post('/commissions', { title: 'Second try' })).status).toBe(201);
  });
});

describe('guessing passwords', () => {
  const guess = { email: EMAILS.maker, password: 'guess' };

  it('is stopped after ten wrong ones for an address, whichever server process is asked', async () => {
    const other = appOn(running.databaseUrl);
    const here = await fresh({ 'X-Forwarded-For': '198.51.100.7' });
    const there = here.before(other.app);
    for (let i = 0; i < 5; i++) {
      expect((await here.post('/session', guess)).status).toBe(401);
      expect((await there.post('/session', guess)).status).toBe(401);
    }
    const stopped = await there.post('/session', { ...guess, password: 'ring-of-staves' });
    expect(problem(stopped, 429).code).toBe('too-many-requests');
    expect(Number(stopped.headers['retry-after'])).toBeGreaterThan(0);
    await other.close();
  });

  it('counts anew when the time is over, and forgets counts that are', async () => {
    const { database } = running.open;
    const browser = await fresh({ 'X-Forwarded-For': '198.51.100.10' });
    for (let i = 0; i < 10; i++) await browser.post('/session', guess);
    expect((await browser.post('/session', guess)).status).toBe(429);
    await database.update(rateLimits).set({ resetsAt: new Date(Date.now() - 1000) });
    expect((await browser.post('/session', guess)).status).toBe(401);
    expect(await database.$count(rateLimits)).toBe(2);
  });

  it('does not shut out the same person somewhere else', async () => {
    const elsewhere = await fresh({ 'X-Forwarded-For': '198.51.100.8' });
    const right = { ...guess, password: 'ring-of-staves' };
    expect((await elsewhere.post('/session', right)).status).toBe(200);
  });

  it('does not count those who sign in correctly', async () => {
    const browser = await fresh({ 'X-Forwarded-For': '198.51.100.9' });
    for (let i = 0; i < 12; i++) expect((await browser.post('/session', ines)).status).toBe(200);
  });
});
