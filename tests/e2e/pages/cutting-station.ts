import type { Download, Locator } from 'playwright-core';
import { LayoutPage } from './layout-page';

/** The cut list, the checks, and the bundle for the machine. */
export class CuttingStation extends LayoutPage {
  kinds(): Locator {
    return this.page.locator('sl-kind-row');
  }

  downloadButton(): Locator {
    return this.page.getByRole('button', { name: 'Download the bundle' });
  }

  /** Asks for the cutter's centre path as well. */
  async withCentrePath(): Promise<void> {
    await this.page.getByLabel('Cutter centre path').selectOption({ label: 'on its own layer' });
  }

  /** Downloads the bundle; the browser has all of it when this returns. */
  async download(): Promise<Download> {
    const [download] = await Promise.all([
      this.page.waitForEvent('download'),
      this.downloadButton().click(),
    ]);
    return download;
  }
}
