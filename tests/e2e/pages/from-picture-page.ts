import type { Page } from 'playwright-core';

/** The dialog that lays a picture, over an open Pattern station. */
export class FromPicturePage {
  constructor(private readonly page: Page) {}

  async open(): Promise<void> {
    await this.page.getByRole('button', { name: 'Start from a picture' }).click();
    await this.dialog().waitFor();
  }

  dialog() {
    return this.page.getByRole('dialog', { name: 'Lay a picture' });
  }

  /** Chooses a file, whatever comes of it. */
  async choose(name: string, bytes: Buffer): Promise<void> {
    const file = { name, mimeType: 'image/png', buffer: bytes };
    await this.dialog().locator('input[type=file]').setInputFiles(file);
  }

  /** Waits until the woods are chosen and answers what laying would do: "95 tiles would change." */
  async outcome(): Promise<string> {
    const outcome = this.dialog().getByText(/would change\.$|already laid/);
    await outcome.waitFor();
    return (await outcome.textContent()) ?? '';
  }

  frame() {
    return this.dialog().getByRole('application', { name: /^Frame of the shell/ });
  }

  preview() {
    return this.dialog().getByRole('img', { name: /^The pattern as it would be/ });
  }

  refusal() {
    return this.dialog().getByRole('alert');
  }

  lay() {
    return this.dialog().getByRole('button', { name: 'Lay the picture' });
  }

  /** Closes it without laying anything, if it is open. */
  async giveUp(): Promise<void> {
    if (await this.dialog().isVisible()) await this.page.keyboard.press('Escape');
    await this.dialog().waitFor({ state: 'detached' });
  }
}
