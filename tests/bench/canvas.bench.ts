/**
 * The pattern's canvas at 200 × 100 in headless Chromium, all tiles in view and closer up, beside a bare
 * canvas that paints the same tiles with the same painter every frame. Frames are what the screen shows;
 * script is what the page's own code took of them (the bare canvas hands much of its work to the browser's
 * painting, which only its frames show).
 */
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { chromium, type Page } from 'playwright-core';
import type { BenchRow } from './bench-row';
import type { CanvasBenchPage, DriveFigures } from './canvas-drives';

const CHROMIUM = process.env['CHROMIUM'] ?? '/usr/bin/chromium';
const CHROMIUM_ARGUMENTS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

const STAVES = 200;
const COURSES = 100;
const FRAMES = 120;
/** The bare canvas is slow enough to be measured in fewer. */
const BARE_FRAMES = 30;

type Drive = 'pan' | 'paint' | 'barePan' | 'barePaint';

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
    return [opening, ...whole, ...near];
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

async function rowsAt(page: Page, where: string, factor: number): Promise<BenchRow[]> {
  await opened(page, STAVES, COURSES);
  await page.evaluate(
    (by) => (globalThis as unknown as CanvasBenchPage).canvasBench.zoom(by),
    factor,
  );
  const pan = await driven(page, 'pan', FRAMES);
  const paint = await driven(page, 'paint', FRAMES);
  const barePan = await driven(page, 'barePan', BARE_FRAMES);
  const barePaint = await driven(page, 'barePaint', BARE_FRAMES);
  return [
    ...rowsOf(`panning, ${where}`, pan, barePan),
    ...rowsOf(`painting, ${where}`, paint, barePaint),
  ];
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
