import type { Locator } from 'playwright-core';
import { LayoutPage } from './layout-page';

/** A place on the canvas, in CSS pixels from its upper left corner. */
interface Place {
  readonly x: number;
  readonly y: number;
}

/** The unrolled shell, the sentence that says what a touch lays, and the woods. */
export class PatternStation extends LayoutPage {
  canvas(): Locator {
    return this.page.getByRole('application', { name: /^Pattern/ });
  }

  /** Of the canvas, in CSS pixels. */
  async size(): Promise<{ width: number; height: number }> {
    const box = await this.canvas().boundingBox();
    if (!box) throw new Error('the canvas is not on the screen');
    return box;
  }

  /** Chooses a word of the sentence: what is laid, where, how often. */
  async say(about: 'Wood' | 'Where' | 'Repeated' | 'Each step', words: string): Promise<void> {
    await this.page.getByRole('button', { name: new RegExp(`^${about}:`) }).click();
    await this.page.getByRole('menuitemradio', { name: words, exact: true }).click();
    await this.page.getByRole('menu').waitFor({ state: 'detached' });
  }

  /** Presses and lets go on a place. */
  async touch(position: Place): Promise<void> {
    await this.canvas().click({ position });
  }

  /** Presses, draws to another place in small steps and lets go. */
  async draw(from: Place, to: Place): Promise<void> {
    const box = await this.canvas().boundingBox();
    if (!box) throw new Error('the canvas is not on the screen');
    await this.page.mouse.move(box.x + from.x, box.y + from.y);
    await this.page.mouse.down();
    await this.page.mouse.move(box.x + to.x, box.y + to.y, { steps: 8 });
    await this.page.mouse.up();
  }

  /** Opens and closes the wrapped shell beside the canvas. */
  wrapButton(): Locator {
    return this.page.getByRole('button', { name: 'Wrapped', exact: true });
  }

  /** The strip of a wood with how many tiles it fills. */
  wood(name: string): Locator {
    return this.page.getByRole('list', { name: 'Woods' }).getByRole('button', { name });
  }

  /** How many tiles a wood fills, as the tray says it. */
  async tilesOf(name: string): Promise<number> {
    const words = await this.wood(name).locator('.tiles').innerText();
    return Number(/\d+/.exec(words)?.[0]);
  }
}
