import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { desktop, keepScreen, launchChromium, openVisit, phone, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

async function openPattern(email: string, size = desktop as Size): Promise<[Visit, PatternPage]> {
  const visit = await openVisit(browser, { address: program.address, size });
  await new SignInPage(visit.page).signIn(email);
  const pattern = new PatternPage(visit.page);
  await pattern.openCommission('Ferry-hall lantern');
  return [visit, pattern];
}

interface Size {
  readonly width: number;
  readonly height: number;
}

describe.each([
  ['desktop', desktop],
  ['phone', phone],
])('the pattern on a %s', (name, size) => {
  it('reads well to everyone and leaves the console clean', async () => {
    const [visit] = await openPattern('bela@quarrylane.example', size);
    await keepScreen(visit.page, `pattern-${name}`);
    expect(await accessibilityViolations(visit.page)).toEqual([]);
    expect(visit.consoleErrors).toEqual([]);
    await visit.context.close();
  });
});

it('lays a stroke as one step, takes it back, and saves it when it stays', async () => {
  const [visit, pattern] = await openPattern('bela@quarrylane.example');
  const { page } = visit;
  await page.keyboard.press('1');
  const ash = () => pattern.tilesOf('White ash');
  const before = await ash();
  const from = { x: 0.2, y: 0.35 };
  const to = { x: 0.6, y: 0.6 };

  await pattern.stroke(from, to);
  await expect.poll(ash).not.toBe(before);
  await page.keyboard.press('Control+z');
  await expect.poll(ash).toBe(before);

  await pattern.press(from);
  await pattern.moveTo(to);
  await expect.poll(ash).not.toBe(before);
  await page.keyboard.press('Escape');
  await expect.poll(ash).toBe(before);
  await page.mouse.up();
  expect(await ash()).toBe(before);

  const saved = page.waitForResponse((response) => response.request().method() === 'PATCH');
  await pattern.stroke(from, to);
  expect((await saved).status()).toBe(200);
  const after = await ash();
  expect(after).not.toBe(before);
  await page.reload();
  await pattern.surface().waitFor();
  await expect.poll(ash).toBe(after);
  await visit.context.close();
});

it('is walked and laid with the keyboard alone, across the seam, and says where it is', async () => {
  const [visit, pattern] = await openPattern('bela@quarrylane.example');
  const { page } = visit;
  const spoken = page.locator('.cdk-live-announcer-element');
  await page.keyboard.press('1');
  await pattern.surface().focus();
  await page.keyboard.press('ArrowLeft');
  const words = async () => (await spoken.textContent()) ?? '';
  await expect.poll(words).toMatch(/^[A-Z]+ \d+, /);
  const staves = 32;
  for (let i = 1; i < staves; i++) {
    if ((await words()).includes('At the seam')) break;
    await page.keyboard.press('ArrowLeft');
    await page.waitForTimeout(150);
  }
  await expect.poll(words).toMatch(/^[A-Z]+ 1, .*At the seam/);
  await page.keyboard.press('ArrowLeft');
  await expect.poll(words).toMatch(new RegExp(`^[A-Z]+ ${staves}, `));
  await page.keyboard.press(' ');
  await expect.poll(words).toMatch(new RegExp(`^[A-Z]+ ${staves} is .*white ash`));
  await visit.context.close();
});

it('shows the pattern to a maker without laying anything', async () => {
  const [visit, pattern] = await openPattern('tomas@quarrylane.example');
  const before = await pattern.tilesOf('White ash');
  await visit.page.getByText('Owners and designers lay tiles').waitFor();
  await pattern.stroke({ x: 0.2, y: 0.4 }, { x: 0.6, y: 0.4 });
  expect(await pattern.tilesOf('White ash')).toBe(before);
  await visit.context.close();
});
