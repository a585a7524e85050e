import type { Page } from 'playwright-core';

/** The panel behind one's own initials. */
export class AccountMenu {
  constructor(private readonly page: Page) {}

  /** Opens it. */
  async open(): Promise<void> {
    await this.page.getByRole('button', { name: /account of/ }).click();
    await this.panel().waitFor();
  }

  panel() {
    return this.page.getByRole('dialog', { name: 'Account' });
  }

  /** Shows the page in other colours and closes the panel. */
  async colours(words: 'Light' | 'Dark'): Promise<void> {
    await this.open();
    await this.panel().getByText(words, { exact: true }).click();
    await this.page.keyboard.press('Escape');
    await this.panel().waitFor({ state: 'detached' });
  }

  /** Signs out and waits for the sign-in page. */
  async signOut(): Promise<void> {
    await this.open();
    await this.panel().getByRole('button', { name: 'Sign out' }).click();
    await this.page.waitForURL((url) => url.pathname === '/sign-in');
  }
}
