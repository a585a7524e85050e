import type { Locator } from 'playwright-core';
import { LayoutPage } from './layout-page';

export type JointLabel =
  'Cutter' | 'Flute length' | 'Head radius' | 'Neck fillet radius' | 'Tab reach';

/** Profile, cutter and clearance, with what was found about them. */
export class JointStation extends LayoutPage {
  field(label: JointLabel): Locator {
    return this.page.getByLabel(label, { exact: true });
  }

  /** Types a length. */
  async enter(label: JointLabel, length: number): Promise<void> {
    await this.field(label).fill(String(length));
  }

  /** One thing found, by its words; its text begins with what its lamp says. */
  finding(words: string | RegExp): Locator {
    const found = this.page.getByLabel('What was found about this joint');
    return found.getByRole('listitem').filter({ hasText: words });
  }
}
