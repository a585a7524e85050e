import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  middleOfView,
  panned,
  scaleOfWhole,
  showing,
  toPattern,
  toScreen,
  turnedTo,
  turnsInView,
  viewFromSeam,
  viewOfWhole,
  zoomedAt,
  type ViewBounds,
} from './viewport';

const bounds: ViewBounds = {
  size: { width: 1150, height: 560 },
  sheet: { circumference: 896, height: 252 },
  insets: { top: 40, right: 20, bottom: 40, left: 60 },
  leastPxPerMm: 0.8,
  mostPxPerMm: 8,
};

describe('the view of the unrolled shell', () => {
  it('shows the whole shell between its insets', () => {
    const view = viewOfWhole(bounds);
    const bottomLeft = toScreen(view, { x: 0, y: 0 });
    const topRight = toScreen(view, { x: 896, y: 252 });
    expect(view.pxPerMm).toBeCloseTo(scaleOfWhole(bounds.size, bounds.sheet, bounds.insets));
    expect(bottomLeft.x).toBeCloseTo(60);
    expect(topRight.x).toBeCloseTo(1130);
    expect(topRight.y).toBeGreaterThanOrEqual(40);
    expect(bottomLeft.y).toBeLessThanOrEqual(520);
  });

  it('starts with the seam at the left inset', () => {
    const view = viewFromSeam(bounds, 1.7);
    expect(toScreen(view, { x: 0, y: 0 }).x).toBeCloseTo(60);
  });

  it('brings in again what has passed the seam', () => {
    const start = viewFromSeam(bounds, 1.7);
    const once = panned(start, bounds, -896 * 1.7, 0);
    expect(once.leftMm).toBeCloseTo(start.leftMm);
    const nine = panned(start, bounds, 9 * 896 * 1.7, 0);
    expect(nine.leftMm).toBeCloseTo(start.leftMm);
  });

  it('keeps the middle on turn 0 and the shell in the window whatever is done', () => {
    const move = fc.record({
      dx: fc.double({ min: -5000, max: 5000, noNaN: true }),
      dy: fc.double({ min: -5000, max: 5000, noNaN: true }),
      factor: fc.double({ min: 0.2, max: 5, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(move, { maxLength: 20 }), (moves) => {
        let view = viewOfWhole(bounds);
        for (const { dx, dy, factor } of moves) {
          view = zoomedAt(panned(view, bounds, dx, dy), bounds, { x: 300, y: 200 }, factor);
        }
        const middle = middleOfView(view, bounds.size);
        const top = toScreen(view, { x: 0, y: 252 }).y;
        const bottom = toScreen(view, { x: 0, y: 0 }).y;
        expect(middle).toBeGreaterThanOrEqual(-1e-9);
        expect(middle).toBeLessThan(896 + 1e-9);
        expect(top).toBeLessThanOrEqual(520);
        expect(bottom).toBeGreaterThanOrEqual(40);
      }),
    );
  });

  it('zooms about the point under the pointer', () => {
    const view = viewFromSeam(bounds, 1.7);
    const about = { x: 700, y: 300 };
    const before = toPattern(view, about);
    const after = toPattern(zoomedAt(view, bounds, about, 2), about);
    expect(after.x).toBeCloseTo(before.x);
    expect(after.y).toBeCloseTo(before.y);
  });

  it('names the turns in the window, the far side included', () => {
    expect(turnsInView(viewFromSeam(bounds, 1.7), bounds.size, bounds.sheet)).toEqual([-1, 0]);
    expect(turnsInView(viewOfWhole(bounds), bounds.size, bounds.sheet)).toEqual([-1, 0, 1]);
  });

  it('turns the shell to a place', () => {
    const view = turnedTo(viewFromSeam(bounds, 1.7), bounds, 448);
    expect(middleOfView(view, bounds.size)).toBeCloseTo(448);
  });

  it('moves no more than it must to show a tile, the short way round', () => {
    const view = viewFromSeam(bounds, 3);
    const tile = { x: 868, y: 0, width: 28, height: 28 };
    const shown = showing(view, bounds, tile);
    expect(toScreen(shown, { x: -28, y: 0 }).x).toBeCloseTo(60);
    expect(showing(shown, bounds, tile)).toEqual(shown);
  });
});
