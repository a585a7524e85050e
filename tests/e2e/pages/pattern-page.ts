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

  /** Takes a wood of the tray into the hand by its number and lays it where the keyboard stands. */
  async layAt(place: TilePlace, woodNumber: number): Promise<void> {
    await this.standOn(place);
    await this.page.keyboard.press(String(woodNumber));
    await this.page.keyboard.press(' ');
  }

  /** Walks the keyboard to a tile, named as it is spoken: "D 12". */
  async standOn({ course, stave }: TilePlace): Promise<void> {
    await this.surface().focus();
    const spoken = this.page.locator('.cdk-live-announcer-element');
    const here = async (): Promise<TilePlace | null> => {
      const words = /^([A-Z]) (\d+)/.exec((await spoken.textContent()) ?? '');
      return words?.[1] && words[2] ? { course: words[1], stave: Number(words[2]) } : null;
    };
    for (let steps = 0; steps < 60; steps++) {
      const at = await here();
      if (at?.course === course && at.stave === stave) return;
      await this.page.keyboard.press(wayTo({ course, stave }, at));
      await this.page.waitForTimeout(150);
    }
    throw new Error(`The keyboard does not come to ${course} ${stave}`);
  }

  /** What the words of the bar say about saving. */
  saving() {
    return this.page.locator('sl-save-pill .word');
  }

  /** Pixels of the canvas that have exactly a colour, "#b26a00". */
  pixelsOf(colour: string): Promise<number> {
    return this.page.evaluate<number>(`(() => {
      const wished = [1, 3, 5].map((at) => parseInt('${colour}'.slice(at, at + 2), 16));
      let count = 0;
      for (const canvas of document.querySelectorAll('sl-pattern-canvas canvas')) {
        const { data } = canvas.getContext('2d').getImageData(0, 0, canvas.width, canvas.height);
        for (let i = 0; i < data.length; i += 4) {
          if (data[i + 3] === 255 && wished.every((part, c) => data[i + c] === part)) count++;
        }
      }
      return count;
    })()`);
  }
}

/** A tile by course letter and stave number. */
export interface TilePlace {
  readonly course: string;
  readonly stave: number;
}

function wayTo(to: TilePlace, at: TilePlace | null): string {
  if (!at) return 'ArrowUp';
  if (at.course !== to.course) return at.course < to.course ? 'ArrowUp' : 'ArrowDown';
  return at.stave < to.stave ? 'ArrowRight' : 'ArrowLeft';
}
