import { randomUUID } from 'node:crypto';
import { layoutEdits } from '@drizzle/schema/index';
import { conflictSchema, recordedEditSchema } from '@shared/api/layout';
import { patchOfWire } from '@shared/api/wire-patch';
import { applyPatch, type Patch } from '@shared/layout/patch';
import { layoutFileSchema } from '@shared/layout/schema';
import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod';
import { signedIn, type Answer, type Browser } from './browser';
import {
  draftOf,
  editOf,
  laid,
  newCommission,
  openLayout,
  problem,
  saved,
  setting,
} from './demonstration';
import { appOn, runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let owner: Browser;
let designer: Browser;
let maker: Browser;
let both: Browser;
beforeAll(async () => {
  running = await runningApp();
  owner = await signedIn(running.app, 'owner');
  designer = await signedIn(running.app, 'designer');
  maker = await signedIn(running.app, 'maker');
  both = await signedIn(running.app, 'designerAndMaker');
});
afterAll(() => running.close());

async function newLayout(): Promise<string> {
  return (await newCommission(owner)).layoutId;
}

function conflictIn(answer: Answer) {
  expect(problem(answer, 409).code).toBe('conflict');
  return z.object({ conflict: conflictSchema }).parse(answer.body).conflict;
}

describe('saving an edit', () => {
  it('counts the revision up and shows in the draft', async () => {
    const id = await newLayout();
    expect(saved(await designer.patch(`/layouts/${id}`, editOf(0, laid(3, 4))))).toEqual({
      revision: 1,
      others: [],
    });
    expect((await openLayout(maker, id)).revision).toBe(1);
    expect([...(await draftOf(maker, id)).cells.slice(2, 6)]).toEqual([0, 1, 1, 0]);
  });

  it('changes the grid with its whole pattern', async () => {
    const id = await newLayout();
    const { shell, cells } = await draftOf(owner, id);
    const patch: Patch = [
      {
        kind: 'resize',
        before: { staves: shell.staves, courses: shell.courses, cells },
        after: { staves: 10, courses: 3, cells: new Uint8Array(30).fill(1) },
      },
    ];
    expect((await owner.patch(`/layouts/${id}`, editOf(0, patch))).status).toBe(200);
    expect((await draftOf(owner, id)).shell).toMatchObject({ staves: 10, courses: 3 });
  });

  it('takes the largest pattern there is, laid tile by tile', async () => {
    const id = await newLayout();
    const { shell, cells } = await draftOf(owner, id);
    const tiles = 240 * 120;
    const grow: Patch = [
      {
        kind: 'resize',
        before: { staves: shell.staves, courses: shell.courses, cells },
        after: { staves: 240, courses: 120, cells: new Uint8Array(tiles) },
      },
    ];
    expect((await owner.patch(`/layouts/${id}`, editOf(0, grow))).status).toBe(200);
    const all = laid(...Array.from({ length: tiles }, (_, position) => position));
    expect((await owner.patch(`/layouts/${id}`, editOf(1, all))).status).toBe(200);
    expect((await draftOf(owner, id)).cells.every((wood) => wood === 1)).toBe(true);
  });

  it('writes what was really there before into the log, whatever the request said', async () => {
    const id = await newLayout();
    await designer.patch(`/layouts/${id}`, editOf(0, laid(7)));
    const wrong: Patch = [{ kind: 'cells', positions: [7], before: [0], after: [0] }];
    await designer.patch(`/layouts/${id}`, editOf(1, wrong));
    const [row] = await running.open.database
      .select({ patch: layoutEdits.patch })
      .from(layoutEdits)
      .where(and(eq(layoutEdits.layoutId, id), eq(layoutEdits.revision, 2)));
    expect(row?.patch).toEqual([{ kind: 'cells', positions: [7], before: [1], after: [0] }]);
  });
});

describe('two people in the same layout', () => {
  it('merge when they lay different tiles, and the later one is told what to apply first', async () => {
    const id = await newLayout();
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1, 2)));
    const answer = saved(await both.patch(`/layouts/${id}`, editOf(0, laid(3))));
    expect(answer.revision).toBe(2);
    expect(answer.others).toMatchObject([{ revision: 1, by: { name: 'Bela Novak' } }]);
    expect([...(await draftOf(owner, id)).cells.slice(0, 5)]).toEqual([0, 1, 1, 1, 0]);
  });

  it('merge when one lays tiles and the other sets the joint', async () => {
    const id = await newLayout();
    const wider = await setting(owner, id, 'joint.clearance', 0.2);
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1)));
    expect((await maker.patch(`/layouts/${id}`, editOf(0, wider))).status).toBe(200);
    expect((await draftOf(owner, id)).joint.clearance).toBe(0.2);
  });

  it('are told of each other when they lay the same tile', async () => {
    const id = await newLayout();
    await designer.patch(`/layouts/${id}`, editOf(0, laid(5, 6)));
    const conflict = conflictIn(await both.patch(`/layouts/${id}`, editOf(0, laid(6, 7))));
    expect(conflict.revision).toBe(1);
    expect(conflict.others).toMatchObject([{ revision: 1, patch: [{ positions: [5, 6] }] }]);
    expect((await openLayout(owner, id)).revision).toBe(1);
    expect((await both.patch(`/layouts/${id}`, editOf(1, laid(6, 7)))).status).toBe(200);
  });

  it('are told of each other when one resizes and the other lays a tile', async () => {
    const id = await newLayout();
    const { shell, cells } = await draftOf(owner, id);
    const before = { staves: shell.staves, courses: shell.courses, cells };
    const after = { staves: 8, courses: 2, cells: new Uint8Array(16) };
    await designer.patch(`/layouts/${id}`, editOf(0, laid(100)));
    const patch: Patch = [{ kind: 'resize', before, after }];
    conflictIn(await both.patch(`/layouts/${id}`, editOf(0, patch)));
  });

  it('are told when each edit is good and both together are not', async () => {
    const id = await newLayout();
    const { woods } = await draftOf(owner, id);
    const fewer = await setting(owner, id, 'woods', woods.slice(0, 1));
    await designer.patch(`/layouts/${id}`, editOf(0, laid(9)));
    conflictIn(await both.patch(`/layouts/${id}`, editOf(0, fewer)));
    const again = problem(await both.patch(`/layouts/${id}`, editOf(1, fewer)), 400);
    expect(again.fields?.[0]?.field).toBe('cells');
  });

  it('all get through when twelve save at once through two server processes', async () => {
    const id = await newLayout();
    const other = appOn(running.databaseUrl);
    const browsers = [designer, both, designer.before(other.app), owner.before(other.app)];
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, i) =>
        (browsers[i % browsers.length] ?? owner).patch(`/layouts/${id}`, editOf(0, laid(i))),
      ),
    );
    const revisions = answers.map((answer) => saved(answer).revision);
    expect(revisions.sort((a, b) => a - b)).toEqual(Array.from({ length: 12 }, (_, i) => i + 1));
    expect((await draftOf(owner, id)).cells.reduce((sum, wood) => sum + wood, 0)).toBe(12);
    await other.close();
  });

  it('let exactly one through when both lay the same tile at once', async () => {
    const id = await newLayout();
    const answers = await Promise.all([
      designer.patch(`/layouts/${id}`, editOf(0, laid(1))),
      both.patch(`/layouts/${id}`, editOf(0, laid(1))),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  it('arrive at the same draft when the later one applies what it was told', async () => {
    const id = await newLayout();
    const start = await draftOf(owner, id);
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1)));
    await designer.patch(`/layouts/${id}`, editOf(1, laid(2)));
    const mine = laid(30);
    const { others } = saved(await both.patch(`/layouts/${id}`, editOf(0, mine)));
    const theirs = others.flatMap(
      (edit) => patchOfWire(recordedEditSchema.parse(edit).patch) ?? [],
    );
    expect(applyPatch(applyPatch(start, theirs), mine)).toEqual(await draftOf(owner, id));
  });
});

describe('an edit that arrives again under its key', () => {
  it('gets the same answer, also after others went on, and is not applied twice', async () => {
    const id = await newLayout();
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1)));
    const edit = editOf(0, laid(2));
    const first = await both.patch(`/layouts/${id}`, edit);
    await designer.patch(`/layouts/${id}`, editOf(2, laid(3)));
    const again = await both.patch(`/layouts/${id}`, edit);
    expect(again.status).toBe(200);
    expect(again.body).toEqual(first.body);
    expect((await openLayout(owner, id)).revision).toBe(3);
  });

  it('gets one answer when both copies arrive at once', async () => {
    const id = await newLayout();
    const edit = editOf(0, laid(2));
    const path = `/layouts/${id}`;
    const [one, two] = await Promise.all([both.patch(path, edit), both.patch(path, edit)]);
    expect(one.body).toEqual(two.body);
    expect((await openLayout(owner, id)).revision).toBe(1);
  });

  it('is refused when it holds something else, or comes from somebody else', async () => {
    const id = await newLayout();
    const edit = editOf(0, laid(2));
    await both.patch(`/layouts/${id}`, edit);
    const other = { ...edit, patch: editOf(0, laid(3)).patch };
    for (const answer of [
      await both.patch(`/layouts/${id}`, other),
      await designer.patch(`/layouts/${id}`, edit),
    ]) {
      expect(problem(answer, 400).fields?.[0]?.field).toBe('idempotencyKey');
    }
  });
});

describe('an edit that cannot be taken', () => {
  it('is refused when its base revision does not exist yet', async () => {
    const id = await newLayout();
    const refused = problem(await designer.patch(`/layouts/${id}`, editOf(5, laid(1))), 400);
    expect(refused.fields?.[0]?.field).toBe('baseRevision');
  });

  it('asks to open the layout again when the log no longer reaches back to its base', async () => {
    const id = await newLayout();
    await designer.patch(`/layouts/${id}`, editOf(0, laid(1)));
    await designer.patch(`/layouts/${id}`, editOf(1, laid(2)));
    await running.open.database
      .delete(layoutEdits)
      .where(and(eq(layoutEdits.layoutId, id), eq(layoutEdits.revision, 1)));
    const refused = problem(await both.patch(`/layouts/${id}`, editOf(0, laid(9))), 409);
    expect(refused.message).toContain('Open the layout again');
  });

  const cells = { kind: 'cells', positions: [0], before: [0], after: [1] };
  it.each<[string, object, string]>([
    ['a tile outside the grid', [{ ...cells, positions: [192] }], 'patch.0'],
    ['fewer woods than positions', [{ ...cells, positions: [0, 1] }], 'patch.0'],
    ['a wood that is not there', [{ ...cells, after: [2] }], 'cells'],
    ['a negative position', [{ ...cells, positions: [-1] }], 'patch.0.positions.0'],
    ['half a position', [{ ...cells, positions: [0.5] }], 'patch.0.positions.0'],
    ['no changes', [], 'patch'],
    ['a kind of change that does not exist', [{ kind: 'paint' }], 'patch.0.kind'],
    [
      'a field that does not exist',
      [{ kind: 'field', path: 'shell.staves', before: 24, after: 25 }],
      'patch.0.path',
    ],
    [
      'a clearance as text',
      [{ kind: 'field', path: 'joint.clearance', before: 0.12, after: '0.2' }],
      'patch.0.after',
    ],
    [
      'a bore wider than the shell',
      [{ kind: 'field', path: 'shell.finishedInnerDiameter', before: 206, after: 300 }],
      'shell.finishedInnerDiameter',
    ],
    [
      'cells that do not fill the grid',
      [
        {
          kind: 'resize',
          before: { staves: 24, courses: 8, cells: '' },
          after: { staves: 10, courses: 3, cells: 'AAAA' },
        },
      ],
      'patch.0',
    ],
    [
      'cells that are not base64',
      [
        {
          kind: 'resize',
          before: { staves: 24, courses: 8, cells: '' },
          after: { staves: 10, courses: 3, cells: '*' },
        },
      ],
      'patch',
    ],
  ])('names the field: %s', async (_, patch, field) => {
    const id = await newLayout();
    const edit = { baseRevision: 0, idempotencyKey: randomUUID(), patch };
    const refused = problem(await owner.patch(`/layouts/${id}`, edit), 400);
    expect(refused.fields?.map((each) => each.field)).toContain(field);
    expect((await openLayout(owner, id)).revision).toBe(0);
  });

  it('names every field of the edit itself that is wrong', async () => {
    const id = await newLayout();
    const edit = { baseRevision: '0', idempotencyKey: 'once', extra: 1 };
    const refused = problem(await owner.patch(`/layouts/${id}`, edit), 400);
    expect(refused.fields?.map(({ field }) => field).sort()).toEqual([
      'baseRevision',
      'extra',
      'idempotencyKey',
      'patch',
    ]);
  });

  it('is refused over two megabytes', async () => {
    const id = await newLayout();
    const huge = laid(...new Array<number>(28_800).fill(28_799));
    const edit = editOf(0, new Array<Patch>(8).fill(huge).flat());
    expect(problem(await owner.patch(`/layouts/${id}`, edit), 413).code).toBe('too-large');
  });
});

describe('the layout file', () => {
  it('is the draft, to be saved under its name', async () => {
    const id = (await newCommission(owner, 'Ångström’s lamp')).layoutId;
    const answer = await maker.get(`/layouts/${id}/file`);
    expect(answer.headers['content-disposition']).toContain('angstrom-s-lamp.json');
    const file = layoutFileSchema.parse(answer.body);
    expect(file).toEqual((await openLayout(maker, id)).layout);
  });
});

describe('a layout of another workshop', () => {
  it('answers 404 everywhere', async () => {
    const id = await newLayout();
    const elsewhere = await signedIn(running.app, 'elsewhere');
    const answers = [
      await elsewhere.get(`/layouts/${id}`),
      await elsewhere.patch(`/layouts/${id}`, editOf(0, laid(1))),
      await elsewhere.get(`/layouts/${id}/file`),
      await elsewhere.get(`/layouts/${id}/versions`),
      await elsewhere.post(`/layouts/${id}/versions`, { revision: 0 }),
    ];
    for (const answer of answers) expect(problem(answer, 404).code).toBe('not-found');
  });

  it.each(['1', 'layout', randomUUID()])('answers 404 for the id %s', async (id) => {
    expect(problem(await owner.get(`/layouts/${id}`), 404).code).toBe('not-found');
  });
});
