/**
 * Exact offsets against clipper2-ts on fine chords: chords that leave their arc by at most 1e-4 mm
 * bound what the two may differ by. (Closed forms are in shared/geometry/offset.spec.ts.)
 */
import { describe, expect, it } from 'vitest';
import { nearestPoint } from '@shared/geometry/distance';
import { offsetOutline } from '@shared/geometry/offset';
import { areaOf, type Outline } from '@shared/geometry/outline';
import { notchedSquare, roundedRectangle } from '@shared/geometry/shapes.fixture';
import { lengthOf } from '@shared/geometry/segment';
import { distance } from '@shared/geometry/vector';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { layoutOutlines } from '@shared/pieces/layout-fit';
import type { PointMm } from '@shared/units/length';
import { areaWithin, inflated, pathOf } from './clipper-offsets';

const CHORD = 1e-4;

const layout = smallLayout();
const oneWay = { ...layout, joint: { ...layout.joint, scheme: 'one-way' as const } };
const tailed = {
  ...layout,
  joint: {
    ...layout.joint,
    courseJoint: {
      profile: 'dovetail' as const,
      rootWidth: 7,
      flankAngle: 10,
      reach: 6,
      tipRadius: 1.8,
      rootRadius: 1.8,
    },
  },
};

interface Sample {
  readonly name: string;
  readonly outline: Outline;
  readonly distances: readonly number[];
}

const samples: readonly Sample[] = [
  { name: 'notched square', outline: notchedSquare, distances: [1, 2, 2.9, -1, -2] },
  { name: 'rounded rectangle', outline: roundedRectangle, distances: [0.5, 4, -0.5, -1.9] },
  ...[layout, oneWay, tailed].flatMap((of, i) =>
    middlesOf(of).map((outline, j) => ({
      name: `middle tile ${j + 1} of the ${['round', 'one-way', 'dovetail'][i]} layout`,
      outline,
      distances: [1.5875, -0.06, -1],
    })),
  ),
];

function middlesOf(of: Layout): Outline[] {
  return layoutOutlines(of)
    .filter(({ edges }) => edges.bottom !== 'flat' && edges.top !== 'flat')
    .map(({ outline }) => outline);
}

/** How far a point is from an outline. */
function deviation(point: PointMm, outline: Outline): number {
  return Math.min(
    ...outline.segments
      .filter((segment) => lengthOf(segment) > 0)
      .map((segment) => distance(nearestPoint(segment, point), point)),
  );
}

describe.each(samples)('$name', ({ outline, distances }) => {
  it.each(distances)('offset by %d mm agrees in area and in every point', (outward) => {
    const ours = offsetOutline(outline, outward);
    if (!ours.ok) throw new Error(ours.reason);
    const theirs = inflated(pathOf(outline.segments, CHORD), outward, CHORD);
    expect(theirs).toHaveLength(1);
    const girth = outline.segments.reduce((sum, segment) => sum + lengthOf(segment), 0);
    expect(Math.abs(areaOf(ours.outline) - areaWithin(theirs))).toBeLessThan(3 * CHORD * girth);
    const far = Math.max(...theirs[0]!.map((point) => deviation(point, ours.outline)));
    expect(far).toBeLessThan(4 * CHORD);
  });
});
