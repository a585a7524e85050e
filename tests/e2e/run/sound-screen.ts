import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { accessibilityViolations } from './accessibility';
import { desktop, keepScreen, phone } from './visit';

export const tablet = { width: 1024, height: 768 } as const;

/** A window of the desktop's size read at 200 %: half as many CSS pixels, twice as fine. */
export const twiceAsLarge = { width: 720, height: 450 } as const;

/**
 * Visible elements that stick out of the window to the right or the left. What scrolls or is cut off
 * within a smaller box does not count: that box does.
 */
const ELEMENTS_OUTSIDE = `(() => {
  const held = (element) => {
    for (let box = element.parentElement; box; box = box.parentElement) {
      if (box === document.documentElement || box === document.body) return false;
      const { overflowX } = getComputedStyle(box);
      if (overflowX !== 'visible') return true;
    }
    return false;
  };
  const width = document.documentElement.clientWidth;
  const outside = [...document.body.querySelectorAll('*')].filter((element) => {
    const box = element.getBoundingClientRect();
    if (box.width === 0 || box.height === 0 || element.closest('.cdk-visually-hidden')) return false;
    return (box.right > width + 1 || box.left < -1) && !held(element) && element.checkVisibility();
  });
  const words = outside.slice(0, 5).map((element) => {
    const box = element.getBoundingClientRect();
    return element.tagName.toLowerCase() + '.' + element.getAttribute('class') + ' ' +
      Math.round(box.left) + ' to ' + Math.round(box.right) + ' of ' + width;
  });
  const { scrollWidth, clientWidth } = document.scrollingElement;
  if (scrollWidth > clientWidth) words.push('the page scrolls to ' + scrollWidth + ' of ' + clientWidth);
  return words;
})()`;

const MOTION_OVER = `document.fonts.ready.then(() => document.getAnimations().every((animation) =>
  animation.playState !== 'running' || animation.effect.getComputedTiming().endTime === Infinity))`;

/** Waits until nothing moves but what moves for ever, such as a bar of progress. */
export async function untilStill(page: Page): Promise<void> {
  await page.waitForFunction(MOTION_OVER);
}

/** Longer than a page takes to follow a window that has changed its size. */
const SETTLING_MS = 2_000;

/** What sticks out of the window sideways and stays so, one line an element; empty is good. */
export async function sidewaysOverflow(page: Page): Promise<string[]> {
  await untilStill(page);
  const began = performance.now();
  for (;;) {
    const outside = await page.evaluate<string[]>(ELEMENTS_OUTSIDE);
    if (outside.length === 0 || performance.now() - began > SETTLING_MS) return outside;
    await page.evaluate('new Promise((resolve) => requestAnimationFrame(resolve))');
  }
}

/**
 * Holds the screen as it is to what every screen keeps: on a desktop and on a phone axe-core finds nothing,
 * and nothing runs out of the window, nor on a tablet. Leaves the window at the desktop's size.
 */
export async function expectSoundScreen(page: Page, name: string): Promise<void> {
  const found: Record<string, string[]> = {};
  for (const size of [phone, tablet, desktop]) {
    await page.setViewportSize(size);
    found[`${name} at ${size.width}, out of the window`] = await sidewaysOverflow(page);
    await keepScreen(page, `${name}-${size.width}`);
    if (size === tablet) continue;
    found[`${name} at ${size.width}, axe-core`] = await accessibilityViolations(page);
  }
  expect(Object.entries(found).filter(([, lines]) => lines.length > 0)).toEqual([]);
}
