import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { keepScreen, launchChromium, openVisit, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;
let visit: Visit;
let pattern: PatternPage;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
  visit = await openVisit(browser, { address: program.address });
  await new SignInPage(visit.page).signIn('bela@quarrylane.example');
  pattern = new PatternPage(visit.page);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

async function choose(word: string, choice: string): Promise<void> {
  const { page } = visit;
  await page.getByRole('button', { name: new RegExp(`^${word}: `) }).click();
  await page.getByRole('menuitemradio', { name: choice, exact: true }).click();
}

const cherry = () => pattern.tilesOf('Black cherry');
const hint = () => visit.page.locator('.below .hint').textContent();

describe('the sentence', () => {
  it('climbs round the shell, wraps at the top and says how many tiles will change', async () => {
    const { page } = visit;
    await pattern.openCommission('Ferry-hall lantern');
    await choose('Repeated', '8 times round');
    await choose('Each step', '1 course up');
    await choose('At the end of the shell', 'wrapping to the bottom');
    await page.keyboard.press('3');
    await pattern.standOn({ course: 'C', stave: 4 });
    await expect.poll(hint).toMatch(/^[1-8] tiles? will change\.$/);
    await keepScreen(page, 'helix');
    const before = Number.parseInt(await cherry(), 10);
    const changes = Number.parseInt((await hint()) ?? '', 10);
    await page.keyboard.press(' ');
    await expect.poll(cherry).toBe(`${before + changes} tiles`);
    await page.keyboard.press('Control+z');
    await expect.poll(cherry).toBe(`${before} tiles`);
    expect(await accessibilityViolations(page)).toEqual([]);
  });

  it('lists every key, and closes with Escape', async () => {
    const { page } = visit;
    await page.keyboard.press('?');
    const keys = page.getByRole('dialog', { name: 'Keys on the pattern' });
    await keys.waitFor();
    await keepScreen(page, 'keys');
    expect(await accessibilityViolations(page)).toEqual([]);
    await page.keyboard.press('Escape');
    await keys.waitFor({ state: 'detached' });
  });
});

describe('a patch', () => {
  it('is drawn out over the seam with the keyboard, copied, and laid in another layout', async () => {
    const { page } = visit;
    await pattern.openCommission('Ferry-hall lantern');
    await pattern.standOn({ course: 'B', stave: 32 });
    for (const key of ['3', 'p', 'ArrowRight', 'ArrowRight', 'ArrowUp'])
      await page.keyboard.press(key);
    await page.keyboard.press('Control+c');
    await page.getByText('Copied 3 × 2 tiles from B 32').first().waitFor({ state: 'attached' });

    await pattern.openCommission('Stair planter, tall');
    await pattern.standOn({ course: 'D', stave: 3 });
    await page.keyboard.press('Control+v');
    await page.getByRole('button', { name: 'What to do: Lay the copy' }).waitFor();
    await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('all saved');
    await keepScreen(page, 'laid-copy');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await expect
      .poll(() => page.getByRole('button', { name: 'Undo', exact: true }).isDisabled())
      .toBe(true);
    expect(visit.consoleErrors).toEqual([]);
  });

  it('is dragged out with the pointer to be copied, and nothing is changed by that', async () => {
    const { page } = visit;
    await pattern.openCommission('Ferry-hall lantern');
    await choose('What to do', 'Copy');
    await pattern.press({ x: 0.3, y: 0.4 });
    await pattern.moveTo({ x: 0.45, y: 0.6 });
    await expect.poll(hint).toMatch(/^\d+ × \d+ tiles will be copied\.$/);
    await keepScreen(page, 'copying');
    await page.mouse.up();
    await page.getByRole('button', { name: 'What to do: Lay the copy' }).waitFor();
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true);
    await page.setViewportSize({ width: 1024, height: 768 });
    await keepScreen(page, 'lay-the-copy-1024');
    await page.setViewportSize({ width: 768, height: 1024 });
    await keepScreen(page, 'lay-the-copy-768');
    expect(await accessibilityViolations(page)).toEqual([]);
    await page.emulateMedia({ colorScheme: 'dark' });
    await keepScreen(page, 'lay-the-copy-dark');
  });
});
