import { expect, it } from 'vitest';
import { placePoint, placeSegment } from './placement';
import { bulgeOf, endOf, startOf } from './segment';
import { arc, line } from './shapes.fixture';

const origin = { x: 0, y: 0 };
const mirrored = { origin, xAxis: { x: -1, y: 0 }, yAxis: { x: 0, y: 1 } };
const halfTurned = { origin, xAxis: { x: -1, y: 0 }, yAxis: { x: 0, y: -1 } };
const quarterTurned = { origin: { x: 10, y: 0 }, xAxis: { x: 0, y: 1 }, yAxis: { x: -1, y: 0 } };

it('a point is turned and moved', () => {
  expect(placePoint(quarterTurned, { x: 2, y: 1 })).toEqual({ x: 9, y: 2 });
});

it('an arc placed by a turn runs the same way, by a mirror the other way', () => {
  const segment = arc(1, 2, 3, 20, 70);
  for (const placement of [quarterTurned, halfTurned, mirrored]) {
    const placed = placeSegment(placement, segment);
    const [start, end] = [startOf(placed), endOf(placed)];
    const [from, to] = [startOf(segment), endOf(segment)].map((p) => placePoint(placement, p));
    expect(Math.hypot(start.x - from!.x, start.y - from!.y)).toBeLessThan(1e-12);
    expect(Math.hypot(end.x - to!.x, end.y - to!.y)).toBeLessThan(1e-12);
    expect(Math.sign(bulgeOf(placed))).toBe(placement === mirrored ? -1 : 1);
  }
});

it('a bulge is the tangent of a quarter of the angle, negative when clockwise', () => {
  expect(bulgeOf(arc(0, 0, 5, 0, 180))).toBeCloseTo(1, 12);
  expect(bulgeOf(arc(0, 0, 5, 0, -90))).toBeCloseTo(-0.414213562, 9);
  expect(bulgeOf(line(0, 0, 1, 0))).toBe(0);
});
