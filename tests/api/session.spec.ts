import { commissionListSchema } from '@shared/api/commission';
import { sessionSchema } from '@shared/api/session';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Browser, runningApp, signedIn, type RunningApp } from './running-app';

let running: RunningApp;
beforeAll(async () => {
  running = await runningApp();
});
afterAll(() => running.close());

const ines = { email: 'ines@quarrylane.example', password: 'ring-of-staves' };

describe('signing in', () => {
  it('answers who is signed in, with all roles and the workshop', async () => {
    const browser = new Browser(running);
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
});

describe('looking in', () => {
  it('lists commissions', async () => {
    const browser = await signedIn(running, 'owner');
    const list = await browser.get('/commissions');
    expect(commissionListSchema.parse(list.body).commissions).toHaveLength(5);
  });
});
