import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { insideTest } from './contains';
import type { Segment } from './segment';

const circle = (x: number, y: number, radius: number): Segment[] => [
  { kind: 'arc', centre: { x, y }, radius, startAngle: 0.3, sweep: 2 * Math.PI },
];

const rectangle = (width: number, height: number): Segment[] => {
  const corners = [
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: height },
    { x: 0, y: height },
  ];
  return corners.map((from, i) => ({
    kind: 'line',
    from,
    to: corners[(i + 1) % 4] ?? from,
  }));
};

describe('which side of a closed chain a point lies on', () => {
  it('agrees with the distance from the centre for a whole circle', () => {
    const inside = insideTest(circle(3, -2, 5));
    const far = fc.double({ min: -8, max: 8, noNaN: true });
    fc.assert(
      fc.property(far, far, (dx, dy) => {
        const distance = Math.hypot(dx, dy);
        fc.pre(Math.abs(distance - 5) > 1e-9);
        return inside({ x: 3 + dx, y: -2 + dy }) === distance < 5;
      }),
    );
  });

  it('counts a ray through a corner once', () => {
    const inside = insideTest(rectangle(4, 2));
    expect(inside({ x: 1, y: 0 })).toBe(true);
    expect(inside({ x: -1, y: 0 })).toBe(false);
    expect(inside({ x: -1, y: 2 })).toBe(false);
    expect(inside({ x: 1, y: 1 })).toBe(true);
    expect(inside({ x: 5, y: 1 })).toBe(false);
  });

  it('follows a clockwise arc as well as a counter-clockwise one', () => {
    const halfDisc: Segment[] = [
      { kind: 'arc', centre: { x: 0, y: 0 }, radius: 2, startAngle: Math.PI, sweep: -Math.PI },
      { kind: 'line', from: { x: 2, y: 0 }, to: { x: -2, y: 0 } },
    ];
    const inside = insideTest(halfDisc);
    expect(inside({ x: 0, y: 1.99 })).toBe(true);
    expect(inside({ x: 0, y: 2.01 })).toBe(false);
    expect(inside({ x: 0, y: -0.01 })).toBe(false);
    expect(inside({ x: -1.5, y: 1 })).toBe(true);
    expect(inside({ x: -1.9, y: 1 })).toBe(false);
  });
});
