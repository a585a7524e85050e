import { readdirSync, readFileSync } from 'node:fs';
import { randomUUID } from 'node:crypto';
import { commissions } from '@drizzle/schema/index';
import { commissionListSchema, commissionSchema } from '@shared/api/commission';
import { printLayout } from '@shared/layout/read-layout';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signedIn, type Browser } from './browser';
import { commissionTitled, draftOf, editOf, laid, newCommission, problem } from './demonstration';
import { runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let owner: Browser;
let elsewhere: Browser;
beforeAll(async () => {
  running = await runningApp();
  owner = await signedIn(running.app, 'owner');
  elsewhere = await signedIn(running.app, 'elsewhere');
});
afterAll(() => running.close());

const FIXTURES = new URL('./fixtures/layouts/', import.meta.url);

function fixtures(folder: 'ok' | 'not-ok'): [string, unknown][] {
  return readdirSync(new URL(`${folder}/`, FIXTURES)).map((name) => [
    name.replace('.json', ''),
    JSON.parse(readFileSync(new URL(`${folder}/${name}`, FIXTURES), 'utf8')),
  ]);
}

describe('the table of commissions', () => {
  it('shows what is at work, with size, woods, thumbnail and last version', async () => {
    const answer = await owner.get('/commissions?archived=false');
    const { commissions } = commissionListSchema.parse(answer.body);
    expect(commissions.map(({ title }) => title).sort()).toEqual([
      'Bedside drum table',
      'Ferry-hall lantern',
      'Rehearsal floor drum',
      'Stair planter, tall',
      'Test ring for the new cutter',
    ]);
    expect(commissions.find(({ title }) => title === 'Ferry-hall lantern')).toMatchObject({
      client: 'Harbour Trust',
      stage: 'with-client',
      staves: 32,
      courses: 9,
      woods: ['Black walnut', 'White ash', 'Black cherry'],
      lastVersion: { number: 3, keptBy: 'Ines Marlow' },
      archived: false,
    });
  });

  it('shows another workshop only its own', async () => {
    expect((await elsewhere.get('/commissions')).body).toEqual({ commissions: [] });
    const foreign = await newCommission(elsewhere, 'Of the other workshop');
    const { commissions } = commissionListSchema.parse((await owner.get('/commissions')).body);
    expect(commissions.map(({ id }) => id)).not.toContain(foreign.id);
  });

  it('refuses a choice it does not know', async () => {
    const refused = problem(await owner.get('/commissions?archived=perhaps'), 400);
    expect(refused.fields).toEqual([{ field: 'archived', message: 'must be "true" or "false"' }]);
  });
});

const DUE_RANGE = 'must be a date from 2000 to 2199, such as 2027-03-14';

describe('a new commission', () => {
  it('begins with the starting layout under its own title', async () => {
    const made = await newCommission(owner, 'Lamp for the landing');
    expect(made).toMatchObject({ staves: 24, courses: 8, stage: 'design', lastVersion: null });
    expect((await draftOf(owner, made.layoutId)).name).toBe('Lamp for the landing');
  });

  it('can begin with a layout file from another workshop', async () => {
    const lantern = await commissionTitled(owner, 'Ferry-hall lantern');
    const file = await owner.get(`/layouts/${lantern.layoutId}/file`);
    const layout: unknown = JSON.parse(Buffer.from(file.bytes).toString());
    const answer = await elsewhere.post('/commissions', { title: 'Lantern again', layout });
    expect(answer.status).toBe(201);
    const made = commissionSchema.parse(answer.body);
    expect(printLayout(await draftOf(elsewhere, made.layoutId))).toBe(
      Buffer.from(file.bytes).toString(),
    );
  });

  it.each([
    [{}, 'title', 'must be text'],
    [{ title: '' }, 'title', 'must not be empty'],
    [{ title: 'x'.repeat(121) }, 'title', 'must be at most 120 characters long'],
    [{ title: 'a\u0000b' }, 'title', 'must not contain control characters'],
    [{ title: 'x', due: '2027-02-30' }, 'due', DUE_RANGE],
    [{ title: 'x', due: '0001-01-01' }, 'due', DUE_RANGE],
    [{ title: 'x', due: '2200-01-01' }, 'due', DUE_RANGE],
    [{ title: 'x', client: 12 }, 'client', 'must be text'],
    [{ title: 'x', stage: 'design' }, 'stage', 'is not a known key here'],
  ])('refuses %o and names the field', async (body, field, message) => {
    const refused = problem(await owner.post('/commissions', body), 400);
    expect(refused).toMatchObject({ code: 'bad-input', fields: [{ field, message }] });
  });

  it.each(['[]', '"text"', 'null', '7', '{"title":', '{"title": NaN}', ''])(
    'refuses the body %s',
    async (body) => {
      expect(problem(await owner.send('post', '/commissions', body), 400).code).toBe('bad-input');
    },
  );

  it('refuses a body that is missing, or not under the name of JSON', async () => {
    expect(problem(await owner.post('/commissions'), 400).code).toBe('bad-input');
    const plain = { 'Content-Type': 'text/plain' };
    const answer = await owner.send('post', '/commissions', undefined, plain);
    expect(problem(answer, 400).message).toContain('application/json');
  });

  it('takes markup in a title as the text it is', async () => {
    const title = '<script>alert(1)</script> "=1+1"';
    expect((await newCommission(owner, title)).title).toBe(title);
  });
});

describe('a layout file opened as a new commission', () => {
  it.each(fixtures('ok'))('is taken: %s', async (name, layout) => {
    expect((await owner.post('/commissions', { title: name, layout })).status).toBe(201);
  });

  it.each(fixtures('not-ok'))('is refused by field: %s', async (name, fixture) => {
    const { layout, fields } = fixture as { layout: unknown; fields: string[] };
    const refused = problem(await owner.post('/commissions', { title: name, layout }), 400);
    expect(refused.code).toBe('bad-input');
    expect(refused.fields?.map(({ field }) => field)).toEqual(fields);
  });

  it('is refused over two megabytes without being read', async () => {
    const body = { title: 'Much too long', layout: { cells: 'A'.repeat(2_200_000) } };
    const refused = problem(await owner.post('/commissions', body), 413);
    expect(refused).toMatchObject({ code: 'too-large' });
    expect(refused.message).toContain('2048 kB');
  });
});

describe('changing a commission', () => {
  it('changes what is given and keeps the rest', async () => {
    const made = await newCommission(owner, 'To be changed');
    const changes = { client: 'Ottoline Reyes', due: '2027-06-01', stage: 'approved' };
    const answer = await owner.patch(`/commissions/${made.id}`, changes);
    expect(answer.body).toMatchObject({ ...changes, title: 'To be changed' });
  });

  it('refuses a stage it does not know', async () => {
    const made = await newCommission(owner);
    const answer = await owner.patch(`/commissions/${made.id}`, { stage: 'lost' });
    expect(problem(answer, 400).fields?.[0]?.field).toBe('stage');
  });
});

describe('an archived commission', () => {
  it('moves to the other list, can be read, and is changed by nobody until it is taken out', async () => {
    const made = await newCommission(owner, 'Done with');
    const path = `/commissions/${made.id}`;
    expect((await owner.patch(path, { archived: true })).body).toMatchObject({ archived: true });
    const list = async (archived: string) =>
      commissionListSchema
        .parse((await owner.get(`/commissions?archived=${archived}`)).body)
        .commissions.map(({ id }) => id);
    expect(await list('true')).toEqual([made.id]);
    expect(await list('false')).not.toContain(made.id);

    const layout = `/layouts/${made.layoutId}`;
    expect((await owner.get(layout)).status).toBe(200);
    const refusals = [
      await owner.patch(path, { title: 'Another title' }),
      await owner.patch(path, { archived: true, title: 'Another title' }),
      await owner.patch(layout, editOf(0, laid(1))),
      await owner.post(`${layout}/versions`, { revision: 0 }),
    ];
    for (const refusal of refusals) {
      expect(problem(refusal, 403).message).toContain('archive');
    }
    expect((await owner.patch(path, { archived: false, title: 'Back' })).status).toBe(200);
    expect((await owner.patch(layout, editOf(0, laid(1)))).status).toBe(200);
  });
});

describe('a commission that is being archived', () => {
  it('takes no edit that came in before it was', async () => {
    const made = await newCommission(owner, 'Archived just now');
    const edit = await running.open.database.transaction(async (archiving) => {
      await archiving
        .update(commissions)
        .set({ archivedAt: new Date() })
        .where(eq(commissions.id, made.id));
      const sent = owner.patch(`/layouts/${made.layoutId}`, editOf(0, laid(1)));
      await new Promise((resolve) => setTimeout(resolve, 300));
      return { sent };
    });
    expect(problem(await edit.sent, 403).message).toContain('archive');
  });
});

describe('what does not exist, or belongs to another workshop', () => {
  it.each(['not-a-uuid', '..%2F..%2Fetc', randomUUID(), '00000000-0000-0000-0000-000000000000'])(
    'answers 404 for the id %s',
    async (id) => {
      expect(problem(await owner.get(`/commissions/${id}`), 404).code).toBe('not-found');
      expect(problem(await owner.patch(`/commissions/${id}`, { title: 'x' }), 404).code).toBe(
        'not-found',
      );
    },
  );

  it('answers 404 for a commission of another workshop, and leaves it as it was', async () => {
    const made = await newCommission(owner, 'Not yours');
    const path = `/commissions/${made.id}`;
    expect(problem(await elsewhere.get(path), 404).code).toBe('not-found');
    expect(problem(await elsewhere.patch(path, { title: 'Mine' }), 404).code).toBe('not-found');
    expect((await owner.get(path)).body).toMatchObject({ title: 'Not yours' });
  });
});
