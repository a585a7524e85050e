import { describe, expect, it } from 'vitest';
import { intersections, liesOn, withinSweep } from './intersect';
import { arc, line } from './shapes.fixture';

describe('where segments meet', () => {
  it('two lines cross in one point', () => {
    expect(intersections(line(0, 0, 4, 4), line(0, 4, 4, 0))).toEqual([{ x: 2, y: 2 }]);
  });

  it('lines whose supports meet beyond their ends do not meet', () => {
    expect(intersections(line(0, 0, 1, 1), line(0, 4, 1.9, 2.1))).toEqual([]);
  });

  it('parallel lines never meet, and lines on each other share the ends of the overlap', () => {
    expect(intersections(line(0, 0, 4, 0), line(0, 1, 4, 1))).toEqual([]);
    expect(intersections(line(0, 0, 4, 0), line(3, 0, 9, 0))).toEqual([
      { x: 4, y: 0 },
      { x: 3, y: 0 },
    ]);
  });

  it('a line crosses an arc where the arc is, not where the rest of its circle is', () => {
    const right = arc(0, 0, 5, -90, 180);
    const points = intersections(line(-9, 3, 9, 3), right);
    expect(points).toHaveLength(1);
    expect(points[0]?.x).toBeCloseTo(4, 12);
  });

  it('a line touches a circle in one point, and misses it a thousandth further out', () => {
    const circle = arc(0, 0, 5, 0, 360);
    expect(intersections(line(-9, 5, 9, 5), circle)).toEqual([{ x: 0, y: 5 }]);
    expect(intersections(line(-9, 5.001, 9, 5.001), circle)).toEqual([]);
  });

  it('two circles of radius 5, 6 apart, meet 3 from both centres and 4 off the line', () => {
    const points = intersections(arc(0, 0, 5, 0, 360), arc(6, 0, 5, 0, 360));
    expect(points.map(({ x, y }) => [x, Math.abs(y)])).toEqual([
      [3, 4],
      [3, 4],
    ]);
  });

  it('circles inside each other do not meet', () => {
    expect(intersections(arc(0, 0, 5, 0, 360), arc(1, 0, 2, 0, 360))).toEqual([]);
    expect(intersections(arc(0, 0, 5, 0, 360), arc(0, 0, 2, 0, 360))).toEqual([]);
  });

  it('arcs of one circle share the ends where they overlap', () => {
    const points = intersections(arc(0, 0, 2, 0, 90), arc(0, 0, 2, 45, 90));
    expect(points).toHaveLength(2);
  });
});

describe('points on segments', () => {
  it('a line has its ends and what lies between, nothing beyond', () => {
    const segment = line(0, 0, 4, 0);
    expect(liesOn(segment, { x: 0, y: 0 })).toBe(true);
    expect(liesOn(segment, { x: 2, y: 1e-7 })).toBe(true);
    expect(liesOn(segment, { x: 2, y: 1e-5 })).toBe(false);
    expect(liesOn(segment, { x: 4.1, y: 0 })).toBe(false);
  });

  it('a clockwise arc sweeps the other way', () => {
    const clockwise = arc(0, 0, 2, 90, -90);
    expect(withinSweep(clockwise, { x: 1, y: 1 })).toBe(true);
    expect(withinSweep(clockwise, { x: -1, y: 1 })).toBe(false);
    expect(liesOn(clockwise, { x: 2, y: 0 })).toBe(true);
  });
});
