import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { cellsOf, sizeField } from './run/open-layout';
import {
  startProgram,
  startServerBeside,
  type RunningProgram,
  type ServerBeside,
} from './run/running-program';
import { keepScreen, launchChromium, openVisit, type Visit } from './run/visit';

/** Outline of tiles that somebody else laid too. */
const OVERLAID = '#b26a00';

let program: RunningProgram;
let beside: ServerBeside;
let browser: Browser;
const visits: Visit[] = [];

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
  beside = await startServerBeside(program);
});

afterEach(async () => {
  await Promise.all(visits.splice(0).map(({ context }) => context.close()));
});

afterAll(async () => {
  await browser.close();
  await beside.stop();
  await program.end();
});

interface Person {
  readonly visit: Visit;
  readonly page: Page;
  readonly pattern: PatternPage;
}

async function person(email: string, address: string): Promise<Person> {
  const visit = await openVisit(browser, { address });
  visits.push(visit);
  await new SignInPage(visit.page).signIn(email);
  const pattern = new PatternPage(visit.page);
  await pattern.openCommission('Ferry-hall lantern');
  return { visit, page: visit.page, pattern };
}

/** Bela by one server process and Ines by another, both on the pattern of the same layout. */
async function bothOpen(): Promise<{ bela: Person; ines: Person }> {
  const bela = await person('bela@quarrylane.example', program.address);
  const ines = await person('ines@quarrylane.example', beside.address);
  await bela.page.getByRole('list', { name: 'Also here' }).waitFor();
  await ines.page.getByRole('list', { name: 'Also here' }).waitFor();
  return { bela, ines };
}

async function openShell(page: Page): Promise<void> {
  await page.getByRole('navigation', { name: 'Stations' }).getByText('Shell').click();
}

async function sameOnBoth(one: Person, other: Person): Promise<void> {
  await expect
    .poll(async () => (await cellsOf(one.page)) === (await cellsOf(other.page)), {
      timeout: 20_000,
    })
    .toBe(true);
  for (const { pattern } of [one, other]) {
    await expect.poll(() => pattern.saving().textContent(), { timeout: 20_000 }).toBe('all saved');
  }
  for (const wood of ['White ash', 'Black walnut', 'Black cherry']) {
    const theirs = await other.pattern.tilesOf(wood);
    await expect.poll(() => one.pattern.tilesOf(wood), { timeout: 20_000 }).toBe(theirs);
  }
}

describe('two people in one layout, by two server processes', () => {
  it('see each other in the bar and on the pattern', async () => {
    const { bela, ines } = await bothOpen();
    await ines.pattern.standOn({ course: 'E', stave: 3 });
    const here = bela.page.getByRole('list', { name: 'Also here' });
    await here.getByText('Ines Marlow is here: Pattern, tile E 3').waitFor({ state: 'attached' });
    await keepScreen(bela.page, 'two-at-once');
    await ines.visit.context.close();
    await here.waitFor({ state: 'detached', timeout: 30_000 });
  });

  it("see each other's tiles within a second", async () => {
    const { bela, ines } = await bothOpen();
    await bela.pattern.standOn({ course: 'C', stave: 5 });
    const took: number[] = [];
    for (const key of ['2', '1', '2', '1']) {
      const before = await ines.pattern.tilesOf('White ash');
      await bela.page.keyboard.press(key);
      const began = performance.now();
      await bela.page.keyboard.press(' ');
      await expect
        .poll(() => ines.pattern.tilesOf('White ash'), { interval: 20, timeout: 10_000 })
        .not.toBe(before);
      took.push(performance.now() - began);
    }
    expect(Math.min(...took)).toBeLessThan(1_000);
    await sameOnBoth(bela, ines);
  });

  it('keep both when the network was cut for one and they laid different tiles', async () => {
    const { bela, ines } = await bothOpen();
    await bela.pattern.standOn({ course: 'B', stave: 7 });
    await ines.pattern.standOn({ course: 'B', stave: 9 });
    await ines.visit.context.setOffline(true);
    await ines.page.keyboard.press('3');
    await ines.page.keyboard.press(' ');
    await bela.page.keyboard.press('3');
    await bela.page.keyboard.press(' ');
    await expect.poll(() => bela.pattern.saving().textContent()).toBe('all saved');
    await expect
      .poll(() => ines.pattern.saving().textContent(), { timeout: 20_000 })
      .toBe('not saved');
    await ines.visit.context.setOffline(false);
    await sameOnBoth(bela, ines);
    const cells = Buffer.from((await cellsOf(bela.page)) ?? '', 'base64');
    expect([cells[32 + 6], cells[32 + 8]]).toEqual([2, 2]);
  });

  it('keep mine on top where both laid the same tile, and outline it', async () => {
    const { bela, ines } = await bothOpen();
    await bela.pattern.standOn({ course: 'D', stave: 6 });
    await ines.pattern.standOn({ course: 'D', stave: 6 });
    await ines.visit.context.setOffline(true);
    await ines.page.keyboard.press('3');
    await ines.page.keyboard.press(' ');
    const saved = bela.page.waitForResponse((answer) => answer.request().method() === 'PATCH');
    await bela.page.keyboard.press('2');
    await bela.page.keyboard.press(' ');
    expect((await saved).status()).toBe(200);
    await ines.visit.context.setOffline(false);
    await sameOnBoth(bela, ines);
    const cells = Buffer.from((await cellsOf(bela.page)) ?? '', 'base64');
    expect(cells[3 * 32 + 5]).toBe(2);
    await ines.page.getByText('Yours lie on top').first().waitFor({ state: 'attached' });
    await ines.page.keyboard.press('Escape');
    await expect.poll(() => ines.pattern.pixelsOf(OVERLAID)).toBeGreaterThan(20);
    expect(await bela.pattern.pixelsOf(OVERLAID)).toBe(0);
    await keepScreen(ines.page, 'same-tile');
  });

  it('are asked when both set the same field', async () => {
    const { bela, ines } = await bothOpen();
    for (const { page } of [bela, ines]) await openShell(page);
    const [hers, theirs] = [sizeField(ines.page), sizeField(bela.page)];
    await Promise.all([hers.waitFor(), theirs.waitFor()]);
    await ines.visit.context.setOffline(true);
    await hers.fill('230');
    await hers.press('Tab');
    await theirs.fill('234');
    await theirs.press('Tab');
    await expect.poll(() => bela.pattern.saving().textContent()).toBe('all saved');
    await ines.visit.context.setOffline(false);
    const question = ines.page.getByRole('dialog', { name: 'Two people changed this at once' });
    await question.waitFor();
    await keepScreen(ines.page, 'same-field');
    await question.getByRole('button', { name: 'Keep mine' }).click();
    await expect.poll(() => theirs.inputValue(), { timeout: 20_000 }).toMatch(/^230/);
  });

  it('go on without loss when one server process ended and came back', async () => {
    const { bela, ines } = await bothOpen();
    await bela.pattern.standOn({ course: 'F', stave: 4 });
    await ines.pattern.standOn({ course: 'F', stave: 8 });
    await beside.stop();
    await ines.page.keyboard.press('3');
    await ines.page.keyboard.press(' ');
    for (const key of ['3', ' ', 'ArrowUp', ' ', 'ArrowUp', ' ']) {
      await bela.page.keyboard.press(key);
      await bela.page.waitForTimeout(100);
    }
    await expect.poll(() => bela.pattern.saving().textContent()).toBe('all saved');
    await beside.start();
    await sameOnBoth(bela, ines);
    const cells = Buffer.from((await cellsOf(bela.page)) ?? '', 'base64');
    const laid = [5 * 32 + 3, 6 * 32 + 3, 7 * 32 + 3, 5 * 32 + 7].map((p) => cells[p]);
    expect(laid).toEqual([2, 2, 2, 2]);
  });
});
