import { describe, expect, it } from 'vitest';
import { SheetWindow } from './sheet-window';
import type { Viewport } from './viewport';

const sheetOf = (staves: number, courses: number) => ({
  grid: { staves, courses },
  size: { circumference: staves * 28, height: courses * 28 },
  tileWidth: 28,
  tileHeight: 28,
});
const size = { width: 1150, height: 600 };

function windowOn(staves: number, courses: number) {
  const views: Viewport[] = [];
  const sheetWindow = new SheetWindow((view) => views.push(view));
  sheetWindow.fit(sheetOf(staves, courses), size);
  return { sheetWindow, last: () => views[views.length - 1] };
}

describe('the window over the sheet', () => {
  it('opens a small shell with comfortable tiles at the seam', () => {
    const { last } = windowOn(32, 9);
    expect((last()?.pxPerMm ?? 0) * 28).toBeCloseTo(52);
    expect((last()?.leftMm ?? 0) * (last()?.pxPerMm ?? 0)).toBeCloseTo(-44);
  });

  it('opens a large shell as a whole', () => {
    const { last } = windowOn(200, 100);
    expect((last()?.pxPerMm ?? 0) * 28 * 100).toBeCloseTo(600 - 40 - 44);
  });

  it('stays where it was when only the joint of the shell changes', () => {
    const { sheetWindow, last } = windowOn(32, 9);
    sheetWindow.zoom(1.5);
    sheetWindow.pan(-200, 10);
    const before = last();
    sheetWindow.fit(sheetOf(32, 9), size);
    expect(last()).toEqual(before);
  });

  it('begins anew when the shell has another size', () => {
    const { sheetWindow, last } = windowOn(32, 9);
    sheetWindow.zoom(2);
    sheetWindow.fit(sheetOf(28, 8), size);
    expect((last()?.pxPerMm ?? 0) * 28).toBeCloseTo(52);
  });

  it('finds the tile in its middle after turning there', () => {
    const { sheetWindow } = windowOn(32, 9);
    sheetWindow.turnTo(20.5);
    expect(sheetWindow.tileInMiddle()).toEqual({ stave: 20, course: 4 });
  });
});
