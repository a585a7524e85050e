import { versionDetailSchema, versionKeptSchema, versionListSchema } from '@shared/api/version';
import { versions } from '@drizzle/schema/index';
import { layoutFileOf, readLayoutText } from '@shared/layout/read-layout';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signedIn, type Answer, type Browser } from './browser';
import {
  commissionTitled,
  draftOf,
  editOf,
  laid,
  newCommission,
  openLayout,
  problem,
  saved,
} from './demonstration';
import { runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let designer: Browser;
let maker: Browser;
beforeAll(async () => {
  running = await runningApp();
  designer = await signedIn(running.app, 'designer');
  maker = await signedIn(running.app, 'maker');
});
afterAll(() => running.close());

function kept(answer: Answer) {
  expect(answer.body).toHaveProperty('version');
  expect(answer.status).toBe(201);
  return versionKeptSchema.parse(answer.body);
}

async function layoutWithTwoVersions(): Promise<string> {
  const { layoutId } = await newCommission(designer);
  const path = `/layouts/${layoutId}`;
  kept(await designer.post(`${path}/versions`, { revision: 0, note: 'All in one wood' }));
  saved(await designer.patch(path, editOf(0, laid(1, 2, 3))));
  kept(await maker.post(`${path}/versions`, { revision: 1 }));
  return layoutId;
}

describe('keeping a version', () => {
  it('numbers it, with note, keeper and thumbnail, and the layout tells of it', async () => {
    const { layoutId } = await newCommission(designer);
    const path = `/layouts/${layoutId}`;
    const note = 'First pattern.\nSecond line, with <b> and "quotes".';
    const { version, draft } = kept(await maker.post(`${path}/versions`, { revision: 0, note }));
    expect(version).toMatchObject({
      number: 1,
      note,
      keptBy: 'Tomas Okoye',
      revision: 0,
      restoredFrom: null,
      thumbnail: { staves: 24, courses: 8 },
    });
    expect(draft.revision).toBe(0);
    expect((await openLayout(designer, layoutId)).lastVersion).toEqual({ number: 1, revision: 0 });
  });

  it('is refused when the draft went on since it was seen', async () => {
    const { layoutId } = await newCommission(designer);
    await designer.patch(`/layouts/${layoutId}`, editOf(0, laid(1)));
    const answer = await maker.post(`/layouts/${layoutId}/versions`, { revision: 0 });
    expect(problem(answer, 409).code).toBe('conflict');
    expect((await openLayout(designer, layoutId)).lastVersion).toBeNull();
  });

  it('gives two at once two numbers', async () => {
    const { layoutId } = await newCommission(designer);
    const path = `/layouts/${layoutId}/versions`;
    const answers = await Promise.all([
      designer.post(path, { revision: 0 }),
      maker.post(path, { revision: 0 }),
    ]);
    expect(answers.map((answer) => kept(answer).version.number).sort()).toEqual([1, 2]);
  });

  it.each([
    [{ note: 'no revision' }, 'revision'],
    [{ revision: -1 }, 'revision'],
    [{ revision: '0' }, 'revision'],
    [{ revision: 0, note: 'x'.repeat(2001) }, 'note'],
    [{ revision: 0, note: 'bell\u0007' }, 'note'],
    [{ revision: 0, note: 'half a letter \ud83e' }, 'note'],
  ])('refuses %o', async (body, field) => {
    const { layoutId } = await newCommission(designer);
    const refused = problem(await designer.post(`/layouts/${layoutId}/versions`, body), 400);
    expect(refused.fields?.map((each) => each.field)).toEqual([field]);
  });
});

describe('reading versions', () => {
  it('lists them newest first, and gives each with its layout', async () => {
    const layoutId = await layoutWithTwoVersions();
    const list = versionListSchema.parse((await maker.get(`/layouts/${layoutId}/versions`)).body);
    expect(list.versions.map(({ number }) => number)).toEqual([2, 1]);
    const first = await maker.get(`/layouts/${layoutId}/versions/1`);
    const detail = versionDetailSchema.parse(first.body);
    expect(detail.note).toBe('All in one wood');
    expect(detail.layout.cells).not.toBe((await openLayout(maker, layoutId)).layout.cells);
  });

  it('saves one as a layout file', async () => {
    const lantern = await commissionTitled(maker, 'Ferry-hall lantern');
    const answer = await maker.get(`/layouts/${lantern.layoutId}/versions/1/file`);
    expect(answer.headers['content-disposition']).toContain('ferry-hall-lantern-v1.json');
    const reading = readLayoutText(Buffer.from(answer.bytes).toString());
    expect(reading).toMatchObject({ ok: true, layout: { cutter: { fluteLength: 12.7 } } });
  });

  it.each(['0', '99', '-1', '1.5', 'one', '4294967296', '1e1'])(
    'answers 404 for number %s',
    async (number) => {
      const lantern = await commissionTitled(maker, 'Ferry-hall lantern');
      const path = `/layouts/${lantern.layoutId}/versions/${number}`;
      expect(problem(await maker.get(path), 404).code).toBe('not-found');
      expect(problem(await maker.post(`${path}/restore`, {}), 404).code).toBe('not-found');
    },
  );
});

describe('a kept version', () => {
  it('cannot be changed or removed, not even in the database', async () => {
    const layoutId = await layoutWithTwoVersions();
    const { database, pool } = running.open;
    const mine = eq(versions.layoutId, layoutId);
    const refusal = { cause: { message: expect.stringContaining('is kept as it is') as unknown } };
    await expect(database.update(versions).set({ note: 'x' }).where(mine)).rejects.toMatchObject(
      refusal,
    );
    await expect(database.delete(versions).where(mine)).rejects.toMatchObject(refusal);
    await expect(pool.query('TRUNCATE versions CASCADE')).rejects.toThrow('kept as they are');
    expect(await database.$count(versions, mine)).toBe(2);
  });

  it('stays as it was while the draft goes on', async () => {
    const layoutId = await layoutWithTwoVersions();
    const before = await maker.get(`/layouts/${layoutId}/versions/2`);
    await designer.patch(`/layouts/${layoutId}`, editOf(1, laid(40)));
    expect((await maker.get(`/layouts/${layoutId}/versions/2`)).body).toEqual(before.body);
  });
});

describe('restoring a version', () => {
  it('sets the draft to it and keeps that as the next version', async () => {
    const layoutId = await layoutWithTwoVersions();
    const path = `/layouts/${layoutId}/versions`;
    const { version, draft } = kept(await designer.post(`${path}/1/restore`, { note: 'Back' }));
    expect(version).toMatchObject({ number: 3, restoredFrom: 1, note: 'Back', revision: 2 });
    expect(draft.revision).toBe(2);
    const first = versionDetailSchema.parse((await maker.get(`${path}/1`)).body);
    expect(layoutFileOf(await draftOf(maker, layoutId))).toEqual(first.layout);
  });

  it('is an edit like any other: an open browser merges with it or is told', async () => {
    const layoutId = await layoutWithTwoVersions();
    const path = `/layouts/${layoutId}`;
    await designer.post(`${path}/versions/1/restore`, {});
    const apart = saved(await designer.patch(path, editOf(1, laid(100))));
    expect(apart.others).toMatchObject([{ revision: 2, patch: [{ positions: [1, 2, 3] }] }]);
    expect(problem(await designer.patch(path, editOf(1, laid(2))), 409).code).toBe('conflict');
  });

  it('makes no edit when the draft is that version already', async () => {
    const layoutId = await layoutWithTwoVersions();
    const { draft } = kept(await maker.post(`/layouts/${layoutId}/versions/2/restore`, {}));
    expect(draft.revision).toBe(1);
  });

  it('brings a grid of another size back', async () => {
    const { layoutId } = await newCommission(designer);
    const path = `/layouts/${layoutId}`;
    kept(await designer.post(`${path}/versions`, { revision: 0 }));
    const { shell, cells } = await draftOf(designer, layoutId);
    const smaller = editOf(0, [
      {
        kind: 'resize',
        before: { staves: shell.staves, courses: shell.courses, cells },
        after: { staves: 12, courses: 2, cells: new Uint8Array(24) },
      },
    ]);
    saved(await designer.patch(path, smaller));
    kept(await designer.post(`${path}/versions/1/restore`, {}));
    expect((await draftOf(designer, layoutId)).shell).toMatchObject({ staves: 24, courses: 8 });
  });
});
