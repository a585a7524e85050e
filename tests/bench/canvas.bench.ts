/**
 * The pattern's canvas at 200 × 100 and at 32 × 9 in headless Chromium, all tiles in view and closer up, beside a bare
 * canvas that paints the same tiles with the same painter every frame. Frames are what the screen shows;
 * script is what the page's own code took of them (the bare canvas hands much of its work to the browser's
 * painting, which only its frames show).
 */
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { chromium, type Page } from 'playwright-core';
import type { BenchRow } from './bench-row';
import type { CanvasBench, CanvasBenchPage, DriveFigures } from './canvas-drives';

const CHROMIUM = process.env['CHROMIUM'] ?? '/usr/bin/chromium';
const CHROMIUM_ARGUMENTS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--enable-precise-memory-info',
  '--js-flags=--expose-gc',
];

const STAVES = 200;
const COURSES = 100;
const FRAMES = 120;
const EDITS = 1_000;
/** The bare canvas is slow enough to be measured in fewer. */
const BARE_FRAMES = 30;

type Drive = keyof Omit<CanvasBench, 'open' | 'zoom' | 'edits'>;

/** The rows about the canvas. */
export default async function canvasBench(): Promise<BenchRow[]> {
  const script = await bundledPage();
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: CHROMIUM_ARGUMENTS });
  try {
    const page = await browser.newPage({ viewport: { width: 1400, height: 720 } });
    await page.setContent('<body style="margin:0"></body>');
    await page.addScriptTag({ content: script });
    const small = await opened(page, 32, 9);
    const large = await opened(page, STAVES, COURSES);
    const opening: BenchRow = {
      what: `canvas: open ${STAVES} × ${COURSES}, every tile drawn`,
      ours: `${large.toFixed(0)} ms`,
      baseline: `${small.toFixed(0)} ms`,
      ratio: large / small,
      note: 'baseline: 32 × 9',
    };
    const whole = await rowsAt(page, 'all in view', 1);
    const near = await rowsAt(page, 'three times nearer', 3);
    const small32 = await rowsAt(page, 'all in view', 1, { staves: 32, courses: 9 });
    return [opening, ...whole, ...near, ...small32, await memoryRow(page)];
  } finally {
    await browser.close();
  }
}

async function bundledPage(): Promise<string> {
  const built = await build({
    entryPoints: [fileURLToPath(new URL('canvas-page.ts', import.meta.url))],
    tsconfig: fileURLToPath(new URL('../../tsconfig.json', import.meta.url)),
    bundle: true,
    write: false,
    format: 'iife',
    target: 'es2022',
  });
  return built.outputFiles[0]?.text ?? '';
}

function opened(page: Page, staves: number, courses: number): Promise<number> {
  return page.evaluate(
    ([s, c]) => (globalThis as unknown as CanvasBenchPage).canvasBench.open(s, c),
    [staves, courses] as const,
  );
}

function driven(page: Page, drive: Drive, frames: number): Promise<DriveFigures> {
  return page.evaluate(
    ([name, count]) => (globalThis as unknown as CanvasBenchPage).canvasBench[name](count),
    [drive, frames] as const,
  );
}

interface Size {
  readonly staves: number;
  readonly courses: number;
}

/** What is driven, with the bare canvas beside it. */
const DRIVES: readonly (readonly [what: string, ours: Drive, bare: Drive])[] = [
  ['panning', 'pan', 'barePan'],
  ['zooming', 'zoomInAndOut', 'bareZoom'],
  ['painting', 'paint', 'barePaint'],
  ['laying a course and undoing it', 'layCourse', 'bareCourse'],
];

async function rowsAt(
  page: Page,
  where: string,
  factor: number,
  { staves, courses }: Size = { staves: STAVES, courses: COURSES },
): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  for (const [what, ours, bare] of DRIVES) {
    await opened(page, staves, courses);
    await page.evaluate(
      (by) => (globalThis as unknown as CanvasBenchPage).canvasBench.zoom(by),
      factor,
    );
    const mine = await driven(page, ours, FRAMES);
    rows.push(
      ...rowsOf(
        `${what}, ${staves} × ${courses} ${where}`,
        mine,
        await driven(page, bare, BARE_FRAMES),
      ),
    );
  }
  return rows;
}

/** Script memory that 1 000 edits of a whole course leave behind, undo steps included. */
async function memoryRow(page: Page): Promise<BenchRow> {
  await opened(page, STAVES, COURSES);
  const bytes = await page.evaluate(
    (count) => (globalThis as unknown as CanvasBenchPage).canvasBench.edits(count),
    EDITS,
  );
  const least = EDITS * STAVES * 3 * 4;
  const megabytes = (figure: number): string => `${(figure / 1e6).toFixed(1)} MB`;
  return {
    what: `canvas: memory after ${EDITS} edits of a whole course, ${STAVES} × ${COURSES}`,
    ours: megabytes(bytes),
    baseline: megabytes(least),
    ratio: bytes / least,
    note: 'baseline: the undo steps alone, three 4-byte figures a tile',
  };
}

function rowsOf(what: string, ours: DriveFigures, bare: DriveFigures): BenchRow[] {
  const row = (part: string, mine: number, theirs: number): BenchRow => ({
    what: `canvas: ${what}, ${part}`,
    ours: `${mine.toFixed(1)} ms`,
    baseline: `${theirs.toFixed(1)} ms`,
    ratio: mine / theirs,
    note: 'baseline: a bare canvas, every tile every frame',
  });
  return [
    row('median frame', shareOf(ours.frames, 0.5), shareOf(bare.frames, 0.5)),
    row('p95 frame', shareOf(ours.frames, 0.95), shareOf(bare.frames, 0.95)),
    row('median script', shareOf(ours.script, 0.5), shareOf(bare.script, 0.5)),
  ];
}

/** The figure below which a share of them lies. */
function shareOf(figures: readonly number[], share: number): number {
  const sorted = [...figures].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN;
}
