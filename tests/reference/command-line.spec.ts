/**
 * `npm run bundle` as a program: what it writes, prints and returns. Most runs call its function in this
 * process; the exit codes are taken from real processes.
 */
import { spawnSync } from 'node:child_process';
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';
import { buildBundle } from '@exports/bundle';
import { runBundleCommand } from '@exports/command-line';
import { CHECK_KEYS } from '@shared/checks/check';
import { fixtureLayout, fixtureNames, fixturePath } from './fixtures';

const folder = mkdtempSync(join(tmpdir(), 'staveloom-command-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));
let made = 0;
const freshPlace = () => join(folder, `out-${(made += 1)}`);

const LANTERN = fixturePath('ok/ferry-hall-lantern.json');
const STOPPED = fixturePath('ok/cutter-too-large.json');

async function run(...args: string[]) {
  const out: string[] = [];
  const errors: string[] = [];
  const printer = {
    log: (line: string) => void out.push(line),
    error: (line: string) => void errors.push(line),
  };
  const code = await runBundleCommand(args, printer);
  return { code, out: out.join('\n'), errors: errors.join('\n') };
}

function spawned(...args: string[]) {
  const tsx = pathToFileURL(createRequire(import.meta.url).resolve('tsx')).href;
  const program = fileURLToPath(new URL('../../exports/command-line.ts', import.meta.url));
  const tsconfig = fileURLToPath(new URL('../../tsconfig.json', import.meta.url));
  return spawnSync(process.execPath, ['--import', tsx, program, ...args], {
    env: { ...process.env, TSX_TSCONFIG_PATH: tsconfig },
    encoding: 'utf8',
  });
}

function filesUnder(place: string): string[] {
  return readdirSync(place, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(place.length + 1))
    .sort();
}

describe('exit codes of the process', () => {
  it('0 and a line a check when the bundle is written', () => {
    const place = freshPlace();
    const ended = spawned(LANTERN, place);
    expect(ended.stderr).toBe('');
    expect(ended.status).toBe(0);
    for (const key of CHECK_KEYS) expect(ended.stdout).toMatch(new RegExp(`^clear +${key} `, 'm'));
    expect(existsSync(join(place, 'manifest.json'))).toBe(true);
  });

  it('1 on a stop, with nothing written', () => {
    const place = freshPlace();
    const ended = spawned(STOPPED, place);
    expect(ended.status).toBe(1);
    expect(ended.stdout).toMatch(/^stop +inside-radius /m);
    expect(ended.stderr).toContain('nothing is written');
    expect(existsSync(place)).toBe(false);
  });

  it('2 on a bad file, with the field named', () => {
    const ended = spawned(fixturePath('not-ok/unknown-key.json'), freshPlace());
    expect(ended.status).toBe(2);
    expect(ended.stdout).toBe('');
    expect(ended.stderr).toContain('shell.veneer');
  });
});

describe('what is written', () => {
  it('is the bundle, unpacked, and nothing beside it', async () => {
    const place = freshPlace();
    const { code } = await run(LANTERN, place, '--dxf', 'r12', '--unit', 'in', '--centre-path');
    expect(code).toBe(0);
    const result = buildBundle(fixtureLayout('ferry-hall-lantern.json'), {
      ...{ dxf: 'r12', unit: 'in', centrePath: true, version: null },
    });
    const files = result.ok ? result.bundle.files : [];
    expect(filesUnder(place)).toEqual(files.map((file) => file.path).sort());
    for (const { path, text } of files) expect(readFileSync(join(place, path), 'utf8')).toBe(text);
    expect(readdirSync(folder).filter((name) => /\.(new|old)$/.test(name))).toEqual([]);
  });

  it('goes on after a stop with a reason, which the manifest keeps', async () => {
    const place = freshPlace();
    const args = ['--override', 'filed by hand', '--by', 'Ines Marlow'];
    expect((await run(STOPPED, place, ...args)).code).toBe(0);
    const manifest: unknown = JSON.parse(readFileSync(join(place, 'manifest.json'), 'utf8'));
    expect(manifest).toMatchObject({
      override: { who: 'Ines Marlow', reason: 'filed by hand', stops: ['inside-radius'] },
    });
  });

  it('replaces a bundle it wrote before, leaving none of its files behind', async () => {
    const place = freshPlace();
    await run(fixturePath('ok/hostile-names.json'), place);
    expect((await run(LANTERN, place)).code).toBe(0);
    const fresh = freshPlace();
    await run(LANTERN, fresh);
    expect(filesUnder(place)).toEqual(filesUnder(fresh));
  });

  it('never touches a folder that holds anything else', async () => {
    const place = freshPlace();
    mkdirSync(place);
    writeFileSync(join(place, 'notes.txt'), 'mine');
    const foreign = await run(LANTERN, place);
    expect(foreign.code).toBe(2);
    expect(foreign.errors).toContain('notes.txt');
    expect(filesUnder(place)).toEqual(['notes.txt']);

    const ours = freshPlace();
    await run(LANTERN, ours);
    writeFileSync(join(ours, 'notes.txt'), 'mine');
    expect((await run(LANTERN, ours)).code).toBe(2);
    expect(readFileSync(join(ours, 'notes.txt'), 'utf8')).toBe('mine');
  });

  it('an empty folder is taken, a file in its place is not', async () => {
    const empty = freshPlace();
    mkdirSync(empty);
    expect((await run(LANTERN, empty)).code).toBe(0);
    const file = freshPlace();
    writeFileSync(file, 'mine');
    const refused = await run(LANTERN, file);
    expect(refused.code).toBe(2);
    expect(refused.errors).toContain('OUTDIR');
    expect(readFileSync(file, 'utf8')).toBe('mine');
  });
});

describe('arguments', () => {
  it.each([
    ['no layout file', [], 'LAYOUT.json'],
    ['no folder', [LANTERN], 'OUTDIR'],
    ['one too many', [LANTERN, 'a', 'b'], 'b: is one argument too many'],
    ['a release that is none', [LANTERN, 'out', '--dxf', 'r14'], '--dxf: must be "r2000" or "r12"'],
    ['a unit that is none', [LANTERN, 'out', '--unit', 'cm'], '--unit: must be "mm" or "in"'],
    ['an empty reason', [LANTERN, 'out', '--override', ' '], '--override: must say why'],
    ['a name of two lines', [LANTERN, 'out', '--by', 'a\nb'], '--by: must not contain control'],
    ['an option that is none', [LANTERN, 'out', '--quick'], '--quick'],
    ['an option without its value', [LANTERN, 'out', '--dxf'], '--dxf'],
  ])('%s: 2, named', async (_, args, said) => {
    const { code, errors } = await run(...args);
    expect(code).toBe(2);
    expect(errors).toContain(said);
  });

  it('--help tells the options and the exit codes', async () => {
    const { code, out } = await run('--help');
    expect(code).toBe(0);
    for (const said of ['--dxf', '--unit', '--centre-path', '--override', 'Exit code']) {
      expect(out).toContain(said);
    }
  });
});

/** The field each bad file must be refused by. */
const REFUSED_BY: Readonly<Record<string, string>> = {
  'a-list.json': 'file',
  'cells-far-too-long.json': 'cells',
  'cells-naming-no-wood.json': 'cells',
  'cells-not-base64.json': 'cells',
  'cells-too-long.json': 'cells',
  'cells-too-short.json': 'cells',
  'control-characters.json': 'name',
  'duplicate-wood-keys.json': 'woods.1.key',
  'empty.json': 'file',
  'half-a-stave.json': 'shell.staves',
  'huge-number.json': 'shell.tileWidth',
  'line-break-in-a-wood.json': 'woods.1.name',
  'name-of-10000-characters.json': 'name',
  'nested-too-deep.json': 'file',
  'newer-version.json': 'formatVersion',
  'no-woods.json': 'woods',
  'not-a-number.json': 'file',
  'not-json.json': 'file',
  'number-as-text.json': 'shell.staves',
  'past-the-largest-number.json': 'shell.tileWidth',
  'prototype-key.json': '__proto__',
  'shell-missing.json': 'shell',
  'tab-without-a-neck.json': 'joint.staveJoint.reach',
  'tile-too-small.json': 'shell.tileHeight',
  'unknown-key.json': 'shell.veneer',
  'wood-colour-with-markup.json': 'woods.0.colour',
  'wood-key-with-a-path.json': 'woods.0.key',
  'wrong-format.json': 'format',
};

describe('bad layout files', () => {
  it.each(fixtureNames('not-ok'))('%s is refused by its field, in a sentence', async (name) => {
    const place = freshPlace();
    const { code, out, errors } = await run(fixturePath(`not-ok/${name}`), place);
    expect(code).toBe(2);
    expect(out).toBe('');
    expect(errors).toContain(`${name}: ${REFUSED_BY[name] ?? 'a field that is not listed'} `);
    expect(errors).toMatch(/^[^\u0000-\u0009\u000b-\u001f\u007f]+$/);
    expect(errors.length).toBeLessThan(500);
    expect(existsSync(place)).toBe(false);
  });

  it('50 MB are refused at once, unread', async () => {
    const path = join(folder, 'large.json');
    writeFileSync(path, Buffer.alloc(50 * 1024 * 1024, '['));
    const start = performance.now();
    const { code, errors } = await run(path, freshPlace());
    expect(performance.now() - start).toBeLessThan(1000);
    expect(code).toBe(2);
    expect(errors).toContain('larger than 1 MiB');
  });

  it('bytes that are not text are refused', async () => {
    const path = join(folder, 'picture.json');
    writeFileSync(path, Buffer.from([0x89, 0x50, 0x4e, 0x47, 0xff, 0xfe]));
    const { code, errors } = await run(path, freshPlace());
    expect(code).toBe(2);
    expect(errors).toContain('is not UTF-8 text');
  });

  it('a file that is not there, and a folder in its place', async () => {
    const missing = await run(join(folder, 'nowhere.json'), freshPlace());
    expect(missing).toMatchObject({ code: 2, out: '' });
    expect(missing.errors).toContain('cannot be opened (ENOENT)');
    const isFolder = await run(folder, freshPlace());
    expect(isFolder).toMatchObject({ code: 2, out: '' });
    expect(isFolder.errors).toContain('is not a file');
  });
});
