import { describe, expect, it } from 'vitest';
import { arc, line, notchedSquare, roundedRectangle, square } from '../geometry/shapes.fixture';
import { centrePath, cutterFit, tightestInside } from './cutter-fit';

describe('a square with a semicircular notch of radius 3', () => {
  it('takes a cutter of exactly 6 mm and no larger one', () => {
    expect(cutterFit(notchedSquare, 6).fits).toBe(true);
    expect(cutterFit(notchedSquare, 6.001).fits).toBe(false);
    const fit = cutterFit(notchedSquare, 2);
    expect(fit.tightest).toMatchObject({ radius: 3, at: { y: 7 }, segment: 3 });
    expect(fit.largestCutter).toBeCloseTo(6, 9);
    expect(fit.limitedBy).toBe('inside-radius');
  });
});

it('the largest cutter is rounded down to 0.001 mm, never up', () => {
  // found by a random layout whose tip radius allows 0.015948 mm
  const pinched = {
    segments: [
      line(-1, -1, 1, -1),
      line(1, -1, 1, 1),
      line(1, 1, 0.007974, 1),
      arc(0, 1, 0.007974, 0, -180),
      line(-0.007974, 1, -1, 1),
      line(-1, 1, -1, -1),
    ],
  };
  expect(cutterFit(pinched, 1).largestCutter).toBeCloseTo(0.015, 12);
});

it('an outline without inside corners takes any cutter', () => {
  for (const outline of [square, roundedRectangle]) {
    expect(tightestInside(outline)).toBeNull();
    expect(cutterFit(outline, 25)).toMatchObject({
      fits: true,
      largestCutter: Infinity,
      limitedBy: 'nothing',
    });
  }
});

describe('a round hollow of radius 4 behind a mouth 5 mm wide', () => {
  const half = 2.5;
  const lean = (Math.asin(half / 4) * 180) / Math.PI;
  const depth = Math.sqrt(16 - half ** 2);
  const hollow = {
    segments: [
      line(-9, -12, 9, -12),
      line(9, -12, 9, 0),
      line(9, 0, half, 0),
      arc(0, -depth, 4, 90 - lean, -(360 - 2 * lean)),
      line(-half, 0, -9, 0),
      line(-9, 0, -9, -12),
    ],
  };

  it('is limited by its mouth', () => {
    const fit = cutterFit(hollow, 5.5);
    expect(fit.fits).toBe(false);
    expect(fit.crossingAt).not.toBeNull();
    expect(fit.limitedBy).toBe('reach-in');
    expect(fit.largestCutter).toBeCloseTo(5, 3);
    expect(cutterFit(hollow, 5).fits).toBe(true);
  });

  it('tells of the mouth to a cutter that is too large for the hollow too', () => {
    expect(cutterFit(hollow, 9).crossingAt).not.toBeNull();
  });
});

it('a sharp inside corner fits no cutter', () => {
  const ell = {
    segments: [
      line(0, 0, 9, 0),
      line(9, 0, 9, 4),
      line(9, 4, 4, 4),
      line(4, 4, 4, 9),
      line(4, 9, 0, 9),
      line(0, 9, 0, 0),
    ],
  };
  expect(cutterFit(ell, 0.5)).toMatchObject({
    fits: false,
    largestCutter: 0,
    tightest: { radius: 0, at: { x: 4, y: 4 } },
  });
});

it('a sharp corner of radius 0 turns round an inside arc of the cutter only with a fillet', () => {
  const sharp = { segments: [line(0, 0, 9, 0), arc(9, 0, 0, 180, -90), line(9, 0, 9, 9)] };
  expect(tightestInside(sharp)?.radius).toBe(0);
});

it('the centre path runs half a diameter outside', () => {
  const path = centrePath(roundedRectangle, 3);
  const first = path.ok ? path.outline.segments[0] : undefined;
  expect(first).toEqual(line(-8, -6.5, 8, -6.5));
});
