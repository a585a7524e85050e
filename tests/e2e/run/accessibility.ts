import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

/** What a button or a message looks like halfway through its change is not what people read. */
const SETTLING_MS = 700;
const LOOKS_MOST = 3;

/**
 * What axe-core finds wrong on the page and still finds after its changes of colour and its messages have
 * settled, one line an element: rule, element, what to mend. An empty list is a page without violations.
 */
export async function accessibilityViolations(page: Page): Promise<string[]> {
  for (let look = 1; ; look++) {
    const found = await violationsNow(page);
    if (found.length === 0 || look === LOOKS_MOST) return found;
    await page.waitForTimeout(SETTLING_MS);
  }
}

async function violationsNow(page: Page): Promise<string[]> {
  const results = await page.evaluate<AxeResults>(
    "axe.run(document, { resultTypes: ['violations'] })",
  );
  return results.violations.flatMap(({ id, nodes }) =>
    nodes.map((node) => `${id}: ${node.target.join(' ')}: ${node.failureSummary ?? ''}`),
  );
}
