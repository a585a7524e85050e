import { describe, expect, it } from 'vitest';
import { encodeCells } from './cells';
import {
  layoutFileOf,
  LAYOUT_TEXT_MOST,
  printLayout,
  readLayout,
  readLayoutText,
} from './read-layout';
import { smallLayout } from './small-layout.fixture';
import { startingLayout } from './starting-layout';

type JsonObject = Record<string, unknown>;

/** The small layout's file with some keys replaced, by path. */
function fileWith(changes: Readonly<Record<string, unknown>>): JsonObject {
  const file = JSON.parse(printLayout(smallLayout())) as JsonObject;
  for (const [path, value] of Object.entries(changes)) {
    const keys = path.split('.');
    const last = keys.pop()!;
    const owner = keys.reduce<JsonObject>((at, key) => at[key] as JsonObject, file);
    if (value === undefined) Reflect.deleteProperty(owner, last);
    else owner[last] = value;
  }
  return file;
}

function problemOf(value: unknown): string {
  const reading = readLayout(value);
  if (reading.ok) return 'none';
  return reading.problems.map(({ field, message }) => `${field}: ${message}`).join('; ');
}

describe('a layout file that holds together', () => {
  it('is read, and printed as it was', () => {
    const text = printLayout(smallLayout());
    const reading = readLayoutText(text);
    expect(reading.ok && reading.layout).toEqual(smallLayout());
    expect(reading.ok && printLayout(reading.layout)).toBe(text);
    expect(text.endsWith('}\n')).toBe(true);
  });

  it('may leave out how it is built and how its woods are sawn', () => {
    const file = fileWith({ build: undefined, 'woods.0.sawn': undefined });
    const reading = readLayout(file);
    expect(reading.ok && reading.layout.build).toEqual(smallLayout().build);
    expect(reading.ok && reading.layout.woods[0]?.sawn).toBe('flat');
  });

  it('may begin with a byte order mark', () => {
    expect(readLayoutText(`\uFEFF${printLayout(smallLayout())}`).ok).toBe(true);
  });

  it('is what a new commission starts from', () => {
    expect(readLayout(layoutFileOf(startingLayout('New shell'))).ok).toBe(true);
  });
});

describe('a document that is no layout file', () => {
  it.each([null, 7, 'text', [], [{}]])('%j is refused whole', (value) => {
    expect(problemOf(value)).toBe('file: must be a JSON object, the layout document');
  });

  it('of another format or a newer version says so', () => {
    expect(problemOf(fileWith({ format: 'other' }))).toBe(
      'format: must be "staveloom-layout"; this is not a layout file',
    );
    expect(problemOf(fileWith({ formatVersion: 2 }))).toBe(
      'formatVersion: is 2: this file was written by a newer Staveloom; this one reads up to version 1',
    );
    expect(problemOf(fileWith({ formatVersion: 0 }))).toMatch(/^formatVersion: must be a whole/);
  });

  it('that is not JSON, or far too long, is not looked into', () => {
    const notJson = readLayoutText('{');
    expect(notJson.ok ? [] : notJson.problems).toEqual([
      { field: 'file', message: 'is not JSON, so it is not a layout file' },
    ]);
    const long = readLayoutText(' '.repeat(LAYOUT_TEXT_MOST + 1));
    expect(long.ok ? '' : long.problems[0]?.message).toMatch(/^must be at most 256 KiB/);
  });
});

describe('a field that is wrong is named', () => {
  it.each([
    [{ 'shell.staves': 5 }, 'shell.staves: must be a whole number from 6 to 240'],
    [{ 'shell.staves': 8.5 }, 'shell.staves: must be a whole number from 6 to 240'],
    [{ 'shell.tileWidth': 1e308 }, 'shell.tileWidth: must be a number from 6 to 300 mm'],
    [{ 'shell.tileWidth': NaN }, 'shell.tileWidth: must be a number from 6 to 300 mm'],
    [{ 'shell.tileWidth': '28' }, 'shell.tileWidth: must be a number from 6 to 300 mm'],
    [{ 'joint.clearance': -0.01 }, 'joint.clearance: must be a number from 0 to 2 mm'],
    [{ 'joint.staveJoint.profile': 'square' }, /^joint.staveJoint.*: must be a "round" or a/],
    [{ 'shell.colour': 'red' }, 'shell.colour: is not a known key here'],
    [{ surprise: 1 }, 'surprise: is not a known key here'],
    [{ woods: [] }, 'woods: must list 1 to 24 woods'],
    [{ name: '  ' }, 'name: must not be only spaces'],
    [{ name: 'a\u0007b' }, 'name: must not contain control characters'],
    [{ 'woods.0.colour': 'red' }, 'woods.0.colour: must be a colour such as "#DCC39A"'],
    [{ cells: '!' }, 'cells: must be base64 text (RFC 4648, with padding)'],
  ])('%j', (changes, problem) => {
    const found = problemOf(fileWith(changes));
    if (typeof problem === 'string') expect(found).toBe(problem);
    else expect(found).toMatch(problem);
  });

  it('a key with control characters is repeated without them, and shortened', () => {
    expect(problemOf(fileWith({ 'a\u0000b': 1 }))).toBe('a?b: is not a known key here');
    expect(problemOf(fileWith({ ['k'.repeat(99)]: 1 }))).toBe(
      `${'k'.repeat(60)}…: is not a known key here`,
    );
  });
});

describe('fields that do not go together', () => {
  it.each([
    [
      { cells: encodeCells(new Uint8Array(23)) },
      'cells: must hold one byte a tile: 8 staves × 3 courses need 24 bytes, not 23',
    ],
    [
      { cells: encodeCells(new Uint8Array(24).fill(9, 5, 6)) },
      'cells: names wood 9 at byte 5, but there are woods 0 to 3',
    ],
    [{ 'woods.2.key': 'ash' }, 'woods.2.key: must not repeat the key "ash" of wood 0'],
    [
      { 'shell.finishedInnerDiameter': 60 },
      'shell.finishedInnerDiameter: must be under the outer diameter, 60.00 mm',
    ],
    [
      { 'shell.finishedInnerDiameter': 16 },
      "shell.finishedInnerDiameter: must be over 16.20 mm: twice the stave joint's reach and the skim allowance",
    ],
    [
      { 'joint.courseJoint.reach': 12 },
      'joint.courseJoint.reach: must be at most 10.46 mm: beyond it the neck closes',
    ],
    [
      { 'joint.courseJoint.reach': 12, lengthUnit: 'in' },
      'joint.courseJoint.reach: must be at most 0.412 in: beyond it the neck closes',
    ],
  ])('%j', (changes, problem) => {
    expect(problemOf(fileWith(changes))).toBe(problem);
  });
});
