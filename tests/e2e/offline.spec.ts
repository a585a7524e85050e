import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { cellsOf } from './run/open-layout';
import { startProgram, type RunningProgram } from './run/running-program';
import { launchChromium, openVisit, type Visit } from './run/visit';

const CHERRY = 2;

let program: RunningProgram;
let browser: Browser;
const visits: Visit[] = [];

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterEach(async () => {
  await Promise.all(visits.splice(0).map(({ context }) => context.close()));
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

async function openPattern(email: string): Promise<[Visit, PatternPage]> {
  const visit = await openVisit(browser, { address: program.address });
  visits.push(visit);
  await new SignInPage(visit.page).signIn(email);
  const pattern = new PatternPage(visit.page);
  await pattern.openCommission('Ferry-hall lantern');
  return [visit, pattern];
}

async function woodAt(page: Page, course: number, stave: number): Promise<number | undefined> {
  return Buffer.from((await cellsOf(page)) ?? '', 'base64')[course * 32 + stave - 1];
}

/** Lays cherry where nothing reaches the server, and waits until the page has said so. */
async function layUnsaved(visit: Visit, pattern: PatternPage, stave: number): Promise<string> {
  await pattern.standOn({ course: 'C', stave });
  await visit.context.setOffline(true);
  await visit.page.keyboard.press('3');
  await visit.page.keyboard.press(' ');
  await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('not saved');
  return visit.page.url();
}

/** Opens the layout in a new page of the same browser and waits until everything is saved. */
async function openAgain({ context }: Visit, url: string): Promise<Page> {
  await context.setOffline(false);
  const page = await context.newPage();
  await page.goto(url);
  const pattern = new PatternPage(page);
  await pattern.surface().waitFor();
  await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('all saved');
  return page;
}

describe('edits that never reached the server', () => {
  it('are there again after the page was closed, and meet what others did meanwhile', async () => {
    const [visit, pattern] = await openPattern('bela@quarrylane.example');
    const url = await layUnsaved(visit, pattern, 4);
    await visit.page.close();

    const [theirs, theirPattern] = await openPattern('ines@quarrylane.example');
    expect(await woodAt(theirs.page, 2, 4)).not.toBe(CHERRY);
    await theirPattern.layAt({ course: 'C', stave: 6 }, 3);
    await expect.poll(() => woodAt(theirs.page, 2, 6)).toBe(CHERRY);

    const page = await openAgain(visit, url);
    await expect.poll(() => woodAt(page, 2, 4)).toBe(CHERRY);
    expect(await woodAt(page, 2, 6)).toBe(CHERRY);
    const count = await new PatternPage(page).tilesOf('Black cherry');
    await expect.poll(() => theirPattern.tilesOf('Black cherry')).toBe(count);
  });

  it('are there again after the page crashed', async () => {
    const [visit, pattern] = await openPattern('bela@quarrylane.example');
    const url = await layUnsaved(visit, pattern, 8);
    const crashed = visit.page.waitForEvent('crash');
    await visit.page.goto('chrome://crash').catch(() => undefined);
    await crashed;
    await visit.page.close();
    const page = await openAgain(visit, url);
    await expect.poll(() => woodAt(page, 2, 8)).toBe(CHERRY);
  });

  it('are kept through a reload while saving does not work, and once only', async () => {
    const [visit, pattern] = await openPattern('bela@quarrylane.example');
    const { page, context } = visit;
    page.on('dialog', (dialog) => void dialog.accept());
    await pattern.standOn({ course: 'C', stave: 10 });
    const saves = /\/api\/layouts\/[^/]+$/;
    await context.route(saves, (route) =>
      route.request().method() === 'PATCH' ? route.abort() : route.continue(),
    );
    await page.keyboard.press('3');
    await page.keyboard.press(' ');
    await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('not saved');
    const mine = await pattern.tilesOf('Black cherry');
    await page.reload();
    await pattern.surface().waitFor();
    await expect.poll(() => pattern.tilesOf('Black cherry')).toBe(mine);
    await context.unroute(saves);
    await expect.poll(() => woodAt(page, 2, 10), { timeout: 20_000 }).toBe(CHERRY);
    await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('all saved');
    await page.reload();
    await pattern.surface().waitFor();
    await expect.poll(() => pattern.tilesOf('Black cherry')).toBe(mine);
    expect(await pattern.saving().textContent()).toBe('all saved');
  });
});
