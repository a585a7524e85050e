import { readFile } from 'node:fs/promises';
import { chromium, type Browser, type Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { keepScreen, launchChromium, openVisit, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

async function openWrapped(from: Browser): Promise<Visit> {
  const visit = await openVisit(from, { address: program.address });
  await new SignInPage(visit.page).signIn('bela@quarrylane.example');
  await new PatternPage(visit.page).openCommission('Ferry-hall lantern');
  await visit.page.getByRole('button', { name: 'Wrapped' }).click();
  return visit;
}

const shellOf = (page: Page) => page.getByRole('img', { name: /round shell of 32 staves/ });

/** The canvas as the screen shows it, small and grey. */
async function seen(page: Page): Promise<Buffer> {
  const shot = await shellOf(page).screenshot();
  const { data } = await sharp(shot).greyscale().resize(64, 64, { fit: 'fill' }).raw().toBuffer({
    resolveWithObject: true,
  });
  return data;
}

/** How far the canvas is from an earlier look: the mean difference of greys, 0 to 255. */
async function changedFrom(page: Page, before: Buffer): Promise<number> {
  const now = await seen(page);
  return now.reduce((sum, grey, i) => sum + Math.abs(grey - (before[i] ?? 0)), 0) / now.length;
}

/** Less is the rounding of a frame drawn again; a turn by a stave or a laid course is far more. */
const SAME = 0.8;

it('wraps the pattern, turns with the arrow keys and follows a tile that is laid', async () => {
  const visit = await openWrapped(browser);
  const { page } = visit;
  await shellOf(page).waitFor();
  await expect.poll(() => drawnShare(page)).toBeGreaterThan(0.2);
  const front = await seen(page);
  await shellOf(page).focus();
  await page.keyboard.press('ArrowRight');
  await expect.poll(() => changedFrom(page, front)).toBeGreaterThan(SAME);
  await page.keyboard.press('ArrowLeft');
  await expect.poll(() => changedFrom(page, front)).toBeLessThan(SAME);

  await page.keyboard.press('1');
  await page.getByRole('button', { name: /one tile/ }).click();
  await page.getByRole('menuitemradio', { name: /a course/ }).click();
  const pattern = new PatternPage(page);
  await pattern.stroke({ x: 0.4, y: 0.3 }, { x: 0.45, y: 0.3 });
  await expect.poll(() => changedFrom(page, front)).toBeGreaterThan(SAME);
  await keepScreen(page, 'wrapped-shell');
  expect(await accessibilityViolations(page)).toEqual([]);
  expect(visit.consoleErrors).toEqual([]);
  await visit.context.close();
});

it('saves a picture 2000 pixels wide for the client', async () => {
  const { page, context } = await openWrapped(browser);
  await expect.poll(() => drawnShare(page)).toBeGreaterThan(0.2);
  const downloading = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save a picture' }).click();
  const download = await downloading;
  expect(download.suggestedFilename()).toBe('ferry-hall-lantern.png');
  const picture = sharp(await readFile(await download.path()));
  expect(await picture.metadata()).toMatchObject({ format: 'png', width: 2000 });
  const { entropy } = await picture.stats();
  expect(entropy).toBeGreaterThan(2);
  await context.close();
});

it('draws the shell flat where the browser has no WebGL', async () => {
  const plain = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-3d-apis',
      '--disable-quic',
      '--no-first-run',
    ],
  });
  const visit = await openWrapped(plain);
  await visit.page.getByText('This browser shows the shell as a drawing.').waitFor();
  expect(await visit.page.locator('sl-shell-drawing path').count()).toBeGreaterThan(100);
  expect(await accessibilityViolations(visit.page)).toEqual([]);
  await plain.close();
});

/** Share of the shell's place that is not paper: nothing is drawn before the first frame. */
async function drawnShare(page: Page): Promise<number> {
  const shot = await shellOf(page).screenshot();
  const { data, info } = await sharp(shot).greyscale().raw().toBuffer({ resolveWithObject: true });
  const dark = data.reduce((count, grey) => count + (grey < 215 ? 1 : 0), 0);
  return dark / (info.width * info.height);
}
