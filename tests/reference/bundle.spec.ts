/**
 * Whole bundles, read back by programs that are not ours: ZIP and CSV by Python's standard library
 * (zipfile; csv, RFC 4180), SHA-256 by Python's hashlib, XML by saxes and
 * fast-xml-parser. Formula cells: OWASP,
 * "CSV Injection".
 */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { XMLParser } from 'fast-xml-parser';
import { afterAll, describe, expect, it } from 'vitest';
import * as z from 'zod';
import { buildBundle, bundleZip, type Bundle, type BundleOptions } from '@exports/bundle';
import { readLayoutText } from '@shared/layout/read-layout';
import { fixtureLayout, fixturePath } from './fixtures';
import { xmlErrors } from './xml-readers';

const here = (name: string) => fileURLToPath(new URL(name, import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'staveloom-bundle-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const PLAIN: BundleOptions = { dxf: 'r2000', unit: 'mm', centrePath: false, version: null };

function bundleOf(name: string, options: Partial<BundleOptions> = {}): Bundle {
  const result = buildBundle(fixtureLayout(name), { ...PLAIN, ...options });
  if (!result.ok) throw new Error(`${name} was stopped`);
  return result.bundle;
}

function textOf(bundle: Bundle, path: string): string {
  const file = bundle.files.find((each) => each.path === path);
  if (!file) throw new Error(`the bundle has no ${path}`);
  return file.text;
}

const bundleReadingSchema = z.object({
  bad: z.null(),
  names: z.array(z.string()),
  dates: z.array(z.string()),
  digests: z.record(z.string(), z.string()),
  rows: z.array(z.array(z.string())),
});

function readWithPython(bundle: Bundle) {
  const path = join(folder, 'bundle.zip');
  writeFileSync(path, bundleZip(bundle));
  const run = spawnSync('/usr/bin/python3', [here('read_bundle.py'), path], { encoding: 'utf8' });
  if (run.status !== 0) throw new Error(run.stderr);
  return bundleReadingSchema.parse(JSON.parse(run.stdout));
}

const manifestSchema = z.looseObject({
  files: z.array(z.object({ path: z.string(), sha256: z.string() })),
  pieces: z.array(
    z.looseObject({
      files: z.array(z.string()),
      wood: z.string(),
      edges: z.record(z.string(), z.string()),
      mirrored: z.boolean(),
      count: z.number(),
      spares: z.number(),
      tiles: z.array(z.string()),
      faceDown: z.array(z.string()).optional(),
      centrePath: z.string().optional(),
    }),
  ),
});

const manifestIn = (bundle: Bundle) =>
  manifestSchema.parse(JSON.parse(textOf(bundle, 'manifest.json')));

describe('the bundle of the ferry-hall lantern', () => {
  const bundle = bundleOf('ferry-hall-lantern.json', { version: { number: 3, note: 'for Ines' } });
  const manifest = manifestIn(bundle);

  it('its ZIP is read by Python, every digest of the manifest is right and nothing is unlisted', () => {
    const read = readWithPython(bundle);
    expect(read.names).toEqual(bundle.files.map((file) => file.path));
    expect(read.names).toEqual(['manifest.json', ...manifest.files.map((file) => file.path)]);
    for (const { path, sha256 } of manifest.files) expect(read.digests[path]).toBe(sha256);
    expect(read.dates).toEqual(['(1980, 1, 1, 12, 0, 0)']);
  });

  it('its cut list has the rows of the manifest', () => {
    const [headings, ...rows] = readWithPython(bundle).rows;
    expect(headings).toEqual([
      ...['kind', 'wood', 'edges', 'drawn as seen', 'count', 'spares', 'to cut'],
      ...['length along grain (mm)', 'width (mm)', 'board length (mm)', 'tiles'],
    ]);
    expect(rows).toHaveLength(manifest.pieces.length);
    manifest.pieces.forEach((piece, index) => {
      const row = rows[index] ?? [];
      expect(row[0]).toBe(String(index + 1));
      expect(row[4]).toBe(String(piece.count));
      expect(row[5]).toBe(String(piece.spares));
      expect(row[6]).toBe(String(piece.count + piece.spares));
      expect(row.at(-1)?.split(', ')).toEqual(piece.tiles);
    });
  });

  it('every tile is in one piece kind, and every kind has its files', () => {
    const tiles = manifest.pieces.flatMap((piece) => piece.tiles);
    expect(tiles).toHaveLength(32 * 9);
    expect(new Set(tiles).size).toBe(32 * 9);
    for (const piece of manifest.pieces) {
      expect(piece.tiles).toHaveLength(piece.count);
      expect(piece.files).toHaveLength(2);
      for (const path of piece.files) expect(textOf(bundle, path)).not.toBe('');
      for (const tile of piece.faceDown ?? []) expect(piece.tiles).toContain(tile);
    }
  });

  it('its layout.json opens again as the same layout', () => {
    const reading = readLayoutText(textOf(bundle, 'layout.json'));
    expect(reading).toEqual({ ok: true, layout: fixtureLayout('ferry-hall-lantern.json') });
  });

  it('the manifest names program, version, unit, clearance, cutter and checks', () => {
    expect(manifest).toMatchObject({
      format: 'staveloom-bundle',
      formatVersion: 1,
      program: { name: 'Staveloom' },
      layout: { name: 'Ferry-hall lantern', staves: 32, courses: 9 },
      version: { number: 3, note: 'for Ines' },
      unit: 'mm',
      clearance: 0.12,
      cutter: { diameter: 3.175, fluteLength: 16 },
      override: null,
    });
    expect(manifest['checks']).toContainEqual({
      key: 'flute',
      result: 'clear',
      figure: { value: 16, unit: 'mm' },
      limit: { value: 14, unit: 'mm' },
    });
  });

  it('in inches every length of the manifest is in inches', () => {
    const inches = manifestIn(bundleOf('ferry-hall-lantern.json', { unit: 'in' }));
    expect(inches).toMatchObject({ unit: 'in', clearance: 0.004724, cutter: { diameter: 0.125 } });
    expect(inches['checks']).toContainEqual({
      key: 'flute',
      result: 'clear',
      figure: { value: 0.629921, unit: 'in' },
      limit: { value: 0.551181, unit: 'in' },
    });
  });

  it('the map is a valid drawing with a place for every tile', () => {
    const text = textOf(bundle, 'pattern.svg');
    expect(xmlErrors(text)).toEqual([]);
    expect(text.match(/<use /g)).toHaveLength(32 * 9);
    for (const id of new Set(text.match(/(?<=href="#)[^"]+/g))) {
      expect(text).toContain(`<g id="${id}">`);
    }
    for (const said of ['A 1', 'I 32', 'White ash', 'Black walnut', 'Seam', 'Trim line: 7.00 mm']) {
      expect(text).toContain(said);
    }
  });
});

describe('a trade fact, common practice without a source', () => {
  it('two woods in a checker, tabs alternating, 40 × 8: four kinds of 40, 120, 120 and 40', () => {
    const { pieces } = manifestIn(bundleOf('two-woods-in-a-checker.json'));
    const counts = pieces.map((piece) => piece.count).sort((a, b) => a - b);
    expect(counts).toEqual([40, 40, 120, 120]);
  });
});

describe('a stop', () => {
  it('refuses the bundle with its checks', () => {
    const result = buildBundle(fixtureLayout('cutter-too-large.json'), PLAIN);
    expect(result.ok).toBe(false);
    const stops = result.ok ? [] : result.checks.filter((check) => check.result === 'stop');
    expect(stops.map((check) => check.key)).toEqual(['inside-radius']);
  });

  it('overridden in writing it is recorded with who and why, and no centre path is drawn', () => {
    const override = { who: 'Ines Marlow', reason: 'filed by hand' };
    const manifest = manifestIn(bundleOf('cutter-too-large.json', { override, centrePath: true }));
    expect(manifest['override']).toEqual({ ...override, stops: ['inside-radius'] });
    for (const piece of manifest.pieces) {
      expect(piece.centrePath).toBe('left out: the cutter does not fit');
    }
  });

  it('an override where nothing stops is not recorded', () => {
    const override = { who: 'Ines Marlow', reason: 'just in case' };
    expect(manifestIn(bundleOf('ferry-hall-lantern.json', { override }))['override']).toBeNull();
  });
});

describe('hostile names', () => {
  const bundle = bundleOf('hostile-names.json');
  const { woods, name } = fixtureLayout('hostile-names.json');

  it('paths are made of numbers and wood keys only', () => {
    for (const { path } of bundle.files) expect(path).toMatch(/^[a-z0-9/-]+\.(json|csv|svg|dxf)$/);
  });

  it('reach SVG only as text', () => {
    for (const { path, text } of bundle.files.filter((file) => file.path.endsWith('.svg'))) {
      expect(xmlErrors(text), path).toEqual([]);
      expect(text).not.toMatch(/<script|<path d="M0 0"/);
    }
    const map = new XMLParser().parse(textOf(bundle, 'pattern.svg')) as unknown;
    expect(map).toMatchObject({ svg: { title: name } });
    const titles = bundle.files
      .filter((file) => /^outlines\/.*svg$/.test(file.path))
      .map((file) => new XMLParser().parse(file.text) as { svg: { title: string } })
      .map((read) => read.svg.title.slice(3));
    expect(new Set(titles)).toEqual(new Set(woods.map((wood) => wood.name)));
  });

  it('reach DXF only as one line of ASCII', () => {
    const dxf = bundle.files.filter((file) => file.path.endsWith('.dxf'));
    for (const { text } of dxf) {
      expect(text).toMatch(/^[\x20-\x7e\r\n]*$/);
      expect(text).not.toContain('%%');
      expect(text.match(/\r\nEOF\r\n/g)).toHaveLength(1);
    }
  });

  it('reach CSV whole, and never as a formula', () => {
    const [, ...rows] = readWithPython(bundle).rows;
    const written = new Set(rows.map((row) => row[1]));
    for (const wood of woods) {
      const expected = /^[=+\-@＝]/.test(wood.name) ? `'${wood.name}` : wood.name;
      expect(written).toContain(expected);
    }
    for (const cell of rows.flat()) expect(cell).not.toMatch(/^[=+\-@\t\r＝]/);
  });
});

/** The digest of the ZIP as a process of its own makes it in another place. */
function digestAt(place: Readonly<Record<string, string>>): string {
  const tsx = pathToFileURL(createRequire(import.meta.url).resolve('tsx')).href;
  const fixture = fixturePath('ok/ferry-hall-lantern.json');
  const run = spawnSync(process.execPath, ['--import', tsx, here('zip-digest.ts'), fixture], {
    env: { ...process.env, ...place, TSX_TSCONFIG_PATH: here('../../tsconfig.json') },
    encoding: 'utf8',
  });
  if (run.status !== 0) throw new Error(run.stderr);
  return run.stdout;
}

describe('the same bytes every time', () => {
  it('in another process, time zone and language', () => {
    const digests = [
      digestAt({ TZ: 'UTC', LC_ALL: 'C' }),
      digestAt({ TZ: 'Pacific/Kiritimati', LC_ALL: 'de_DE.UTF-8' }),
      digestAt({ TZ: 'America/Los_Angeles', LC_ALL: 'tr_TR.UTF-8' }),
    ];
    expect(digests[0]).toMatch(/^[0-9a-f]{64}$/);
    expect(new Set(digests).size).toBe(1);
  });

  it('no file holds a time', () => {
    const year = String(new Date().getFullYear());
    for (const { text } of bundleOf('two-woods-in-a-checker.json').files) {
      expect(text).not.toContain(`${year}-`);
    }
  });
});

describe('the largest shell', () => {
  it('costs by kinds: 240 × 120 has as many outlines as 32 × 9, and a map under a megabyte', () => {
    const small = fixtureLayout('ferry-hall-lantern.json');
    const shell = { ...small.shell, staves: 240, courses: 120, finishedHeight: 3346 };
    const cells = Uint8Array.from({ length: 240 * 120 }, (_, position) => position % 2);
    const override = { who: 'the tests', reason: 'only its size matters' };
    const result = buildBundle({ ...small, shell, cells }, { ...PLAIN, override });
    if (!result.ok) throw new Error('stopped in spite of an override');
    const outlines = result.bundle.files.filter((file) => file.path.startsWith('outlines/'));
    expect(outlines.length).toBeLessThanOrEqual(16);
    expect(textOf(result.bundle, 'pattern.svg').length).toBeLessThan(1_000_000);
    for (const cell of readWithPython(result.bundle).rows.flat()) {
      expect(cell.length).toBeLessThanOrEqual(32_767);
    }
  });
});
