import type { Locator, Page } from 'playwright-core';

/** The cells of the open layout as the server has them, base64; null when it does not answer. */
export function cellsOf(page: Page): Promise<string | null> {
  return page.evaluate<string | null>(`(async () => {
    const read = async (path) => {
      const answer = await fetch('/api' + path).catch(() => null);
      return answer?.ok ? answer.json() : null;
    };
    const commission = await read('/commissions/' + location.pathname.split('/')[2]);
    const open = commission && (await read('/layouts/' + commission.layoutId));
    return open ? open.layout.cells : null;
  })()`);
}

/** The Shell station's field for the finished height. */
export function sizeField(page: Page): Locator {
  return page.getByRole('textbox', { name: /finished height|^height/i });
}
