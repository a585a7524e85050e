import { describe, expect, it } from 'vitest';
import type { Segment } from '@shared/geometry/segment';
import { pathData } from './path-data';

const line = (x1: number, y1: number, x2: number, y2: number): Segment => ({
  kind: 'line',
  from: { x: x1, y: y1 },
  to: { x: x2, y: y2 },
});
const arc = (x: number, y: number, radius: number, start: number, sweep: number): Segment => ({
  kind: 'arc',
  centre: { x, y },
  radius,
  startAngle: (start * Math.PI) / 180,
  sweep: (sweep * Math.PI) / 180,
});

describe('path data', () => {
  it('a rectangle is three lines and Z', () => {
    const segments = [line(0, 0, 4, 0), line(4, 0, 4, 2), line(4, 2, 0, 2), line(0, 2, 0, 0)];
    expect(pathData(segments)).toBe('M0 0L4 0L4 2L0 2Z');
    expect(pathData(segments, { flipY: true })).toBe('M0 0L4 0L4 -2L0 -2Z');
  });

  it('an open chain stays open', () => {
    expect(pathData([line(0, 0, 4, 0), line(4, 0, 4, 2)])).toBe('M0 0L4 0L4 2');
  });

  it('an arc turns the other way when y is flipped', () => {
    const quarter = [arc(0, 0, 2, 0, 90)];
    expect(pathData(quarter)).toBe('M2 0A2 2 0 0 1 0 2');
    expect(pathData(quarter, { flipY: true })).toBe('M2 0A2 2 0 0 0 0 -2');
    expect(pathData([arc(0, 0, 2, 90, -90)])).toBe('M0 2A2 2 0 0 0 2 0');
  });

  it('an arc past half a turn carries the large flag', () => {
    expect(pathData([arc(0, 0, 2, 0, 270)])).toBe('M2 0A2 2 0 1 1 0 -2');
    expect(pathData([arc(0, 0, 2, 0, 180)])).toBe('M2 0A2 2 0 0 1 -2 0');
  });

  it('a full circle is drawn in two arcs', () => {
    expect(pathData([arc(0, 0, 2, 0, 360)])).toBe('M2 0A2 2 0 0 1 -2 0A2 2 0 0 1 2 0Z');
  });

  it('arcs of radius 0 and lines of no length leave nothing', () => {
    const segments = [line(0, 0, 4, 0), arc(4, 0, 0, 0, 90), line(4, 0, 4, 1e-9), line(4, 0, 4, 2)];
    expect(pathData(segments)).toBe('M0 0L4 0L4 2');
    expect(pathData([arc(4, 0, 0, 0, 90)])).toBe('');
    expect(pathData([])).toBe('');
  });

  it('a closing arc ends on the very text it started with', () => {
    const third = 1 / 3;
    const segments = [line(third, 0, 4, 0), arc((third + 4) / 2, 0, (4 - third) / 2, 0, 180)];
    expect(pathData(segments)).toBe('M0.333333 0L4 0A1.833333 1.833333 0 0 1 0.333333 0Z');
  });
});
