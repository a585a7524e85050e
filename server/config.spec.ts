import express from 'express';
import { describe, expect, it } from 'vitest';
import { readConfig } from './config';

const least = {
  DATABASE_URL: 'postgres://someone@127.0.0.1:5432/staveloom',
  SESSION_SECRET: 'thirty-two characters and no less',
};

describe('the environment at start', () => {
  it('needs only the database and a secret', () => {
    expect(readConfig(least)).toMatchObject({
      ok: true,
      config: { host: '127.0.0.1', port: 3000, trustProxy: false, sessionHours: 12 },
    });
  });

  it('takes port 0, so that the system chooses a free one', () => {
    expect(readConfig({ ...least, PORT: '0' })).toMatchObject({ ok: true, config: { port: 0 } });
  });

  it.each([
    [{ SESSION_SECRET: 'short' }, 'SESSION_SECRET must be at least 32 characters long.'],
    [
      { SESSION_SECRET: undefined },
      'SESSION_SECRET must be set; it must be at least 32 characters long.',
    ],
    [{ DATABASE_URL: undefined }, 'DATABASE_URL must be set to a postgres:// address.'],
    [{ DATABASE_URL: 'mysql://x' }, 'DATABASE_URL must be a postgres:// address.'],
    [{ DATABASE_URL: 'postgres://h:port/x' }, 'DATABASE_URL must be a postgres:// address.'],
    [{ PORT: '65536' }, 'PORT must be a whole number from 0 to 65535.'],
    [{ PORT: 'abc' }, 'PORT must be a whole number from 0 to 65535.'],
    [{ SESSION_HOURS: '0' }, 'SESSION_HOURS must be a whole number from 1 to 720.'],
    [{ NODE_ENV: 'prod' }, 'NODE_ENV must be "development", "production" or "test".'],
  ])('refuses %o with one sentence that names variable and bound', (change, sentence) => {
    expect(readConfig({ ...least, ...change })).toEqual({ ok: false, sentence });
  });

  it.each([
    ['1', 1],
    ['loopback', 'loopback'],
    ['loopback, 10.0.0.0/8,fd00::/8', 'loopback, 10.0.0.0/8,fd00::/8'],
  ])('counts proxies, or takes their addresses: %s', (given, trustProxy) => {
    expect(readConfig({ ...least, TRUST_PROXY: given })).toMatchObject({ config: { trustProxy } });
    expect(() => express().set('trust proxy', trustProxy)).not.toThrow();
  });

  it.each(['', 'true', 'proxy.example', '10.0.0.0/33', '10.0.0.0/0', 'loopback,'])(
    'refuses to start when the proxies are said as "%s"',
    (given) => {
      const read = readConfig({ ...least, TRUST_PROXY: given });
      expect(read.ok ? '' : read.sentence).toMatch(/^TRUST_PROXY must be/);
    },
  );
});
