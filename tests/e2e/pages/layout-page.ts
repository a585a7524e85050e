import type { Locator, Page } from 'playwright-core';

export const STATIONS = ['Shell', 'Joint', 'Pattern', 'Cutting', 'Review'] as const;
export type StationName = (typeof STATIONS)[number];

/** What stands around every station of an open layout. */
export class LayoutPage {
  constructor(readonly page: Page) {}

  /** Opens a layout by the address of one of its stations. */
  async open(address: string): Promise<void> {
    await this.page.goto(address);
    await this.pill().waitFor();
  }

  /** Goes to a station and waits until it is there. */
  async goTo(station: StationName): Promise<void> {
    await this.station(station).click();
    await this.page.waitForURL(new RegExp(`/${station.toLowerCase()}$`));
    await this.page.getByRole('heading', { level: 1 }).waitFor({ state: 'attached' });
  }

  /** The way to a station; its text begins with what its lamp says. */
  station(station: StationName): Locator {
    const stations = this.page.getByRole('navigation', { name: 'Stations' });
    return stations.getByRole('link', { name: station });
  }

  /** Where the draft stands: "all saved", "not saved", … */
  pill(): Locator {
    return this.page.locator('sl-save-pill').getByRole('status');
  }

  /** Waits until the server has everything. */
  async saved(): Promise<void> {
    await this.pill().getByText('all saved').waitFor();
  }

  /** The strip that says that saving does not work, or that an edit was taken back. */
  trouble(): Locator {
    return this.page.locator('sl-save-trouble').getByRole('alert');
  }

  undoButton(): Locator {
    return this.page.getByRole('button', { name: 'Undo', exact: true });
  }

  redoButton(): Locator {
    return this.page.getByRole('button', { name: 'Redo', exact: true });
  }

  /** Asks for the layout as a file. */
  async downloadFile(): Promise<void> {
    await this.page.getByRole('button', { name: 'Layout', exact: true }).click();
    await this.page.getByRole('menuitem', { name: 'Download the layout file' }).click();
  }

  /** Opens the dialog that keeps a version. */
  async startKeeping(): Promise<Locator> {
    await this.page.getByRole('button', { name: /^Keep as version/ }).click();
    const dialog = this.page.getByRole('dialog', { name: /^Keep as version/ });
    await dialog.waitFor();
    return dialog;
  }

  /** Keeps the draft as the next version with a note. */
  async keep(note: string): Promise<void> {
    const dialog = await this.startKeeping();
    await dialog.getByLabel('What is new in it').fill(note);
    await dialog.getByRole('button', { name: /^Keep version/ }).click();
    await dialog.waitFor({ state: 'detached' });
  }
}
