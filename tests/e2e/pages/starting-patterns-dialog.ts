import type { Page } from 'playwright-core';

/** "Start from a pattern" on the Pattern station. */
export class StartingPatternsDialog {
  constructor(private readonly page: Page) {}

  async open(kind: string): Promise<void> {
    await this.page.getByRole('button', { name: 'Start from a pattern' }).click();
    await this.choose(kind);
  }

  async choose(kind: string): Promise<void> {
    await this.self().getByText(kind, { exact: true }).click();
  }

  self() {
    return this.page.getByRole('dialog', { name: 'Start from a pattern' });
  }

  field(label: string) {
    return this.self().getByRole('textbox', { name: label });
  }

  button(name: string | RegExp) {
    return this.self().getByRole('button', { name });
  }
}
