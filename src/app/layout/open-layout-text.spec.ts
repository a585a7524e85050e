import { applyPatch } from '@shared/layout/patch';
import { printLayout } from '@shared/layout/read-layout';
import { startingLayout } from '@shared/layout/starting-layout';
import { expect, test } from 'vitest';
import { openLayoutText } from './open-layout-text';

const here = startingLayout('Here');
const owner = { editJoint: true, editPattern: true };
const designer = { editJoint: false, editPattern: true };
const maker = { editJoint: true, editPattern: false };

function fileWith(changes: Partial<typeof here>): string {
  return printLayout({ ...here, ...changes });
}

test('a file becomes the patch that turns this layout into it', () => {
  const there = { ...here, name: 'There', cells: here.cells.slice().fill(1, 0, 5) };
  const opening = openLayoutText(printLayout(there), here, owner);
  expect(opening.kind).toBe('patch');
  expect(opening.kind === 'patch' && applyPatch(here, opening.patch)).toEqual(there);
});

test('the file of this very layout changes nothing', () => {
  expect(openLayoutText(printLayout(here), here, owner)).toEqual({ kind: 'same' });
});

test('what is wrong with a file is told by field', () => {
  const opening = openLayoutText('{"format":"staveloom-layout","formatVersion":2}', here, owner);
  expect(opening).toMatchObject({ kind: 'problems', problems: [{ field: 'formatVersion' }] });
});

test('a designer cannot bring in another joint with a file', () => {
  const text = fileWith({ joint: { ...here.joint, clearance: 0.2 } });
  expect(openLayoutText(text, here, designer)).toMatchObject({
    kind: 'problems',
    problems: [{ field: 'joint.clearance' }],
  });
  expect(openLayoutText(text, here, maker).kind).toBe('patch');
});

test('a maker cannot bring in another pattern or shell with a file', () => {
  const text = fileWith({ cells: here.cells.slice().fill(1, 0, 5) });
  expect(openLayoutText(text, here, maker)).toMatchObject({
    kind: 'problems',
    problems: [{ field: 'cells' }],
  });
  expect(openLayoutText(text, here, designer).kind).toBe('patch');
});
