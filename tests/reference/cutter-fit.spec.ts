/**
 * Cutter fit against brute force: the wood is closed by a disc of the cutter's radius (grown by it, then
 * shrunk by it, by clipper2-ts on fine chords). What the closing fills in is what the cutter cannot reach;
 * a cutter fits exactly when that is nothing.
 */
import { describe, expect, it } from 'vitest';
import type { Outline } from '@shared/geometry/outline';
import type { Segment } from '@shared/geometry/segment';
import { cutterFit } from '@shared/joint/cutter-fit';
import { edgeProfile } from '@shared/joint/edge-profile';
import type { JointParameters, Scheme } from '@shared/joint/parameters';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { problemsOf } from '@shared/layout/consistency';
import { layoutOutlines } from '@shared/pieces/layout-fit';
import { areaWithin, inflated, pathOf } from './clipper-offsets';
import { movedBy } from './true-arcs';

const CHORD = 3e-4;

/** Below this the area that closing fills in is chords, not wood. */
const NOTHING = 0.01;

/** How far over and under the largest cutter the two must agree. */
const NEAR = 0.03;

function filledByClosing({ segments }: Outline, diameter: number): number {
  const path = pathOf(segments, CHORD);
  const closed = inflated(inflated(path, diameter / 2, CHORD), -diameter / 2, CHORD);
  return areaWithin(closed) - areaWithin(path);
}

interface Sample {
  readonly name: string;
  readonly joint: JointParameters;
  readonly scheme: Scheme;
  readonly clearance: number;
  /** What limits the largest cutter over all outlines. */
  readonly limitedBy: 'inside-radius' | 'reach-in';
}

const round = (headRadius: number, filletRadius: number, reach: number): JointParameters => ({
  profile: 'round',
  headRadius,
  filletRadius,
  reach,
});

const dovetail = (flankAngle: number, tipRadius: number, rootRadius: number): JointParameters => ({
  profile: 'dovetail',
  rootWidth: 7,
  flankAngle,
  reach: 6,
  tipRadius,
  rootRadius,
});

const joints: readonly Omit<Sample, 'scheme' | 'clearance'>[] = [
  { name: 'a small fillet', joint: round(3.6, 1.2, 7.2), limitedBy: 'inside-radius' },
  { name: 'a narrow mouth', joint: round(3.6, 3.4, 9.9), limitedBy: 'reach-in' },
  { name: 'head and fillet alike', joint: round(2.5, 2.5, 6.4), limitedBy: 'reach-in' },
  { name: 'a wave', joint: round(4, 3, 5), limitedBy: 'inside-radius' },
  { name: 'a dovetail', joint: dovetail(10, 1.8, 1.4), limitedBy: 'inside-radius' },
  { name: 'a steep dovetail', joint: dovetail(30, 0.9, 1.1), limitedBy: 'inside-radius' },
];

const samples: readonly Sample[] = joints.flatMap((joint, i) => [
  { ...joint, scheme: 'alternating' as const, clearance: 0.02 },
  // every other one is tried with neighbouring sockets and another clearance too
  ...(i % 2 === 0 ? [{ ...joint, scheme: 'one-way' as const, clearance: 0.2 }] : []),
]);

describe.each(samples)('$name, $scheme, clearance $clearance', (of) => {
  const { scheme, clearance, joint } = of;
  const layout = {
    ...smallLayout(),
    joint: { scheme, clearance, staveJoint: joint, courseJoint: joint },
  };
  const outlines = layoutOutlines(layout)
    .filter(({ edges }) => edges.bottom !== 'flat' && edges.top !== 'flat')
    .map(({ outline }) => outline);

  it('holds together and is limited by what it is meant to be', () => {
    expect(problemsOf(layout)).toEqual([]);
    const [hardest] = outlines
      .map((outline) => cutterFit(outline, 1))
      .sort((a, b) => a.largestCutter - b.largestCutter);
    expect(hardest?.limitedBy).toBe(of.limitedBy);
  });

  it('fits exactly where closing fills in nothing, just under and over the largest cutter too', () => {
    for (const outline of outlines) {
      const { largestCutter } = cutterFit(outline, 1);
      const diameters = [largestCutter - NEAR, largestCutter + NEAR, 3.175];
      for (const diameter of diameters) {
        const filled = filledByClosing(outline, diameter);
        expect([diameter, cutterFit(outline, diameter).fits]).toEqual([diameter, filled < NOTHING]);
      }
    }
  });
});

describe('two heads beside each other, with less room between them than in their fillets', () => {
  const tab = edgeProfile(round(5, 2.5, 11));
  const apart = 13.4;
  const line = (x1: number, y1: number, x2: number, y2: number): Segment => ({
    kind: 'line',
    from: { x: x1, y: y1 },
    to: { x: x2, y: y2 },
  });
  // local tabs stand up and run to the right: mirrored by running the whole outline that way round
  const across: Segment[] = [
    line(-30, 0, -apart / 2 - tab.shoulder, 0),
    ...movedBy(tab.segments, -apart / 2, 0),
    line(-apart / 2 + tab.shoulder, 0, apart / 2 - tab.shoulder, 0),
    ...movedBy(tab.segments, apart / 2, 0),
    line(apart / 2 + tab.shoulder, 0, 30, 0),
  ];
  const outline: Outline = {
    segments: [
      ...across.map(upsideDown),
      line(30, 0, 30, 20),
      line(30, 20, -30, 20),
      line(-30, 20, -30, 0),
    ],
  };

  it('is limited by the gap, which closing bridges', () => {
    const fit = cutterFit(outline, 3);
    expect(fit.limitedBy).toBe('reach-in');
    expect(fit.largestCutter).toBeCloseTo(apart - 10, 2);
    expect(filledByClosing(outline, fit.largestCutter - NEAR)).toBeLessThan(NOTHING);
    expect(filledByClosing(outline, fit.largestCutter + NEAR)).toBeGreaterThan(NOTHING);
  });
});

function upsideDown(segment: Segment): Segment {
  if (segment.kind === 'line') {
    const { from, to } = segment;
    return { kind: 'line', from: { x: from.x, y: -from.y }, to: { x: to.x, y: -to.y } };
  }
  const { centre, startAngle, sweep } = segment;
  return {
    ...segment,
    centre: { x: centre.x, y: -centre.y },
    startAngle: -startAngle,
    sweep: -sweep,
  };
}
