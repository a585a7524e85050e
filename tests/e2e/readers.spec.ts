/** The same program for someone without a mouse, and for someone who reads it at 200 %. */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CommissionsPage } from './pages/commissions-page';
import { JointStation } from './pages/joint-station';
import { LayoutPage, STATIONS } from './pages/layout-page';
import { PatternStation } from './pages/pattern-station';
import { SignInPage } from './pages/sign-in-page';
import { startProgram, type RunningProgram } from './run/running-program';
import { sidewaysOverflow, twiceAsLarge } from './run/sound-screen';
import { keepScreen, launchChromium, openVisit } from './run/visit';

let program: RunningProgram;
let browser: Browser;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

const FOCUSED = `(() => {
  const element = document.activeElement;
  const label = element.labels?.[0]?.innerText ?? element.getAttribute('aria-label') ?? element.innerText;
  return element.tagName.toLowerCase() + ': ' + (label ?? '').trim().replace(/\\s+/g, ' ');
})()`;

/** Presses Tab until the focus stands on what is looked for; fails after a whole round. */
async function tabTo(page: Page, wanted: RegExp): Promise<void> {
  const met: string[] = [];
  for (let step = 0; step < 60; step += 1) {
    await page.keyboard.press('Tab');
    const focused = await page.evaluate<string>(FOCUSED);
    if (wanted.test(focused)) return;
    met.push(focused);
  }
  throw new Error(`Tab never came to ${String(wanted)}, only to ${met.join(' | ')}`);
}

it('the keyboard alone leads from signing in to a kept version', async () => {
  const visit = await openVisit(browser, { address: program.address });
  const { page } = visit;
  const { keyboard } = page;
  await new SignInPage(page).open();
  await tabTo(page, /E-mail address/);
  await keyboard.type('ines@quarrylane.example');
  await tabTo(page, /^input: Password/);
  await keyboard.type('ring-of-staves');
  await keyboard.press('Enter');

  const commissions = new CommissionsPage(page);
  await commissions.table().waitFor();
  await tabTo(page, /^button: New commission/);
  await keyboard.press('Enter');
  await page.getByRole('dialog', { name: 'New commission' }).waitFor();
  await expect.poll(() => page.evaluate<string>(FOCUSED)).toMatch(/^input: Title/);
  await keyboard.type('Made without a mouse');
  await keyboard.press('Enter');
  await page.getByRole('heading', { name: 'The shell' }).waitFor();

  await tabTo(page, /^a: .*Joint$/);
  await keyboard.press('Enter');
  const joint = new JointStation(page);
  await joint.field('Tab reach').waitFor();
  await tabTo(page, /Neck fillet radius/);
  await keyboard.press('Control+a');
  await keyboard.type('1.9');
  await joint.finding('is cut at 1.96 mm').waitFor();

  await keyboard.press('Tab');
  await joint.saved();
  await page.evaluate(`document.activeElement.blur()`);
  await tabTo(page, /^button: Keep as version 1/);
  await keyboard.press('Enter');
  await page.getByRole('dialog', { name: 'Keep as version 1' }).waitFor();
  await expect.poll(() => page.evaluate<string>(FOCUSED)).toMatch(/^textarea/);
  await keyboard.type('Hands on the keys');
  await tabTo(page, /^button: Keep version 1/);
  await keyboard.press('Enter');
  await page.getByText('Version 1 is kept.').first().waitFor();
  expect(visit.consoleErrors).toEqual([]);
  await visit.context.close();
});

it('the arrow keys walk the tiles and Space lays them', async () => {
  const visit = await openVisit(browser, { address: program.address });
  const { page } = visit;
  await new SignInPage(page).signIn('bela@quarrylane.example');
  const dialog = await new CommissionsPage(page).startNew();
  await dialog.title().fill('Laid by keys');
  await dialog.make();
  const pattern = new PatternStation(page);
  await pattern.goTo('Pattern');
  await tabTo(page, /^div: Pattern, 24 staves by 8 courses/);
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('Space');
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowUp');
  await page.keyboard.press('Space');
  await expect.poll(() => pattern.tilesOf('Black walnut')).toBe(2);
  await page.keyboard.press('Control+z');
  await expect.poll(() => pattern.tilesOf('Black walnut')).toBe(1);
  expect(visit.consoleErrors).toEqual([]);
  await visit.context.close();
});

describe('at 200 % on a desktop', () => {
  it('no screen has to be scrolled sideways', async () => {
    const visit = await openVisit(browser, {
      address: program.address,
      size: twiceAsLarge,
      fineness: 2,
    });
    const { page } = visit;
    const outside: Record<string, string[]> = {};
    const look = async (name: string) => {
      outside[name] = await sidewaysOverflow(page);
      await keepScreen(page, `${name}-twice`);
    };
    const signIn = new SignInPage(page);
    await signIn.open();
    await look('sign-in');
    await signIn.signIn('runa@quarrylane.example');
    const commissions = new CommissionsPage(page);
    await commissions.table().waitFor();
    await look('commissions');
    await commissions.enter('Ferry-hall lantern');
    const layout = new LayoutPage(page);
    for (const station of STATIONS) {
      await layout.goTo(station);
      await look(station.toLowerCase());
    }
    expect(Object.entries(outside).filter(([, lines]) => lines.length > 0)).toEqual([]);
    expect(visit.consoleErrors).toEqual([]);
    await visit.context.close();
  });
});
