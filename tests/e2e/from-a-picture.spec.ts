import type { Browser } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { FromPicturePage } from './pages/from-picture-page';
import { PatternPage } from './pages/pattern-page';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { desktop, keepScreen, launchChromium, openVisit, type Visit } from './run/visit';

let program: RunningProgram;
let browser: Browser;
let visit: Visit;
let pattern: PatternPage;
let dialog: FromPicturePage;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
  visit = await openVisit(browser, { address: program.address });
  await new SignInPage(visit.page).signIn('bela@quarrylane.example');
  pattern = new PatternPage(visit.page);
  dialog = new FromPicturePage(visit.page);
  await pattern.openCommission('Ferry-hall lantern');
});

// one case that fails must not stand in the way of the next
afterEach(() => dialog.giveUp());

afterAll(async () => {
  await browser.close();
  await program.end();
});

/** Dark at the left, light at the right. */
function slope(width: number, height: number): Promise<Buffer> {
  const pixels = Buffer.alloc(width * height);
  for (let i = 0; i < pixels.length; i++) pixels[i] = (255 * (i % width)) / (width - 1);
  return sharp(pixels, { raw: { width, height, channels: 1 } })
    .png()
    .toBuffer();
}

/** A dark disc on light ground. */
function disc(side: number): Promise<Buffer> {
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${side}" height="${side}">
    <rect width="100%" height="100%" fill="#DCC39A"/>
    <circle cx="50%" cy="50%" r="42%" fill="#5A3A27"/></svg>`;
  return sharp(Buffer.from(svg)).png().toBuffer();
}

async function woodsInTray(): Promise<string[]> {
  return visit.page.locator('sl-wood-tray li .tiles').allTextContents();
}

describe('a picture', () => {
  it('is seen before it is laid, laid as one step, and taken back as one', async () => {
    const before = await woodsInTray();
    await dialog.open();
    await keepScreen(visit.page, 'from-picture-empty');
    expect(await accessibilityViolations(visit.page)).toEqual([]);

    await dialog.choose('slope.png', await slope(1600, 450));
    expect(await dialog.outcome()).toMatch(/^\d+ tiles would change\.$/);
    expect(await dialog.preview().getAttribute('aria-label')).toMatch(/White ash \d+ tiles/);
    await dialog.dialog().getByText('Error diffusion', { exact: true }).click();
    await dialog.outcome();
    await keepScreen(visit.page, 'from-picture-slope');
    expect(await accessibilityViolations(visit.page)).toEqual([]);
    expect(await woodsInTray()).toEqual(before);

    await dialog.lay().click();
    const said = visit.page.locator('mat-snack-bar-container');
    await said.getByText(/The picture is laid: \d+ tiles changed\./).waitFor();
    expect(await woodsInTray()).not.toEqual(before);
    await keepScreen(visit.page, 'from-picture-laid');
    await said.getByRole('button', { name: 'Undo' }).click();
    await expect.poll(woodsInTray).toEqual(before);
  });

  it('that is given up changes nothing', async () => {
    const before = await woodsInTray();
    await dialog.open();
    await dialog.choose('disc.png', await disc(600));
    await dialog.outcome();
    await dialog.giveUp();
    expect(await woodsInTray()).toEqual(before);
  });

  it('is cropped and turned by keyboard; tiles beyond it keep their wood', async () => {
    await dialog.open();
    await dialog.choose('disc.png', await disc(600));
    const filling = await dialog.outcome();
    await dialog.dialog().getByRole('button', { name: 'Whole picture' }).click();
    await expect.poll(() => dialog.outcome()).not.toBe(filling);
    const whole = await dialog.outcome();
    await dialog.frame().focus();
    for (let i = 0; i < 4; i++) await visit.page.keyboard.press('Shift+ArrowRight');
    await visit.page.keyboard.press('+');
    await expect.poll(() => dialog.outcome()).not.toBe(whole);
    await dialog.dialog().getByRole('button', { name: 'Turn left' }).click();
    await dialog.dialog().getByRole('slider', { name: 'Lean' }).fill('12');
    await dialog
      .dialog()
      .getByRole('checkbox', { name: /Black cherry/ })
      .uncheck();
    await dialog.dialog().getByRole('slider', { name: 'How much Black walnut' }).fill('2');
    await dialog.outcome();
    await keepScreen(visit.page, 'from-picture-turned');
    await dialog.giveUp();
  });

  it('is moved and sized with the pointer', async () => {
    await dialog.open();
    await dialog.choose('slope.png', await slope(900, 900));
    await dialog.outcome();
    const frame = dialog.dialog().locator('sl-crop-frame rect.frame');
    const top = () => frame.getAttribute('y');
    const before = await top();
    const box = (await frame.boundingBox())!;
    await visit.page.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
    await visit.page.mouse.down();
    await visit.page.mouse.move(box.x + box.width / 2, box.y + box.height / 2 - 40, { steps: 4 });
    await visit.page.mouse.up();
    expect(Number(await top())).toBeLessThan(Number(before) - 20);

    const width = () => frame.getAttribute('width');
    const wide = Number(await width());
    const corner = (await dialog.dialog().locator('circle.corner').first().boundingBox())!;
    await visit.page.mouse.move(corner.x + corner.width / 2, corner.y + corner.height / 2);
    await visit.page.mouse.down();
    await visit.page.mouse.move(corner.x + 60, corner.y + 12, { steps: 4 });
    await visit.page.mouse.up();
    expect(Number(await width())).toBeLessThan(wide);
    await dialog.giveUp();
  });

  it('that is none is refused in a sentence, and the next one is read', async () => {
    await dialog.open();
    const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>');
    await dialog.choose('drawing.png', svg);
    await dialog.refusal().waitFor();
    expect(await dialog.refusal().textContent()).toContain(
      'The picture must be a PNG, JPEG or WebP file; this is an SVG drawing.',
    );
    await keepScreen(visit.page, 'from-picture-refused');
    await dialog.choose('large.png', Buffer.alloc(10 * 1024 * 1024 + 1));
    await dialog
      .refusal()
      .getByText(/at most 10 MB; this one has 10\.1 MB/)
      .waitFor();
    await dialog.choose('disc.png', await disc(300));
    await dialog.outcome();
    expect(await dialog.refusal().count()).toBe(0);
    await dialog.giveUp();
  });

  it('is laid on a narrower, darker screen as well', async () => {
    await visit.page.setViewportSize({ width: 800, height: 1000 });
    await visit.page.evaluate("document.documentElement.dataset.theme = 'dark'");
    await dialog.open();
    await dialog.choose('disc.png', await disc(600));
    await dialog.outcome();
    await keepScreen(visit.page, 'from-picture-narrow-dark');
    expect(await accessibilityViolations(visit.page)).toEqual([]);
    await dialog.giveUp();
    await visit.page.setViewportSize(desktop);
  });

  it('leaves the console clean but for the refusal of the SVG', () => {
    expect(visit.consoleErrors.filter((line) => !line.includes('400'))).toEqual([]);
  });
});
