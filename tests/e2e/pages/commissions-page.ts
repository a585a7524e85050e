import type { Locator, Page } from 'playwright-core';

/** The commissions of a workshop, and the dialog that makes a new one. */
export class CommissionsPage {
  constructor(private readonly page: Page) {}

  /** Opens it and waits until the commissions are there. */
  async open(): Promise<void> {
    await this.page.goto('/commissions');
    await this.table().waitFor();
  }

  table(): Locator {
    return this.page.getByRole('table', { name: 'Commissions' });
  }

  row(title: string): Locator {
    return this.table().getByRole('row').filter({ hasText: title });
  }

  /** Goes into a commission, as far as its first station. */
  async enter(title: string): Promise<void> {
    await this.table().getByRole('link', { name: title, exact: true }).click();
    await this.page.getByRole('heading', { name: 'The shell' }).waitFor();
  }

  /** Opens the dialog for a new commission. */
  async startNew(): Promise<NewCommissionDialog> {
    await this.page.getByRole('button', { name: 'New commission' }).click();
    const dialog = new NewCommissionDialog(this.page);
    await dialog.title().waitFor();
    return dialog;
  }
}

export class NewCommissionDialog {
  readonly dialog: Locator;

  constructor(private readonly page: Page) {
    this.dialog = page.getByRole('dialog', { name: 'New commission' });
  }

  title(): Locator {
    return this.dialog.getByLabel('Title');
  }

  client(): Locator {
    return this.dialog.getByLabel('Client');
  }

  /** Chooses to start from a layout file. */
  async startFromFile(): Promise<void> {
    await this.dialog.getByText('A layout file').click();
  }

  /** Gives it a file from the disk. */
  async giveFile(path: string): Promise<void> {
    await this.dialog.locator('input[type=file]').setInputFiles(path);
  }

  /** What it says is wrong. */
  problems(): Locator {
    return this.dialog.getByRole('alert');
  }

  /** Makes the commission and waits for the layout behind it. */
  async make(): Promise<void> {
    await this.dialog.getByRole('button', { name: 'Make the commission' }).click();
    await this.page.getByRole('heading', { name: 'The shell' }).waitFor();
  }
}
