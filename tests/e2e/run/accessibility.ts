import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';

/**
 * What axe-core finds wrong on the page as it is now, one line an element: rule, element, what to mend.
 * An empty list is a page without violations.
 */
export async function accessibilityViolations(page: Page): Promise<string[]> {
  const results = await page.evaluate<AxeResults>(
    "axe.run(document, { resultTypes: ['violations'] })",
  );
  return results.violations.flatMap(({ id, nodes }) =>
    nodes.map((node) => `${id}: ${node.target.join(' ')}: ${node.failureSummary ?? ''}`),
  );
}
