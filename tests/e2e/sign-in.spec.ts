import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { SignInPage } from './pages/sign-in-page';
import { accessibilityViolations } from './run/accessibility';
import { startProgram, type RunningProgram } from './run/running-program';
import { desktop, keepScreen, launchChromium, openVisit, phone } from './run/visit';

let program: RunningProgram;
let browser: Browser;

beforeAll(async () => {
  [program, browser] = await Promise.all([startProgram(), launchChromium()]);
});

afterAll(async () => {
  await browser.close();
  await program.end();
});

describe.each([
  ['desktop', desktop],
  ['phone', phone],
])('the sign-in page on a %s', (name, size) => {
  it('reads well to everyone and leaves the console clean', async () => {
    const visit = await openVisit(browser, { address: program.address, size });
    await new SignInPage(visit.page).open();
    await keepScreen(visit.page, `sign-in-${name}`);
    expect(await accessibilityViolations(visit.page)).toEqual([]);
    expect(visit.consoleErrors).toEqual([]);
    await visit.context.close();
  });
});

it('lets a designer in with the demo password, and nobody with another', async () => {
  const visit = await openVisit(browser, { address: program.address });
  const signIn = new SignInPage(visit.page);
  await signIn.open();
  await signIn.submit('bela@quarrylane.example', 'not-the-password');
  await visit.page.getByRole('alert').waitFor();
  expect(new URL(visit.page.url()).pathname).toBe('/sign-in');
  await signIn.signIn('bela@quarrylane.example');
  await visit.page.getByRole('heading', { name: 'Commissions' }).waitFor();
  await visit.context.close();
});
