import { problemSchema } from '@shared/api/problem';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { runningApp, type RunningApp } from './running-app';

let running: RunningApp;
beforeAll(async () => {
  running = await runningApp();
});
afterAll(() => running.close());

describe('every answer', () => {
  it('carries a request id, also in the problem', async () => {
    const answer = await request(running.app).get('/api/commissions');
    const id = answer.get('X-Request-Id');
    expect(id).toMatch(/^[0-9a-f-]{36}$/);
    expect(problemSchema.parse(answer.body).requestId).toBe(id);
  });

  it('keeps the id a proxy has given, unless it looks like something else', async () => {
    const asked = (id: string) => request(running.app).get('/api/health').set('X-Request-Id', id);
    expect((await asked('proxy-id-0001')).get('X-Request-Id')).toBe('proxy-id-0001');
    expect((await asked('<script>')).get('X-Request-Id')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('allows no scripts but our own, no frames, and does not name its maker', async () => {
    const answer = await request(running.app).get('/');
    const policy = answer.get('Content-Security-Policy') ?? '';
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain("script-src 'self' 'unsafe-inline'");
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.get('X-Powered-By')).toBeUndefined();
  });

  it('of the API is not kept by caches', async () => {
    const answer = await request(running.app).get('/api/session');
    expect(answer.get('Cache-Control')).toBe('no-store');
  });
});

describe('the health of the server', () => {
  it('is ok while the database answers', async () => {
    const answer = await request(running.app).get('/api/health');
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({ status: 'ok', database: 'up' });
  });
});

describe('the built app', () => {
  it('is its first page at every place inside it, asked for anew each time', async () => {
    for (const path of ['/', '/commissions', '/layouts/1/pattern']) {
      const answer = await request(running.app).get(path);
      expect(answer.status).toBe(200);
      expect(answer.text).toContain('<title>Staveloom</title>');
      expect(answer.get('Cache-Control')).toBe('no-cache');
    }
  });

  it('keeps files with a hash in their names for good', async () => {
    const answer = await request(running.app).get('/styles-ABCD1234.css');
    expect(answer.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
  });

  it('answers a file that is not there with 404, not with its first page', async () => {
    const answer = await request(running.app).get('/main-00000000.js');
    expect(answer.status).toBe(404);
    expect(answer.text).not.toContain('<title>Staveloom</title>');
  });
});

describe('a path of the API that is none', () => {
  it.each(['/api', '/api/nothing', '/api/commissions/1/2/3'])('answers JSON: %s', async (path) => {
    const answer = await request(running.app).get(path);
    expect(answer.status).toBe(404);
    expect(problemSchema.parse(answer.body).code).toBe('not-found');
  });

  it('answers a method nobody takes the same way', async () => {
    const answer = await request(running.app).put('/api/commissions').send({});
    expect(problemSchema.parse(answer.body).code).toBe('not-found');
  });

  it('answers a path that cannot be decoded with a problem', async () => {
    const answer = await request(running.app).get('/api/commissions/%E0%A4%A');
    expect(answer.status).toBe(400);
    expect(problemSchema.parse(answer.body).code).toBe('bad-input');
  });
});
