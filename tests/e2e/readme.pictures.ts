/** Takes the pictures of the README from the demonstration: `npm run pictures`. */
import { mkdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { projectFolder } from '../../scripts/project.mjs';
import { CommissionsPage } from './pages/commissions-page';
import { LayoutPage } from './pages/layout-page';
import { PatternStation } from './pages/pattern-station';
import { SignInPage } from './pages/sign-in-page';
import { startProgram, type RunningProgram } from './run/running-program';
import { untilStill } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

const FOLDER = join(projectFolder, 'tests', 'e2e', 'pictures');

describe('the pictures of the README', () => {
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

  it('shows the Pattern station with what the next touch will lay', async () => {
    const pattern = new PatternStation(visit.page);
    await pattern.goTo('Pattern');
    await pattern.say('Wood', 'black cherry');
    await pattern.say('Repeated', '8 times round');
    await pattern.say('Each step', '1 course up');
    const { width, height } = await pattern.size();
    await pattern.canvas().hover({ position: { x: width * 0.2, y: height * 0.7 } });
    await take('pattern');
  });

  it.each(['Shell', 'Joint', 'Cutting'] as const)('shows the %s station', async (name) => {
    await new LayoutPage(visit.page).goTo(name);
    await visit.page.evaluate('document.activeElement.blur()');
    await take(name.toLowerCase());
  });
});
