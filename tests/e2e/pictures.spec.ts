/** The pictures of the README, taken from the demonstration; only with PICTURES set. */
import { mkdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { projectFolder } from '../../scripts/project.mjs';
import { CommissionsPage } from './pages/commissions-page';
import { LayoutPage } from './pages/layout-page';
import { SignInPage } from './pages/sign-in-page';
import { startProgram, type RunningProgram } from './run/running-program';
import { untilStill } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

const FOLDER = join(projectFolder, 'tests', 'e2e', 'pictures');

describe.runIf(process.env['PICTURES'] !== undefined)('the pictures of the README', () => {
  let program: RunningProgram;
  let browser: Browser;
  let visit: Visit;

  beforeAll(async () => {
    mkdirSync(FOLDER, { recursive: true });
    [program, browser] = await Promise.all([startProgram(), launchChromium()]);
    visit = await openVisit(browser, { address: program.address });
    await new SignInPage(visit.page).signIn('ines@quarrylane.example');
  });

  afterAll(async () => {
    await browser.close();
    await program.end();
  });

  /** Few colours carry these screens: a palette keeps the files small. */
  async function take(name: string): Promise<void> {
    await visit.page.mouse.move(0, 0);
    await untilStill(visit.page);
    const path = join(FOLDER, `${name}.png`);
    const picture = await visit.page.screenshot({ animations: 'disabled' });
    await sharp(picture).png({ palette: true, quality: 90, effort: 10 }).toFile(path);
    expect(statSync(path).size).toBeLessThan(400_000);
  }

  it('shows the commissions', async () => {
    await new CommissionsPage(visit.page).open();
    await take('commissions');
    await new CommissionsPage(visit.page).enter('Ferry-hall lantern');
  });

  it.each(['Shell', 'Joint', 'Pattern', 'Cutting'] as const)(
    'shows the %s station',
    async (name) => {
      await new LayoutPage(visit.page).goTo(name);
      await visit.page.evaluate('document.activeElement.blur()');
      await take(name.toLowerCase());
    },
  );
});
