import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { Edit, EditSaved, OpenLayout } from '@shared/api/layout';
import { resizeChange } from '@shared/layout/carry';
import { fieldChange, layChange } from '@shared/layout/patch';
import { layoutFileOf } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ApiFailure } from '../platform/api-problem';
import { SessionStore } from '../platform/session-store';
import { LayoutApi } from './layout-api';
import { LayoutStore, type Applied } from './layout-store';
import { LiveEvents } from './live-events';

const ID = '7b0c1c50-0c54-4a63-9f39-3c5a5f3a1d11';
const plain = startingLayout('Lantern');
const layout: Layout = {
  ...plain,
  woods: [...plain.woods, { key: 'sapele', name: 'Sapele', colour: '#964B33', sawn: 'quarter' }],
};

/** Answers saves as the test says; "saved" when nothing is said. */
class ApiDesk {
  readonly saves: Edit[] = [];
  readonly answers: (EditSaved | ApiFailure)[] = [];
  revision = 4;

  open(): Promise<OpenLayout> {
    return Promise.resolve({
      id: ID,
      commission: { id: ID, title: 'Lantern', client: null, archived: false },
      revision: this.revision,
      layout: layoutFileOf(layout),
      lastVersion: { number: 3, revision: 4 },
    });
  }

  save(_layoutId: string, edit: Edit): Promise<EditSaved> {
    this.saves.push(edit);
    const answer = this.answers.shift() ?? { revision: ++this.revision, others: [] };
    return answer instanceof ApiFailure ? Promise.reject(answer) : Promise.resolve(answer);
  }
}

function others(revision: number, patch: Edit['patch']): EditSaved {
  const by = { id: ID, name: 'Bela Novak' };
  return { revision, others: [{ revision, patch, by, idempotencyKey: crypto.randomUUID() }] };
}

function conflict(revision: number, patch: Edit['patch']): ApiFailure {
  const body = { conflict: others(revision, patch) };
  return new ApiFailure(409, 'conflict', 'Somebody else has changed the same place.', [], body);
}

describe('an open layout', () => {
  let desk: ApiDesk;
  let store: LayoutStore;
  let applied: Applied[];

  beforeEach(async () => {
    desk = new ApiDesk();
    const person = signal(null);
    TestBed.configureTestingModule({
      providers: [
        LayoutStore,
        { provide: LayoutApi, useValue: desk },
        { provide: LiveEvents, useValue: { people: signal([]), watch: () => undefined } },
        { provide: SessionStore, useValue: { person, may: () => true } },
      ],
    });
    store = TestBed.inject(LayoutStore);
    applied = [];
    store.applied$.subscribe((change) => applied.push(change));
    await store.open(ID);
  });

  it('asks for no check again while tiles are laid, until other woods lie side by side', () => {
    const lay = (position: number, wood: number) =>
      store.edit('Lay', layChange(store.cells(), [position], wood));
    lay(0, 1);
    const before = store.checks();
    expect(before.at(-1)).toMatchObject({ key: 'contrast', station: 'pattern' });
    lay(40, 1);
    expect(store.checks()).toBe(before);
    lay(80, store.woods().length - 1);
    expect(store.checks()).not.toBe(before);
    expect(store.checks()[0]).toBe(before[0]);
  });

  afterEach(() => TestBed.resetTestingModule());

  it('shows the draft as the server has it', () => {
    expect(store.openState().kind).toBe('open');
    expect(store.layout()).toEqual(layout);
    expect(applied.map(({ origin }) => origin)).toEqual(['opened']);
  });

  it('makes one step of a gesture, however many moves it had', async () => {
    const gesture = store.begin('Lay walnut on 2 tiles');
    gesture.apply(layChange(store.cells(), [3], 1));
    expect(store.canUndo()).toBe(false);
    gesture.apply(layChange(store.cells(), [4], 1));
    gesture.finish();
    expect(store.undoLabel()).toBe('Lay walnut on 2 tiles');
    await store.flush();
    expect(desk.saves.map((save) => save.patch)).toEqual([
      [{ kind: 'cells', positions: [3, 4], before: [0, 0], after: [1, 1] }],
    ]);
    store.undo();
    expect(store.cells()).toEqual(layout.cells);
    await store.flush();
    expect(desk.saves).toHaveLength(2);
    expect(desk.saves[1]?.baseRevision).toBe(5);
  });

  it('leaves no trace of a gesture that was cancelled', async () => {
    const gesture = store.begin('Lay walnut');
    gesture.apply(layChange(store.cells(), [3, 4], 1));
    gesture.cancel();
    expect(store.cells()).toEqual(layout.cells);
    expect(store.canUndo()).toBe(false);
    await store.flush();
    expect(desk.saves).toEqual([]);
  });

  it('sends a failed save again with the same key, with what came later in a save of its own', async () => {
    desk.answers.push(new ApiFailure(0, 'unavailable', 'The server does not answer.'));
    store.edit('Set tile width', fieldChange(store.layout(), 'shell.tileWidth', 31));
    await store.flush();
    expect(store.saving()).toMatchObject({
      kind: 'failed',
      sentence: 'The server does not answer.',
    });
    store.edit('Set tile height', fieldChange(store.layout(), 'shell.tileHeight', 31));
    expect(store.unsaved()).toBe(true);
    await store.flush();
    const keys = desk.saves.map((save) => save.idempotencyKey);
    expect(keys[1]).toBe(keys[0]);
    expect(keys[2]).not.toBe(keys[0]);
    expect(store.saving().kind).toBe('saved');
  });

  it('keeps my tile over theirs and remembers where they met, until I lay it again', async () => {
    desk.answers.push(
      conflict(5, [{ kind: 'cells', positions: [3, 9], before: [0, 0], after: [2, 2] }]),
    );
    store.edit('Lay walnut', layChange(store.cells(), [3], 1));
    await store.flush();
    expect([store.cells()[3], store.cells()[9]]).toEqual([1, 2]);
    expect([...store.overlaidByMine()]).toEqual([3]);
    expect(applied.at(-1)).toEqual({
      origin: 'theirs',
      patch: [{ kind: 'cells', positions: [9], before: [0], after: [2] }],
    });
    expect(desk.saves[1]?.patch).toMatchObject([{ positions: [3], before: [2], after: [1] }]);
    store.edit('Lay maple', layChange(store.cells(), [3], 0));
    expect([...store.overlaidByMine()]).toEqual([]);
  });

  it('asks about a field both set, and leaves theirs until it is answered', async () => {
    desk.answers.push(
      conflict(5, [{ kind: 'field', path: 'shell.tileWidth', before: 30, after: 32 }]),
    );
    store.edit('Set tile width', fieldChange(store.layout(), 'shell.tileWidth', 31));
    await store.flush();
    expect(store.layout().shell.tileWidth).toBe(32);
    const [contest] = store.contests();
    expect(contest).toMatchObject({ kind: 'field', mine: { before: 32, after: 31 } });
    if (contest) store.settleContest(contest);
    expect(store.contests()).toEqual([]);
  });

  it('takes back an edit the server will never take, and says why', async () => {
    const fields = [{ field: 'shell.tileWidth', message: 'must be a number from 6 to 300 mm' }];
    desk.answers.push(new ApiFailure(400, 'bad-input', 'This cannot be saved.', fields));
    store.edit('Set tile width', fieldChange(store.layout(), 'shell.tileWidth', 31));
    await store.flush();
    expect(store.layout().shell.tileWidth).toBe(30);
    expect(store.refused()?.fields).toEqual(fields);
    expect(store.unsaved()).toBe(false);
  });

  it('brings in what others did meanwhile when a save goes through', async () => {
    desk.answers.push(others(6, [{ kind: 'cells', positions: [7], before: [0], after: [1] }]));
    store.edit('Set tile width', fieldChange(store.layout(), 'shell.tileWidth', 31));
    await store.flush();
    expect(store.cells()[7]).toBe(1);
    expect(store.revision()).toBe(6);
    expect(store.undoLabel()).toBe('Set tile width');
  });

  it('forgets its steps when somebody else resizes the shell', async () => {
    const grid = { staves: 26, courses: layout.shell.courses };
    const resized = resizeChange(layout, grid);
    store.edit('Lay walnut', layChange(store.cells(), [3], 1));
    const cells = (bytes: Uint8Array) => btoa(String.fromCharCode(...bytes));
    desk.answers.push(
      conflict(5, [
        {
          kind: 'resize',
          before: { staves: 24, courses: 8, cells: cells(layout.cells) },
          after: { ...grid, cells: cells(resized?.after.cells ?? new Uint8Array()) },
        },
      ]),
    );
    await store.flush();
    expect(store.grid()).toEqual(grid);
    expect(store.cells()[3]).toBe(1);
    expect(store.canUndo()).toBe(false);
  });
});
