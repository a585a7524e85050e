import { bundleExports } from '@drizzle/schema/index';
import { strFromU8, unzipSync } from 'fflate';
import { desc } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signedIn, type Browser } from './browser';
import { commissionTitled, problem } from './demonstration';
import { runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let maker: Browser;
let lantern: string;
let testRing: string;
beforeAll(async () => {
  running = await runningApp();
  maker = await signedIn(running.app, 'maker');
  lantern = `/layouts/${(await commissionTitled(maker, 'Ferry-hall lantern')).layoutId}/versions`;
  const ring = await commissionTitled(maker, 'Test ring for the new cutter');
  testRing = `/layouts/${ring.layoutId}/versions/1/bundle`;
});
afterAll(() => running.close());

async function lastExport() {
  const { database } = running.open;
  const [last] = await database
    .select()
    .from(bundleExports)
    .orderBy(desc(bundleExports.exportedAt))
    .limit(1);
  return last;
}

function manifestIn(zip: Uint8Array): Record<string, unknown> {
  const manifest = unzipSync(zip)['manifest.json'] ?? new Uint8Array();
  return JSON.parse(strFromU8(manifest)) as Record<string, unknown>;
}

describe('the bundle of a version', () => {
  it('is a ZIP with its manifest, and the export is recorded', async () => {
    const answer = await maker.post(`${lantern}/3/bundle`, { dxf: 'r12', unit: 'in' });
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toBe('application/zip');
    expect(answer.headers['content-disposition']).toContain('ferry-hall-lantern-v3.zip');
    expect(manifestIn(answer.bytes)).toMatchObject({ unit: 'in', version: { number: 3 } });
    expect(await lastExport()).toMatchObject({
      versionNumber: 3,
      options: { dxf: 'r12', unit: 'in', centrePath: false },
      overrideReason: null,
    });
  });

  it('is the same bytes every time, whoever exports it', async () => {
    const owner = await signedIn(running.app, 'owner');
    const first = await maker.post(`${lantern}/3/bundle`, {});
    const second = await owner.post(`${lantern}/3/bundle`, {});
    expect(Buffer.from(second.bytes).equals(Buffer.from(first.bytes))).toBe(true);
  });

  it('is refused with its checks when one says stop', async () => {
    const before = await running.open.database.$count(bundleExports);
    const answer = await maker.post(testRing, {});
    expect(problem(answer, 409).code).toBe('stopped');
    const { checks } = answer.body as { checks: { key: string; result: string }[] };
    expect(checks.find(({ result }) => result === 'stop')?.key).toBe('inside-radius');
    expect(await running.open.database.$count(bundleExports)).toBe(before);
  });

  it('goes on in spite of a stop with a written reason, which is recorded with the name', async () => {
    const reason = 'Only the course joints are cut, on the small machine.';
    const answer = await maker.post(testRing, { override: { reason } });
    expect(answer.status).toBe(200);
    expect(JSON.stringify(manifestIn(answer.bytes))).toContain(reason);
    expect(JSON.stringify(manifestIn(answer.bytes))).toContain('Tomas Okoye');
    expect(await lastExport()).toMatchObject({ overrideReason: reason });
  });

  it.each([
    [{ override: {} }, 'override.reason'],
    [{ override: { reason: 'ok' } }, 'override.reason'],
    [{ override: { reason: '      ' } }, 'override.reason'],
    [{ override: { reason: 'bell \u0007 inside' } }, 'override.reason'],
    [{ override: true }, 'override'],
    [{ dxf: 'r14' }, 'dxf'],
    [{ unit: 'cubit' }, 'unit'],
    [{ centrePath: 'yes' }, 'centrePath'],
    [{ sheets: true }, 'sheets'],
  ])('refuses %o', async (body, field) => {
    const refused = problem(await maker.post(testRing, body), 400);
    expect(refused.fields?.map((each) => each.field)).toEqual([field]);
  });

  it('answers 404 for a version that is not there or belongs to another workshop', async () => {
    expect(problem(await maker.post(`${lantern}/99/bundle`, {}), 404).code).toBe('not-found');
    const elsewhere = await signedIn(running.app, 'elsewhere');
    expect(problem(await elsewhere.post(`${lantern}/3/bundle`, {}), 404).code).toBe('not-found');
  });
});
