/**
 * What happens to one's work when something goes wrong under it: a database that stops, a save that fails,
 * a window that closes, the same layout open twice, a session that ends.
 */
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { CommissionsPage } from './pages/commissions-page';
import { JointStation } from './pages/joint-station';
import { PatternStation } from './pages/pattern-station';
import { ShellStation } from './pages/shell-station';
import { SignInPage } from './pages/sign-in-page';
import { startProgramWithPostgres, type ProgramWithPostgres } from './run/running-program';
import { expectSoundScreen } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

let program: ProgramWithPostgres;
let browser: Browser;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgramWithPostgres(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

/** Ines in a window of her own, in a new commission. */
async function inNewCommission(title: string): Promise<Visit> {
  const visit = await openVisit(browser, { address: program.address });
  await new SignInPage(visit.page).signIn('ines@quarrylane.example');
  const dialog = await new CommissionsPage(visit.page).startNew();
  await dialog.title().fill(title);
  await dialog.make();
  return visit;
}

/** Does something while PostgreSQL is away; it is back afterwards, however that went. */
async function withoutPostgres(work: () => Promise<void>): Promise<void> {
  await program.stopPostgres();
  try {
    await work();
  } finally {
    await program.startPostgres();
  }
}

/** Another tab of the same person on the same page, which hears nothing of what others do: it grows stale. */
async function deafTab(visit: Visit): Promise<Page> {
  const page = await visit.context.newPage();
  await page.route(/\/events\?/, (route) => route.abort());
  await page.goto(visit.page.url());
  await page.getByRole('navigation', { name: 'Stations' }).waitFor();
  return page;
}

/** No save and no news reaches this page until it is called back. */
async function cutOff(page: Page): Promise<() => Promise<void>> {
  const away = /\/api\/layouts\//;
  await page.route(away, (route) => route.abort());
  return () => page.unroute(away);
}

it('PostgreSQL stops in the middle: the page says so, keeps the work and saves it when it is back', async () => {
  const { page, context } = await inNewCommission('Through an outage');
  const shell = new ShellStation(page);
  await withoutPostgres(async () => {
    await shell.field('Board').fill('16');
    await shell.trouble().getByText('Not saved.').waitFor();
    const words = await shell.trouble().innerText();
    expect(words).toContain('What you did is kept in this browser and tried again.');
    expect(words).not.toMatch(/ECONN|postgres|127\.0\.0\.1|select/i);
    expect(await shell.pill().innerText()).toBe('not saved');
    await expectSoundScreen(page, 'not-saved');
    // work goes on meanwhile
    await shell.field('Finished height').fill('224');
    expect(await shell.field('Board').inputValue()).toBe('16.00');
  });
  await shell.saved();
  expect(await shell.trouble().count()).toBe(0);
  await page.reload();
  await expect.poll(() => shell.field('Board').inputValue()).toBe('16.00');
  expect(await shell.field('Finished height').inputValue()).toBe('224.00');
  await context.close();
});

it('the list of commissions says that the server is away and comes back with it', async () => {
  const visit = await openVisit(browser, { address: program.address });
  const { page, context } = visit;
  await new SignInPage(page).signIn('bela@quarrylane.example');
  const commissions = new CommissionsPage(page);
  await commissions.enter('Ferry-hall lantern');
  await withoutPostgres(async () => {
    await page.getByRole('link', { name: 'Commissions', exact: true }).click();
    await page.getByRole('heading', { name: 'The commissions could not be fetched' }).waitFor();
    await expectSoundScreen(page, 'commissions-away');
  });
  await page.getByRole('button', { name: 'Try again' }).click();
  await commissions.row('Ferry-hall lantern').waitFor();
  await context.close();
});

it('a save that fails is tried again with growing pauses, and at once when asked', async () => {
  const { page, context } = await inNewCommission('A short break');
  const shell = new ShellStation(page);
  const callBack = await cutOff(page);
  await shell.field('Board').fill('17');
  await shell.trouble().getByText('again in 2 s').waitFor();
  await shell.trouble().getByText('again in 8 s').waitFor();
  await callBack();
  await shell.trouble().getByRole('button', { name: 'Try now' }).click();
  await shell.saved();
  await page.reload();
  await expect.poll(() => shell.field('Board').inputValue()).toBe('17.00');
  await context.close();
});

it('a tab closed during an outage loses nothing: the server has what it acknowledged, the browser the rest', async () => {
  const { page, context } = await inNewCommission('Closed in a hurry');
  const address = page.url();
  const shell = new ShellStation(page);
  await shell.field('Board').fill('18');
  await shell.saved();
  await withoutPostgres(async () => {
    await shell.field('Finished height').fill('222');
    await shell.trouble().getByText('Not saved.').waitFor();
    await page.close();
  });

  const elsewhere = await openVisit(browser, { address: program.address });
  await new SignInPage(elsewhere.page).signIn('bela@quarrylane.example');
  const theirs = new ShellStation(elsewhere.page);
  await theirs.open(address);
  await expect.poll(() => theirs.field('Board').inputValue()).toBe('18.00');
  expect(await theirs.field('Finished height').inputValue()).toBe('228.00');

  const again = new ShellStation(await context.newPage());
  await again.open(address);
  await expect.poll(() => again.field('Finished height').inputValue()).toBe('222.00');
  expect(await again.field('Board').inputValue()).toBe('18.00');
  await again.saved();
  // and it reaches whoever else has the layout open
  await expect.poll(() => theirs.field('Finished height').inputValue()).toBe('222.00');
  await elsewhere.context.close();
  await context.close();
});

it('a tab closed right after the last touch still sends it', async () => {
  const { page, context } = await inNewCommission('Closed at once');
  const address = page.url();
  await new ShellStation(page).field('Board').fill('19');
  await page.close();
  const again = new ShellStation(await context.newPage());
  await again.open(address);
  await expect.poll(() => again.field('Board').inputValue()).toBe('19.00');
  await context.close();
});

it('two tabs, one of them stale: tiles laid in both come together', async () => {
  const visit = await inNewCommission('Laid from two sides');
  const one = new PatternStation(visit.page);
  await one.goTo('Pattern');
  const other = new PatternStation(await deafTab(visit));
  const { width, height } = await one.size();
  const callBack = await cutOff(other.page);
  await one.say('Where', 'a course');
  await one.touch({ x: width / 2, y: height * 0.3 });
  await one.saved();
  await other.say('Where', 'a course');
  await other.touch({ x: width / 2, y: height * 0.7 });
  await other.trouble().getByText('Not saved.').waitFor();
  await callBack();
  await other.saved();
  await expect.poll(() => other.tilesOf('Black walnut')).toBe(48);
  await expect.poll(() => one.tilesOf('Black walnut')).toBe(48);
  await visit.context.close();
});

it('two tabs, one of them stale: the same field set in both asks which value stays', async () => {
  const visit = await inNewCommission('Set from two sides');
  const one = new JointStation(visit.page);
  await one.goTo('Joint');
  const other = new JointStation(await deafTab(visit));
  const callBack = await cutOff(other.page);
  await one.enter('Flute length', 18);
  await one.saved();
  await other.enter('Flute length', 20);
  await other.trouble().getByText('Not saved.').waitFor();
  await callBack();
  const question = other.page.getByRole('dialog', { name: 'Two people changed this at once' });
  await question.waitFor();
  expect(await question.innerText()).toMatch(/Flute length[\s\S]*20\.00 mm[\s\S]*18\.00 mm/);
  await expectSoundScreen(other.page, 'contest');
  await question.getByRole('button', { name: 'Keep mine' }).click();
  await other.saved();
  await expect.poll(() => one.field('Flute length').inputValue()).toBe('20.00');
  await visit.context.close();
});

it('a session that ends elsewhere leads to the sign-in page and back to where one was', async () => {
  const { page, context } = await inNewCommission('Signed out elsewhere');
  const joint = new JointStation(page);
  await joint.goTo('Joint');
  const address = page.url();
  await context.clearCookies();
  await joint.enter('Flute length', 19);
  await page.getByText('Your session has ended.').waitFor();
  await expectSoundScreen(page, 'session-ended');
  await new SignInPage(page).submit('ines@quarrylane.example', 'ring-of-staves');
  await page.waitForURL(address);
  await expect.poll(() => joint.field('Flute length').inputValue()).toBe('19.00');
  await joint.saved();
  await context.close();
});
