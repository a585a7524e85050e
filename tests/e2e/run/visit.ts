import { createRequire } from 'node:module';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { projectFolder } from '../../../scripts/project.mjs';

const axeSource = createRequire(import.meta.url).resolve('axe-core/axe.min.js');

export const desktop = { width: 1440, height: 900 } as const;
export const phone = { width: 390, height: 844 } as const;

/** One person at one browser window. */
export interface Visit {
  readonly page: Page;
  readonly context: BrowserContext;
  /** Everything the console called an error and every uncaught exception, so far. */
  readonly consoleErrors: readonly string[];
}

/** Debian's Chromium, without the services that would call out. */
export function launchChromium(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

export interface VisitOptions {
  /** Where the program is served. */
  readonly address: string;
  /** Of the window, in CSS pixels. */
  readonly size?: { readonly width: number; readonly height: number };
  /** Screen pixels a CSS pixel: 2 for a window that is read at 200 %. */
  readonly fineness?: number;
}

/** Opens a window of its own: nobody is signed in. Close it with `visit.context.close()`. */
export async function openVisit(
  browser: Browser,
  { address, size = desktop, fineness = 1 }: VisitOptions,
): Promise<Visit> {
  const context = await browser.newContext({
    baseURL: address,
    viewport: size,
    deviceScaleFactor: fineness,
    hasTouch: size.width < 600,
    acceptDownloads: true,
    reducedMotion: 'reduce',
    locale: 'en-GB',
  });
  // Before the page's own scripts, where its content policy does not forbid it.
  await context.addInitScript({ path: axeSource });
  const page = await context.newPage();
  const consoleErrors: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') consoleErrors.push(`${message.text()} (${page.url()})`);
  });
  page.on('pageerror', (error) => consoleErrors.push(error.stack ?? error.message));
  return { page, context, consoleErrors };
}

/** With PICTURES set, keeps a picture of the page as out/screens/NAME.png for someone to look at. */
export async function keepScreen(page: Page, name: string): Promise<void> {
  if (process.env['PICTURES'] === undefined) return;
  const folder = join(projectFolder, 'out', 'screens');
  mkdirSync(folder, { recursive: true });
  await page.screenshot({ path: join(folder, `${name}.png`), animations: 'disabled' });
}
