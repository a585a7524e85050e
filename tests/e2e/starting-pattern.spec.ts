import type { Browser } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { StartingPatternsDialog } from './pages/starting-patterns-dialog';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { keepScreen, launchChromium, openVisit, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;
let visit: Visit;
let pattern: PatternPage;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

beforeEach(async () => {
  visit = await openVisit(browser, { address: program.address });
  await new SignInPage(visit.page).signIn('bela@quarrylane.example');
  pattern = new PatternPage(visit.page);
  await pattern.openCommission('Ferry-hall lantern');
});

afterEach(async () => {
  expect(visit.consoleErrors).toEqual([]);
  await visit.context.close();
});

describe('starting from a pattern', () => {
  it('says when a helix does not meet at the seam, and lays the one that does as one step', async () => {
    const { page } = visit;
    const ash = () => pattern.tilesOf('White ash');
    const before = await ash();
    const dialog = new StartingPatternsDialog(page);
    await dialog.open('Helix');
    await dialog.self().getByText('It meets at the seam').waitFor();
    await dialog.field('Lead, in courses a turn').fill('9');
    await dialog.self().getByText('9 courses a turn does not meet at the seam').waitFor();
    await dialog.button('Lay anyway').waitFor();
    await keepScreen(page, 'starting-helix-apart');
    expect(await accessibilityViolations(page)).toEqual([]);
    await dialog.button('8 courses a turn').click();
    await dialog.self().getByText('2 strands side by side').waitFor();
    await keepScreen(page, 'starting-helix-meets');
    await dialog.button('Lay it').click();
    await expect.poll(ash).toBe('216 tiles');
    expect(await pattern.tilesOf('Black walnut')).toBe('72 tiles');
    await keepScreen(page, 'starting-helix-laid');
    await page.keyboard.press('Control+z');
    await expect.poll(ash).toBe(before);
  });

  it('scatters woods by their shares, another way for another seed', async () => {
    const { page } = visit;
    const dialog = new StartingPatternsDialog(page);
    await dialog.open('Scatter');
    await dialog.self().getByText('as even across it as anywhere').waitFor();
    await dialog.button('Another scatter').click();
    await expect.poll(() => dialog.field('Seed').inputValue()).toBe('2');
    await keepScreen(page, 'starting-scatter');
    expect(await accessibilityViolations(page)).toEqual([]);
    await dialog.field('Share of white ash').fill('0');
    await dialog.field('Share of black walnut').fill('0');
    await dialog.self().getByText('Give at least one wood a share').waitFor();
    expect(await dialog.button(/^Lay/).isDisabled()).toBe(true);
  });

  it.each(['Checker', 'Bands', 'Diamonds', 'Zigzag'])(
    'shows %s before it is laid',
    async (kind) => {
      const dialog = new StartingPatternsDialog(visit.page);
      await dialog.open(kind);
      await dialog.button(/^Lay/).waitFor();
      await keepScreen(visit.page, `starting-${kind.toLowerCase()}`);
    },
  );
});

describe('the whole pattern', () => {
  it('turns there and back, and swaps two woods, a step each', async () => {
    const { page } = visit;
    const ash = () => pattern.tilesOf('White ash');
    const walnut = () => pattern.tilesOf('Black walnut');
    const [ashBefore, walnutBefore] = [await ash(), await walnut()];
    await page.keyboard.press(']');
    await page.getByRole('button', { name: 'Undo', exact: true }).waitFor();
    expect(await page.getByTitle(/^Undo: turn the pattern 1 stave to the right/).count()).toBe(1);
    await page.getByText('Turn it, or swap two woods').click();
    await keepScreen(page, 'whole-pattern');
    expect(await accessibilityViolations(page)).toEqual([]);
    await page.getByRole('button', { name: 'Swap them' }).click();
    await expect.poll(ash).toBe(walnutBefore);
    expect(await walnut()).toBe(ashBefore);
    await page.keyboard.press('Control+z');
    await expect.poll(ash).toBe(ashBefore);
    await page.keyboard.press('[');
    expect(await ash()).toBe(ashBefore);
  });
});

describe('changing the number of staves with a pattern laid', () => {
  it('asks how to carry it, leaves the size when told to, and is undone in one step', async () => {
    const { page } = visit;
    await page.goto(page.url().replace('/pattern', '/shell'));
    const staves = page.getByRole('textbox', { name: 'Staves round' });
    const dialog = page.getByRole('dialog', { name: /^Carry the pattern over to 40 staves/ });
    await staves.fill('40');
    await staves.press('Tab');
    await dialog.getByText('Keep what fits').waitFor();
    await keepScreen(page, 'carry-over');
    expect(await accessibilityViolations(page)).toEqual([]);
    await dialog.getByRole('button', { name: 'Leave the size' }).click();
    await expect.poll(() => staves.inputValue()).toBe('32');

    await staves.fill('40');
    await staves.press('Tab');
    await dialog.getByRole('radio', { name: /^Repeat it/ }).check();
    await dialog.getByRole('button', { name: 'Change the size' }).click();
    await dialog.waitFor({ state: 'detached' });
    await expect.poll(() => staves.inputValue()).toBe('40');
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await expect.poll(() => staves.inputValue()).toBe('32');
  });
});
