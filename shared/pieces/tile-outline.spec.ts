import { describe, expect, it } from 'vitest';
import { areaOf, boundsOf } from '../geometry/outline';
import { endOf, startOf } from '../geometry/segment';
import { smallLayout } from '../layout/small-layout.fixture';
import { nominalTileOutline, tileOutline } from './tile-outline';
import { tileEdges } from './tile-edges';

const layout = smallLayout();
const grid = { staves: 8, courses: 4 };
const even = tileEdges('alternating', grid, 0, 2);
const odd = tileEdges('alternating', grid, 1, 2);

describe('a middle tile with alternating tabs', () => {
  it('stands out by the reach where it has tabs, and by nothing where it has sockets', () => {
    const box = boundsOf(nominalTileOutline(layout, even).segments);
    expect(box.maxX).toBeCloseTo(14 + 7.6, 9);
    expect(box.minX).toBeCloseTo(-14 - 7.6, 9);
    expect(box.maxY).toBeCloseTo(14, 9);
  });

  it('has, with its neighbour, twice the area of the grid before clearance', () => {
    const both = areaOf(nominalTileOutline(layout, even)) + areaOf(nominalTileOutline(layout, odd));
    expect(both).toBeCloseTo(2 * 28 * 28, 9);
  });

  it('stands back by half the clearance on all sides after it', () => {
    const box = boundsOf(tileOutline(layout, odd).segments);
    expect(box.maxX).toBeCloseTo(14 - 0.06, 9);
    expect(box.maxY).toBeCloseTo(14 + 7.6 - 0.06, 9);
  });

  it('is closed and knows the side of each segment, bottom first', () => {
    const { segments, sides } = tileOutline(layout, even);
    expect(sides).toHaveLength(segments.length);
    expect([...new Set(sides)]).toEqual(['bottom', 'right', 'top', 'left']);
    segments.forEach((segment, i) => {
      const next = startOf(segments[(i + 1) % segments.length]!);
      expect(endOf(segment).x).toBeCloseTo(next.x, 9);
      expect(endOf(segment).y).toBeCloseTo(next.y, 9);
    });
  });
});

it('a flat end stays where it is under clearance', () => {
  const { segments, sides } = tileOutline(layout, tileEdges('alternating', grid, 0, 0));
  const bottom = segments.filter((_, i) => sides[i] === 'bottom');
  expect(bottom).toEqual([
    { kind: 'line', from: { x: -14 + 0.06, y: -14 }, to: { x: 14 - 0.06, y: -14 } },
  ]);
});

it('a one-way middle tile has the area of the grid before clearance', () => {
  const oneWay = { ...layout, joint: { ...layout.joint, scheme: 'one-way' as const } };
  const tile = nominalTileOutline(oneWay, tileEdges('one-way', grid, 3, 1));
  expect(areaOf(tile)).toBeCloseTo(28 * 28, 9);
});
