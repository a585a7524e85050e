import { expect, it } from 'vitest';
import { areaOf } from './outline';
import { HALF_TURNED, MIRRORED, placeChain, placePoint, placeSegment, reversed } from './placement';
import { bulgeOf, endOf, startOf } from './segment';
import { arc, line, notchedSquare } from './shapes.fixture';

const quarterTurned = { origin: { x: 10, y: 0 }, xAxis: { x: 0, y: 1 }, yAxis: { x: -1, y: 0 } };

it('a point is turned and moved', () => {
  expect(placePoint(quarterTurned, { x: 2, y: 1 })).toEqual({ x: 9, y: 2 });
});

it('an arc placed by a turn runs the same way, by a mirror the other way', () => {
  const segment = arc(1, 2, 3, 20, 70);
  for (const placement of [quarterTurned, HALF_TURNED, MIRRORED]) {
    const placed = placeSegment(placement, segment);
    const [start, end] = [startOf(placed), endOf(placed)];
    const [from, to] = [startOf(segment), endOf(segment)].map((p) => placePoint(placement, p));
    expect(Math.hypot(start.x - from!.x, start.y - from!.y)).toBeLessThan(1e-12);
    expect(Math.hypot(end.x - to!.x, end.y - to!.y)).toBeLessThan(1e-12);
    expect(Math.sign(bulgeOf(placed))).toBe(placement === MIRRORED ? -1 : 1);
  }
});

it('a mirrored outline is still counter-clockwise and closed', () => {
  const mirrored = placeChain(MIRRORED, notchedSquare.segments);
  expect(areaOf({ segments: mirrored })).toBeCloseTo(areaOf(notchedSquare), 12);
  mirrored.forEach((segment, i) => {
    const next = startOf(mirrored[(i + 1) % mirrored.length]!);
    expect(Math.hypot(endOf(segment).x - next.x, endOf(segment).y - next.y)).toBeLessThan(1e-12);
  });
});

it('a segment run backwards starts where it ended', () => {
  for (const segment of [line(1, 2, 3, 4), arc(0, 0, 2, 30, -80)]) {
    expect(startOf(reversed(segment))).toEqual(endOf(segment));
    expect(reversed(reversed(segment))).toEqual(segment);
  }
});

it('a bulge is the tangent of a quarter of the angle, negative when clockwise', () => {
  expect(bulgeOf(arc(0, 0, 5, 0, 180))).toBeCloseTo(1, 12);
  expect(bulgeOf(arc(0, 0, 5, 0, -90))).toBeCloseTo(-0.414213562, 9);
  expect(bulgeOf(line(0, 0, 1, 0))).toBe(0);
});
