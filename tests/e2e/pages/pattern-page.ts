import type { Page } from 'playwright-core';

/** The Pattern station of an open layout. */
export class PatternPage {
  constructor(private readonly page: Page) {}

  /** Opens it from the list of commissions and waits for the shell. */
  async openCommission(title: string): Promise<void> {
    await this.page.goto('/commissions');
    await this.page.getByRole('link', { name: title }).first().click();
    await this.page.waitForURL(/\/layout/);
    await this.page.goto(this.page.url().replace(/\/layout.*/, '/layout/pattern'));
    await this.surface().waitFor();
    await this.page.locator('sl-ring-view svg').waitFor();
  }

  surface() {
    return this.page.getByRole('application', { name: /^Pattern, / });
  }

  /** What the tray says a wood fills: "95 tiles". */
  async tilesOf(wood: string): Promise<string> {
    const strip = this.page.locator('sl-wood-tray li', { hasText: wood }).locator('.tiles');
    return (await strip.textContent()) ?? '';
  }

  /** A stroke between two points, as shares of the canvas. */
  async stroke(
    from: { readonly x: number; readonly y: number },
    to: { readonly x: number; readonly y: number },
  ): Promise<void> {
    await this.press(from);
    await this.moveTo(to);
    await this.page.mouse.up();
  }

  async press(at: { readonly x: number; readonly y: number }): Promise<void> {
    await this.moveTo(at);
    await this.page.mouse.down();
  }

  async moveTo(at: { readonly x: number; readonly y: number }): Promise<void> {
    const box = await this.surface().boundingBox();
    if (!box) throw new Error('The canvas is not on the page');
    await this.page.mouse.move(box.x + at.x * box.width, box.y + at.y * box.height, { steps: 3 });
  }
}
