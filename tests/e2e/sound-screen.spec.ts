/** The eyes of the other specs: they must see what they are there to see. */
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { accessibilityViolations } from './run/accessibility';
import { sidewaysOverflow } from './run/sound-screen';
import { launchChromium, openVisit, type Visit } from './run/visit';

let browser: Browser;
let visit: Visit;

beforeAll(async () => {
  browser = await launchChromium();
  visit = await openVisit(browser, {
    address: 'http://127.0.0.1',
    size: { width: 390, height: 844 },
  });
  await visit.page.goto('about:blank');
});

afterAll(async () => {
  await browser.close();
});

it('a box that sticks out of the window is seen, one that scrolls within another is not', async () => {
  await visit.page.setContent('<p style="width: 500px">wide</p>');
  expect((await sidewaysOverflow(visit.page)).join()).toContain('p.null 8 to 508 of 390');
  await visit.page.setContent(
    '<div style="overflow-x: auto"><p style="width: 500px">wide</p></div>',
  );
  expect(await sidewaysOverflow(visit.page)).toEqual([]);
});

it('a picture without words and text too pale to read are seen', async () => {
  await visit.page.setContent('<main><img src="data:,"><p style="color: #bbb">pale</p></main>');
  const found = (await accessibilityViolations(visit.page)).join('\n');
  expect(found).toContain('image-alt');
  expect(found).toContain('color-contrast');
});

it('what the console calls an error is kept', async () => {
  await visit.page.evaluate(`console.error('not as it should be')`);
  await expect.poll(() => visit.consoleErrors.join()).toContain('not as it should be');
});
