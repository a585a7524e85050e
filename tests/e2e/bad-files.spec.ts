/** Files that are no sound layout, and names that try to be more than names. */
import { mkdtempSync, rmSync, truncateSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { fixturePath } from '../reference/fixtures';
import { CommissionsPage, type NewCommissionDialog } from './pages/commissions-page';
import { CuttingStation } from './pages/cutting-station';
import { LayoutPage } from './pages/layout-page';
import { PatternStation } from './pages/pattern-station';
import { ShellStation } from './pages/shell-station';
import { SignInPage } from './pages/sign-in-page';
import { openBundle } from './run/opened-bundle';
import { startProgram, type RunningProgram } from './run/running-program';
import { expectSoundScreen } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;
const folder = mkdtempSync(join(tmpdir(), 'staveloom-files-'));

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
  rmSync(folder, { recursive: true, force: true });
});

async function signedIn(email: string): Promise<Visit> {
  const visit = await openVisit(browser, { address: program.address });
  await new SignInPage(visit.page).signIn(email);
  return visit;
}

/** The dialog for a new commission, ready to take a file. */
async function readyForFile({ page }: Visit): Promise<NewCommissionDialog> {
  const dialog = await new CommissionsPage(page).startNew();
  await dialog.startFromFile();
  return dialog;
}

describe('a file that is no sound layout', () => {
  let visit: Visit;
  let dialog: NewCommissionDialog;
  beforeAll(async () => {
    visit = await signedIn('runa@quarrylane.example');
    dialog = await readyForFile(visit);
  });
  afterAll(async () => {
    expect(visit.consoleErrors).toEqual([]);
    await visit.context.close();
  });

  it.each([
    ['not-json', 'is not JSON, so it is not a layout file'],
    ['wrong-format', 'format must be "staveloom-layout"; this is not a layout file'],
    ['newer-version', 'formatVersion is 2: this file was written by a newer Staveloom'],
    ['unknown-key', 'shell.veneer is not a known key here'],
    ['past-the-largest-number', 'shell.tileWidth must be a number from 6 to 300 mm'],
    ['cells-too-short', 'cells must hold one byte a tile: 24 staves × 8 courses need 192 bytes'],
    ['cells-naming-no-wood', 'cells names wood 2 at byte 0, but there are woods 0 to 1'],
    ['no-woods', 'woods must list 1 to 24 woods'],
    ['name-of-10000-characters', 'name must be at most 120 characters long'],
    ['wood-colour-with-markup', 'woods.0.colour must be a colour such as "#DCC39A"'],
    ['tab-without-a-neck', 'joint.staveJoint.reach must be at most 7.91 mm'],
  ])('%s is answered with its field and a sentence', async (name, sentence) => {
    await dialog.giveFile(fixturePath(`not-ok/${name}.json`));
    const problems = dialog.problems().filter({ hasText: `“${name}.json” cannot be opened:` });
    await problems.filter({ hasText: sentence }).waitFor();
  });

  it('50 MB are not even read', async () => {
    const path = join(folder, 'fifty.json');
    writeFileSync(path, '{');
    truncateSync(path, 50 * 2 ** 20);
    await dialog.giveFile(path);
    await dialog.problems().getByText('The file is far larger than any layout').waitFor();
  });

  it('makes no commission, and the screen that says so reads well', async () => {
    await dialog.giveFile(fixturePath('not-ok/tab-without-a-neck.json'));
    await dialog.title().fill('Out of a broken file');
    await dialog.dialog.getByRole('button', { name: 'Make the commission' }).click();
    await dialog.problems().getByText('Choose a layout file first').waitFor();
    await expectSoundScreen(visit.page, 'bad-file');
  });
});

it('names with markup and formulas are shown as they are, on every screen and in the bundle', async () => {
  const visit = await signedIn('runa@quarrylane.example');
  const { page } = visit;
  const asked: string[] = [];
  page.on('dialog', (dialog) => {
    asked.push(dialog.message());
    void dialog.dismiss();
  });
  const dialog = await readyForFile(visit);
  await dialog.giveFile(fixturePath('ok/hostile-names.json'));
  await expect.poll(() => dialog.title().inputValue()).toContain('<script>');
  const title = `<img src=x onerror="alert(1)"> =1+1`;
  await dialog.title().fill(title);
  await dialog.client().fill('"><svg onload=alert(2)>');
  await dialog.make();
  const layout = new LayoutPage(page);
  await layout.goTo('Pattern');
  await layout.keep('<script>alert(3)</script>');
  await layout.goTo('Review');
  await page.getByText('<script>alert(3)</script>').waitFor();
  const cutting = new CuttingStation(page);
  await cutting.goTo('Cutting');
  const download = await cutting.download();
  const path = join(folder, 'hostile.zip');
  await download.saveAs(path);
  const bundle = openBundle(path);
  for (const name of bundle.names.filter((each) => /\.svg$/.test(each))) {
    expect(bundle.text(name)).not.toMatch(/<script|onerror="|<img/i);
  }
  expect(bundle.text('cut-list.csv')).not.toMatch(/(^|,|\n)"?[=+@-]/);
  await new CommissionsPage(page).open();
  await page.getByRole('link', { name: title }).waitFor();
  expect(await page.locator('img[src="x"], svg[onload]').count()).toBe(0);
  expect(asked).toEqual([]);
  expect(visit.consoleErrors).toEqual([]);
  await visit.context.close();
});

it('a layout file taken from one workshop opens in another', async () => {
  const visit = await signedIn('jonah@saltmarsh.example');
  const dialog = await readyForFile(visit);
  await dialog.giveFile(fixturePath('ok/ferry-hall-lantern.json'));
  await dialog.dialog.getByText('32 × 9').waitFor();
  expect(await dialog.title().inputValue()).toBe('Ferry-hall lantern');
  await dialog.make();
  expect(await new ShellStation(visit.page).field('Staves round').inputValue()).toBe('32');
  const pattern = new PatternStation(visit.page);
  await pattern.goTo('Pattern');
  const [download] = await Promise.all([
    visit.page.waitForEvent('download'),
    pattern.downloadFile(),
  ]);
  const path = join(folder, 'again.json');
  await download.saveAs(path);

  const home = await signedIn('runa@quarrylane.example');
  const again = await readyForFile(home);
  await again.giveFile(path);
  await again.dialog.getByText('32 × 9').waitFor();
  expect(await again.title().inputValue()).toBe('Ferry-hall lantern');
  expect([...visit.consoleErrors, ...home.consoleErrors]).toEqual([]);
  await home.context.close();
  await visit.context.close();
});
