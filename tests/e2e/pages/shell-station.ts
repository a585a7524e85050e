import type { Locator } from 'playwright-core';
import { LayoutPage } from './layout-page';

/** A shell as it is typed, in millimetres. */
export interface TypedShell {
  readonly 'Staves round': number;
  readonly 'Courses high': number;
  readonly 'Tile width': number;
  readonly 'Tile height': number;
  readonly 'Turned outside to': number;
  readonly 'Bored to': number;
  readonly 'Finished height': number;
  readonly Board: number;
}

/** Sizes of the shell, with the ring drawn beside them. */
export class ShellStation extends LayoutPage {
  field(label: keyof TypedShell): Locator {
    return this.page.getByLabel(label, { exact: true });
  }

  /** Types every size, leaving each field as someone would with Tab. */
  async enter(shell: TypedShell): Promise<void> {
    for (const label of Object.keys(shell) as (keyof TypedShell)[]) {
      await this.field(label).fill(String(shell[label]));
      await this.field(label).press('Tab');
    }
  }

  /** What the drawing of the ring says to someone who cannot see it. */
  drawings(): Locator {
    return this.page.getByLabel('Drawings of the shell');
  }

  findings(): Locator {
    return this.page.getByLabel('What was found about this ring');
  }
}
