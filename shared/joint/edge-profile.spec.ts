import { describe, expect, it } from 'vitest';
import { endOf, startOf } from '../geometry/segment';
import { clearedEdge, edgeProfile, mouthOf } from './edge-profile';
import type { JointParameters, RoundParameters } from './parameters';

const round: RoundParameters = { profile: 'round', headRadius: 3.6, filletRadius: 1.8, reach: 7.6 };

const radii = (edge: 'tab' | 'socket', parameters: JointParameters, clearance: number) =>
  clearedEdge(edgeProfile(parameters), edge, clearance).segments.map((segment) =>
    segment.kind === 'arc' ? Number(segment.radius.toFixed(9)) : 'line',
  );

describe('clearance c moves each half into its own wood by c/2', () => {
  it('widens inside radii by c/2 and narrows outside radii by it', () => {
    expect(radii('tab', round, 0.12)).toEqual([1.86, 3.54, 1.86]);
    expect(radii('socket', round, 0.12)).toEqual([1.74, 3.66, 1.74]);
  });

  it('leaves the radii of a profile without clearance', () => {
    expect(radii('tab', round, 0)).toEqual([1.8, 3.6, 1.8]);
  });

  it('rounds the sharp inside corners of a tab by c/2, and keeps the lips of its socket sharp', () => {
    const sharp = { ...round, filletRadius: 0, reach: 6 };
    expect(radii('tab', sharp, 0.2)).toEqual([0.1, 3.5, 0.1]);
    expect(radii('socket', sharp, 0.2)).toEqual([3.7]);
  });

  it('keeps the tips of a dovetail sharp where they are rounder than c/2 only on paper', () => {
    const dovetail: JointParameters = {
      profile: 'dovetail',
      rootWidth: 7,
      flankAngle: 10,
      reach: 6,
      tipRadius: 0.05,
      rootRadius: 1,
    };
    expect(radii('tab', dovetail, 0.2)).toEqual([1.1, 'line', 'line', 'line', 1.1]);
    expect(radii('socket', dovetail, 0.2)).toEqual([0.9, 'line', 0.15, 'line', 0.15, 'line', 0.9]);
  });

  it('keeps every end on the next start', () => {
    for (const filletRadius of [0, 0.05, 1.8]) {
      const { segments } = clearedEdge(
        edgeProfile({ ...round, filletRadius, reach: 6 }),
        'socket',
        0.2,
      );
      segments.slice(1).forEach((segment, i) => {
        expect(startOf(segment).x).toBeCloseTo(endOf(segments[i]!).x, 9);
        expect(startOf(segment).y).toBeCloseTo(endOf(segments[i]!).y, 9);
      });
    }
  });
});

describe('the mouth of a socket', () => {
  it('is the neck and the clearance', () => {
    expect(mouthOf(round, 0.12)).toBeCloseTo(6.263062 + 0.12, 6);
  });

  it('lies between the lips where the clearance makes them sharp', () => {
    const sharp = { ...round, filletRadius: 0, reach: 6 };
    // the lips stand c/2 back, on the head circle of radius r_h + c/2
    expect(mouthOf(sharp, 0.2)).toBeCloseTo(2 * Math.sqrt(3.7 ** 2 - (2.4 - 0.1) ** 2), 9);
  });

  it('does not narrow a wave', () => {
    expect(mouthOf({ ...round, reach: 5 }, 0.12)).toBeNull();
  });
});
