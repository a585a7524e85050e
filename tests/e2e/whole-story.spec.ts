/**
 * The whole job in one go, as two people do it: the designer lays out a shell until the cutter fits and keeps
 * two versions; the maker takes the bundle away and goes back to the first.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { AccountMenu } from './pages/account-menu';
import { CommissionsPage } from './pages/commissions-page';
import { CuttingStation } from './pages/cutting-station';
import { JointStation } from './pages/joint-station';
import { PatternStation } from './pages/pattern-station';
import { ReviewStation } from './pages/review-station';
import { ShellStation } from './pages/shell-station';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { measurePiece, openBundle, type OpenedPiece } from './run/opened-bundle';
import { startProgram, type RunningProgram } from './run/running-program';
import { expectSoundScreen, sidewaysOverflow } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

const TITLE = 'Observatory lamp';
const TILE = 28;
const JOINT = { head: 3.6, fillet: 1.8, reach: 7.6, clearance: 0.12 };

let program: RunningProgram;
let browser: Browser;
let visit: Visit;
const folder = mkdtempSync(join(tmpdir(), 'staveloom-story-'));

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
  visit = await openVisit(browser, { address: program.address });
});

afterAll(async () => {
  await browser.close();
  await program.end();
  rmSync(folder, { recursive: true, force: true });
});

describe('a shell from the first idea to the machine', () => {
  afterEach(() => {
    expect(visit.consoleErrors).toEqual([]);
  });

  it('Ines signs in and starts a commission', async () => {
    await new SignInPage(visit.page).signIn('ines@quarrylane.example');
    const commissions = new CommissionsPage(visit.page);
    await commissions.table().waitFor();
    await expectSoundScreen(visit.page, 'commissions');
    const dialog = await commissions.startNew();
    await dialog.title().fill(TITLE);
    await dialog.client().fill('Hill Observatory');
    await expectSoundScreen(visit.page, 'new-commission');
    await dialog.make();
  });

  it('she enters the shell and reads what the ring comes to', async () => {
    const shell = new ShellStation(visit.page);
    await shell.enter({
      'Staves round': 32,
      'Courses high': 9,
      'Tile width': TILE,
      'Tile height': TILE,
      'Turned outside to': 280,
      'Bored to': 262,
      'Finished height': 238,
      Board: 14,
    });
    // 180° / 32, and 28 / tan(180° / 32) across the flats
    await shell.findings().getByText('5.63°').first().waitFor();
    await shell.findings().getByText('284.29 mm').first().waitFor();
    await shell.saved();
    await expectSoundScreen(visit.page, 'shell');
  });

  it('the neck fillet is too tight for the cutter, and the Joint station says so', async () => {
    const joint = new JointStation(visit.page);
    await joint.goTo('Joint');
    await joint.enter('Head radius', JOINT.head);
    await joint.enter('Tab reach', JOINT.reach);
    await joint.enter('Neck fillet radius', 1.4);
    const stop = joint.finding(
      'The neck fillet of the stave joint is cut at 1.46 mm; a 3.175 mm cutter needs 1.59 mm.',
    );
    expect(await stop.innerText()).toMatch(/^stop/);
    expect(await stop.innerText()).toContain('Widen the neck fillet or take a 2.92 mm cutter.');
    expect(await joint.station('Joint').innerText()).toMatch(/^stop/);
    await joint.saved();
    await expectSoundScreen(visit.page, 'joint-stop');
  });

  it('she widens the fillet, and the cutter fits', async () => {
    const joint = new JointStation(visit.page);
    await joint.enter('Neck fillet radius', JOINT.fillet);
    const clear = joint.finding('is cut at 1.86 mm; a 3.175 mm cutter needs 1.59 mm.');
    expect(await clear.innerText()).toMatch(/^clear/);
    expect(await joint.station('Joint').innerText()).not.toMatch(/^stop/);
    await joint.keep('Sizes and joint; the cutter fits');
  });

  it('she lays a course, a stave, a tile and a stroke of tiles, takes one back and lays it again', async () => {
    const pattern = new PatternStation(visit.page);
    await pattern.goTo('Pattern');
    const walnut = () => pattern.tilesOf('Black walnut');
    const { width, height } = await pattern.size();
    const middle = { x: width / 2, y: height / 2 };

    await pattern.say('Where', 'a course');
    await pattern.touch(middle);
    await expect.poll(walnut).toBe(32);
    await visit.page.keyboard.press('Control+z');
    await expect.poll(walnut).toBe(0);
    await visit.page.keyboard.press('Control+Shift+z');
    await expect.poll(walnut).toBe(32);

    await pattern.say('Where', 'a stave');
    await pattern.touch(middle);
    await expect.poll(walnut).toBe(32 + 9 - 1);

    await pattern.say('Where', 'one tile');
    await pattern.say('Wood', 'hard maple');
    await pattern.touch(middle);
    await expect.poll(walnut).toBe(32 + 9 - 2);

    await pattern.say('Wood', 'black walnut');
    const above = height * 0.3;
    await pattern.draw({ x: width * 0.6, y: above }, { x: width * 0.9, y: above });
    await expect.poll(walnut).toBeGreaterThan(32 + 9 + 2);
    const drawn = await walnut();
    await pattern.undoButton().click();
    await expect.poll(walnut).toBe(32 + 9 - 2);
    await pattern.redoButton().click();
    await expect.poll(walnut).toBe(drawn);
    await pattern.saved();
    await expectSoundScreen(visit.page, 'pattern');
    await pattern.wrapButton().click();
    await visit.page.getByRole('button', { name: 'Wrapped', pressed: true }).waitFor();
    // One size is enough: drawn without a graphics card, the wrapped shell takes seconds after each change.
    expect(await sidewaysOverflow(visit.page)).toEqual([]);
    expect(await accessibilityViolations(visit.page)).toEqual([]);
    await pattern.wrapButton().click();
  });

  it('she looks at it in the dark', async () => {
    const account = new AccountMenu(visit.page);
    await account.open();
    await expectSoundScreen(visit.page, 'account');
    await visit.page.keyboard.press('Escape');
    await account.colours('Dark');
    await expectSoundScreen(visit.page, 'pattern-dark');
    const joint = new JointStation(visit.page);
    await joint.goTo('Joint');
    await expectSoundScreen(visit.page, 'joint-dark');
    await account.colours('Light');
  });

  it('she keeps a version with a note and signs out', async () => {
    const pattern = new PatternStation(visit.page);
    const dialog = await pattern.startKeeping();
    await expectSoundScreen(visit.page, 'keep-version');
    await dialog.getByRole('button', { name: 'Not now' }).click();
    await pattern.keep('A cross in walnut');
    await visit.page.getByText('Draft on version 2').waitFor();
    await new AccountMenu(visit.page).signOut();
  });

  it('Tomas signs in, reads the cut list and downloads the bundle', async () => {
    await new SignInPage(visit.page).signIn('tomas@quarrylane.example');
    await new CommissionsPage(visit.page).enter(TITLE);
    const cutting = new CuttingStation(visit.page);
    await cutting.goTo('Cutting');
    await cutting.downloadButton().waitFor();
    await expectSoundScreen(visit.page, 'cutting');
    const kinds = await cutting.kinds().count();
    const download = await cutting.download();
    expect(download.suggestedFilename()).toBe('observatory-lamp-v2.zip');
    const path = join(folder, 'bundle.zip');
    await download.saveAs(path);

    const { manifest, names } = openBundle(path);
    expect(manifest.layout).toMatchObject({ name: TITLE, staves: 32, courses: 9 });
    expect(manifest.version).toEqual({ number: 2, note: 'A cross in walnut' });
    expect(manifest.clearance).toBe(JOINT.clearance);
    expect(manifest.checks.filter(({ result }) => result === 'stop')).toEqual([]);
    expect(manifest.pieces).toHaveLength(kinds);
    expect(manifest.pieces.reduce((sum, piece) => sum + piece.count, 0)).toBe(32 * 9);
    expect([...names].sort()).toEqual(
      ['manifest.json', ...manifest.files.map((file) => file.path)].sort(),
    );
  });

  it('every piece measures what was typed', () => {
    const bundle = openBundle(join(folder, 'bundle.zip'));
    for (const piece of bundle.manifest.pieces) {
      const measured = measurePiece(bundle, piece);
      const { left, right, bottom, top } = piece.edges;
      const radii = radiiOf(piece);
      expect(measured.radii).toHaveLength(radii.length);
      measured.radii.forEach((radius, i) => {
        expect(Math.abs(radius - (radii[i] ?? NaN))).toBeLessThan(1e-4);
      });
      expect(measured.width).toBeCloseTo(TILE + beyond(left) + beyond(right), 4);
      expect(measured.height).toBeCloseTo(TILE + beyond(bottom) + beyond(top), 4);
    }
  });

  it('Tomas compares the versions and goes back to the first', async () => {
    const review = new ReviewStation(visit.page);
    await review.goTo('Review');
    await review.whatChangedIn(2);
    await review.comparison().getByText('Changed:').waitFor();
    await expect.poll(() => review.comparison().innerText()).toContain('tiles');
    await expectSoundScreen(visit.page, 'review');
    const dialog = await review.startRestoring(1);
    await expectSoundScreen(visit.page, 'restore');
    await dialog.getByRole('button', { name: 'Restore as version 3' }).click();
    await review.version(3).getByText('Version 1 again').waitFor();
    const pattern = new PatternStation(visit.page);
    await pattern.goTo('Pattern');
    expect(await pattern.tilesOf('Black walnut')).toBe(0);
    await expectSoundScreen(visit.page, 'pattern-maker');
  });
});

/** Radii after clearance: every mating edge has moved into its own wood by half of it. */
function radiiOf({ edges }: OpenedPiece): number[] {
  const inset = JOINT.clearance / 2;
  const { head, fillet } = JOINT;
  const radii = {
    tab: [head - inset, fillet + inset, fillet + inset],
    socket: [head + inset, fillet - inset, fillet - inset],
    flat: [],
  };
  return Object.values(edges)
    .flatMap((edge) => radii[edge])
    .sort((a, b) => a - b);
}

/** How far a piece stands out beyond its nominal edge. */
function beyond(edge: 'tab' | 'socket' | 'flat'): number {
  const inset = JOINT.clearance / 2;
  return { tab: JOINT.reach - inset, socket: -inset, flat: 0 }[edge];
}
