import type { Patch } from '@shared/layout/patch';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signedIn, type Browser } from './browser';
import {
  draftOf,
  editOf,
  laid,
  newCommission,
  openLayout,
  problem,
  setting,
} from './demonstration';
import { runningApp, type RunningApp } from './running-app';

let running: RunningApp;
let owner: Browser;
let designer: Browser;
let maker: Browser;
beforeAll(async () => {
  running = await runningApp();
  owner = await signedIn(running.app, 'owner');
  designer = await signedIn(running.app, 'designer');
  maker = await signedIn(running.app, 'maker');
});
afterAll(() => running.close());

async function newLayout(): Promise<string> {
  return (await newCommission(owner)).layoutId;
}

describe('who may change what', () => {
  it('lets a designer change size, woods and pattern, but not the joint', async () => {
    const id = await newLayout();
    const taller = await setting(owner, id, 'shell.finishedHeight', 220);
    expect((await designer.patch(`/layouts/${id}`, editOf(0, taller))).status).toBe(200);
    const wider = await setting(owner, id, 'joint.clearance', 0.2);
    const refused = problem(await designer.patch(`/layouts/${id}`, editOf(1, wider)), 403);
    expect(refused.code).toBe('not-allowed');
  });

  it('lets a maker change joint, cutter and building, but not the pattern', async () => {
    const id = await newLayout();
    const cutter = await setting(owner, id, 'cutter.diameter', 3);
    const build = await setting(owner, id, 'build.turnOver', false);
    expect((await maker.patch(`/layouts/${id}`, editOf(0, [...cutter, ...build]))).status).toBe(
      200,
    );
    expect(problem(await maker.patch(`/layouts/${id}`, editOf(1, laid(1))), 403).code).toBe(
      'not-allowed',
    );
  });

  it('lets both rename it and choose the unit', async () => {
    const id = await newLayout();
    const name = await setting(owner, id, 'name', 'Another name');
    const unit = await setting(owner, id, 'lengthUnit', 'in');
    expect((await maker.patch(`/layouts/${id}`, editOf(0, name))).status).toBe(200);
    expect((await designer.patch(`/layouts/${id}`, editOf(1, unit))).status).toBe(200);
  });

  it('judges by what really changes: a maker may send a tile that stays as it is', async () => {
    const id = await newLayout();
    const same: Patch = [{ kind: 'cells', positions: [1], before: [0], after: [0] }];
    const cutter = await setting(owner, id, 'cutter.diameter', 3);
    const edit = editOf(0, [...same, ...cutter]);
    expect((await maker.patch(`/layouts/${id}`, edit)).status).toBe(200);
  });

  it('takes an edit whole or not at all', async () => {
    const id = await newLayout();
    const wider = await setting(owner, id, 'joint.clearance', 0.2);
    await designer.patch(`/layouts/${id}`, editOf(0, [...laid(1), ...wider]));
    expect((await openLayout(owner, id)).revision).toBe(0);
    expect((await draftOf(owner, id)).cells[1]).toBe(0);
  });
});
