import { describe, expect, it } from 'vitest';
import { leastGap, nearestPoint } from './distance';
import { arc, line } from './shapes.fixture';

describe('the least gap of two chains', () => {
  it('lies between the ends of lines that do not face each other', () => {
    const gap = leastGap([line(0, 0, 1, 0)], [line(4, 4, 4, 9)]);
    expect(gap).toEqual({ distance: 5, from: { x: 1, y: 0 }, to: { x: 4, y: 4 } });
  });

  it('lies square to a line under the end of another', () => {
    const gap = leastGap([line(0, 0, 9, 0)], [line(4, 3, 5, 8)]);
    expect(gap).toEqual({ distance: 3, from: { x: 4, y: 0 }, to: { x: 4, y: 3 } });
  });

  it('lies on the line of centres of two arcs that face each other', () => {
    const gap = leastGap([arc(0, 0, 2, -45, 90)], [arc(10, 0, 3, 135, 90)]);
    expect(gap.distance).toBeCloseTo(5, 12);
    expect(gap.from.x).toBeCloseTo(2, 12);
  });

  it('lies between the ends of arcs that turn their backs', () => {
    const gap = leastGap([arc(0, 0, 2, 90, 180)], [arc(10, 0, 2, -90, 180)]);
    expect(gap.distance).toBeCloseTo(10, 12);
  });

  it('lies square to a line over the top of an arc', () => {
    expect(leastGap([arc(0, 0, 2, 0, 180)], [line(-5, 3, 5, 3)]).distance).toBeCloseTo(1, 12);
  });

  it('is measured from inside to a circle around', () => {
    expect(leastGap([arc(1, 0, 2, 0, 360)], [arc(0, 0, 5, 0, 360)]).distance).toBeCloseTo(2, 12);
  });

  it('is nothing where they cross, and endless where one is empty', () => {
    expect(leastGap([line(0, 0, 4, 4)], [line(0, 4, 4, 0)]).distance).toBe(0);
    expect(leastGap([line(0, 0, 4, 4)], []).distance).toBe(Infinity);
  });
});

describe('the point nearest to a point', () => {
  it('lies on an arc towards it, or at the end of the arc', () => {
    const quarter = arc(0, 0, 2, 0, 90);
    const facing = nearestPoint(quarter, { x: 3, y: 3 });
    expect(facing.x).toBeCloseTo(Math.SQRT2, 12);
    expect(nearestPoint(quarter, { x: 3, y: -3 })).toEqual({ x: 2, y: 0 });
  });

  it('is the end of a line with no length', () => {
    expect(nearestPoint(line(1, 1, 1, 1), { x: 4, y: 5 })).toEqual({ x: 1, y: 1 });
  });
});
