import type { Locator } from 'playwright-core';
import { LayoutPage } from './layout-page';

/** Kept versions, what changed between two of them, and going back to one. */
export class ReviewStation extends LayoutPage {
  version(number: number): Locator {
    return this.page.getByRole('article', { name: `Version ${number}`, exact: true });
  }

  /** Shows what changed in a version since the one before. */
  async whatChangedIn(number: number): Promise<void> {
    await this.page.getByRole('button', { name: `What changed in version ${number}` }).click();
  }

  comparison(): Locator {
    return this.page.getByRole('region', { name: 'What changed' });
  }

  /** Opens the dialog that goes back to a version. */
  async startRestoring(number: number): Promise<Locator> {
    await this.page.getByRole('button', { name: `Restore version ${number}` }).click();
    const dialog = this.page.getByRole('dialog', { name: `Restore version ${number}?` });
    await dialog.waitFor();
    return dialog;
  }
}
