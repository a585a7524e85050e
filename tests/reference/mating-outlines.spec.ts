/**
 * Neighbouring tiles against @flatten-js/core 1.6 (MIT), which has true arcs: they never overlap, and their
 * distance is the clearance all along the joint. The outlines go over arc for arc.
 */
import Flatten from '@flatten-js/core';
import { describe, expect, it } from 'vitest';
import type { Segment } from '@shared/geometry/segment';
import { closeProfile } from '@shared/joint/edge-profile';
import type { JointParameters, Scheme } from '@shared/joint/parameters';
import { tileEdges, type Side } from '@shared/pieces/tile-edges';
import { tileOutline, type TileOutline } from '@shared/pieces/tile-outline';
import { movedBy, pointsAlong, truePolygon } from './true-arcs';

interface Sample {
  readonly name: string;
  readonly staveJoint: JointParameters;
  readonly courseJoint: JointParameters;
  readonly tileWidth: number;
  readonly tileHeight: number;
}

const round = (headRadius: number, filletRadius: number, reach: number): JointParameters => ({
  profile: 'round',
  headRadius,
  filletRadius,
  reach,
});

const dovetail = (rootWidth: number, flankAngle: number, reach: number, radius: number) =>
  ({
    profile: 'dovetail',
    rootWidth,
    flankAngle,
    reach,
    tipRadius: radius,
    rootRadius: radius,
  }) satisfies JointParameters;

const samples: readonly Sample[] = [
  {
    name: 'round, 28 × 28',
    staveJoint: round(3.6, 1.8, 7.6),
    courseJoint: round(3.6, 1.8, 7.6),
    tileWidth: 28,
    tileHeight: 28,
  },
  {
    name: 'dovetail, 30 × 45',
    staveJoint: dovetail(9, 10, 6, 1.8),
    courseJoint: dovetail(7, 20, 5, 1.2),
    tileWidth: 30,
    tileHeight: 45,
  },
  {
    name: 'round beside a dovetail, 120 × 80',
    staveJoint: round(12, 6, 26),
    courseJoint: dovetail(30, 35, 14, 3),
    tileWidth: 120,
    tileHeight: 80,
  },
  {
    name: 'sharp corners, 28 × 20',
    staveJoint: round(3.6, 0, 6.4),
    courseJoint: dovetail(6, 15, 5, 0),
    tileWidth: 28,
    tileHeight: 20,
  },
  {
    name: 'waves, 24 × 24',
    staveJoint: round(6, 4, 3),
    courseJoint: round(4, 4, 6),
    tileWidth: 24,
    tileHeight: 24,
  },
  {
    name: 'tiny tiles, 8 × 6',
    staveJoint: round(1, 0.6, 2.1),
    courseJoint: dovetail(2.4, 8, 1.6, 0.5),
    tileWidth: 8,
    tileHeight: 6,
  },
];

const grid = { staves: 8, courses: 6 };
const cases = samples.flatMap((sample) =>
  (['alternating', 'one-way'] as const).flatMap((scheme) =>
    [0, 0.05, 0.12, 0.6].map((clearance) => ({ ...sample, scheme, clearance })),
  ),
);

interface Case extends Sample {
  readonly scheme: Scheme;
  readonly clearance: number;
}

/** The tile at a stave and course, where it lies on the unrolled shell; stave 8 is stave 0 past the seam. */
function tileAt(of: Case, stave: number, course: number): TileOutline {
  const shape = {
    shell: { tileWidth: of.tileWidth, tileHeight: of.tileHeight },
    joint: {
      scheme: of.scheme,
      clearance: of.clearance,
      staveJoint: of.staveJoint,
      courseJoint: of.courseJoint,
    },
  };
  const { segments, sides } = tileOutline(
    shape,
    tileEdges(of.scheme, grid, stave % grid.staves, course),
  );
  return { segments: movedBy(segments, stave * of.tileWidth, course * of.tileHeight), sides };
}

function overlap(a: Flatten.Polygon, b: Flatten.Polygon): number {
  return Math.abs(Flatten.BooleanOperations.intersect(a, b).area());
}

const sideOf = ({ segments, sides }: TileOutline, side: Side): Segment[] =>
  segments.filter((_, i) => sides[i] === side);

/** How far points of one tile's side are from the other tile, by the other library. */
function gapsAlong(side: readonly Segment[], other: Flatten.Polygon): number[] {
  return side.flatMap((segment) =>
    pointsAlong(segment, 8).map(({ x, y }) => new Flatten.Point(x, y).distanceTo(other)[0]),
  );
}

/** True when an outside radius is smaller than c/2, so that clearance leaves a sharp corner of it. */
function isSharpened(parameters: JointParameters, clearance: number): boolean {
  const [foot, head] =
    parameters.profile === 'round'
      ? [parameters.filletRadius, parameters.headRadius]
      : [parameters.rootRadius, parameters.tipRadius];
  return Math.min(foot, head) < clearance / 2;
}

describe.each(cases)('$name, $scheme, clearance $clearance', (of) => {
  const { clearance } = of;

  it('closes', () => {
    expect(closeProfile(of.staveJoint, of.tileHeight, clearance).ok).toBe(true);
    expect(closeProfile(of.courseJoint, of.tileWidth, clearance).ok).toBe(true);
  });

  it.each([
    { name: 'side by side', a: [3, 2], b: [4, 2], sides: ['right', 'left'] },
    { name: 'one above the other', a: [3, 2], b: [3, 3], sides: ['top', 'bottom'] },
    { name: 'across the seam', a: [7, 1], b: [8, 1], sides: ['right', 'left'] },
    { name: 'at the bottom of the shell', a: [2, 0], b: [2, 1], sides: ['top', 'bottom'] },
  ] as const)('$name: no overlap, and the clearance all along', ({ a, b, sides }) => {
    const [first, second] = [tileAt(of, a[0], a[1]), tileAt(of, b[0], b[1])];
    const [one, two] = [truePolygon(first.segments), truePolygon(second.segments)];
    expect(overlap(one, two)).toBeLessThan(1e-6);
    expect(Math.abs(one.distanceTo(two)[0] - clearance)).toBeLessThan(1e-6);
    const gaps = [
      ...gapsAlong(sideOf(first, sides[0]), two),
      ...gapsAlong(sideOf(second, sides[1]), one),
    ];
    expect(Math.min(...gaps)).toBeGreaterThan(clearance - 1e-6);
    const joint = sides[0] === 'right' ? of.staveJoint : of.courseJoint;
    if (!isSharpened(joint, clearance)) {
      expect(Math.max(...gaps)).toBeLessThan(clearance + 1e-6);
    }
  });

  it('corner to corner: no overlap, and at least the clearance between', () => {
    for (const [stave, course] of [
      [4, 3],
      [2, 3],
    ] as const) {
      const one = truePolygon(tileAt(of, 3, 2).segments);
      const two = truePolygon(tileAt(of, stave, course).segments);
      expect(overlap(one, two)).toBeLessThan(1e-6);
      expect(one.distanceTo(two)[0]).toBeGreaterThan(clearance - 1e-6);
    }
  });
});
