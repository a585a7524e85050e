import { describe, expect, it } from 'vitest';
import { endOf, startOf } from '../geometry/segment';
import { closeProfile, edgeProfile } from './edge-profile';
import type { DovetailParameters } from './parameters';

const sample: DovetailParameters = {
  profile: 'dovetail',
  rootWidth: 7,
  flankAngle: 10,
  reach: 6,
  tipRadius: 1.8,
  rootRadius: 1.8,
};

describe('a dovetail of root 7, 10°, reach 6, radii 1.8 (closed forms)', () => {
  const profile = edgeProfile(sample);
  const perRadius = 1 / Math.tan((40 * Math.PI) / 180);

  it('is 7 wide on the edge line and root + 2 reach tan 10° at the tip, both drawn sharp', () => {
    const lines = profile.segments.filter((segment) => segment.kind === 'line');
    const [left] = lines;
    const slope = (left!.to.x - left!.from.x) / (left!.to.y - left!.from.y);
    const xAt = (y: number) => left!.from.x + (y - left!.from.y) * slope;
    expect(-2 * xAt(0)).toBeCloseTo(7, 9);
    expect(-2 * xAt(6)).toBeCloseTo(7 + 12 * Math.tan((10 * Math.PI) / 180), 9);
  });

  it('takes radius / tan(45° − 5°) off the sides of each corner', () => {
    expect(profile.shoulder).toBeCloseTo(3.5 + 1.8 * perRadius, 12);
    expect(profile.neck).toBeCloseTo(2 * (3.5 + 1.8 * perRadius - 1.8), 12);
  });

  it('has an undercut of half the head less half the neck', () => {
    const tipHalf = 3.5 + 6 * Math.tan((10 * Math.PI) / 180);
    const head = tipHalf - 1.8 * perRadius + 1.8;
    expect(profile.undercut).toBeCloseTo(head - profile.neck / 2, 12);
  });

  it('runs from shoulder to shoulder without a break', () => {
    profile.segments.slice(1).forEach((segment, i) => {
      const before = endOf(profile.segments[i]!);
      expect(startOf(segment).x).toBeCloseTo(before.x, 12);
      expect(startOf(segment).y).toBeCloseTo(before.y, 12);
    });
  });
});

it('upright flanks hold by nothing', () => {
  expect(edgeProfile({ ...sample, flankAngle: 0 }).undercut).toBeCloseTo(0, 12);
});

it('radii of nothing leave sharp corners', () => {
  const sharp = edgeProfile({ ...sample, tipRadius: 0, rootRadius: 0 });
  expect(sharp.shoulder).toBe(3.5);
  expect(sharp.headWidth).toBeCloseTo(7 + 12 * Math.tan((10 * Math.PI) / 180), 12);
});

describe('parameters that do not close are refused by field and bound', () => {
  interface Case {
    readonly name: string;
    readonly changed: Partial<DovetailParameters>;
    readonly edge?: number;
    readonly clearance?: number;
    readonly field: Exclude<keyof DovetailParameters, 'profile'>;
    readonly limit: 'least' | 'most';
  }
  const cases: readonly Case[] = [
    {
      name: 'a root narrower than the clearance',
      changed: { rootWidth: 0.6, rootRadius: 0, tipRadius: 0, flankAngle: 0 },
      clearance: 1,
      field: 'rootWidth',
      limit: 'least',
    },
    {
      name: 'a root fillet in the corner of the tile',
      changed: { rootWidth: 9, tipRadius: 1 },
      edge: 11,
      field: 'rootWidth',
      limit: 'most',
    },
    {
      name: 'a root radius larger than the edge',
      changed: { rootWidth: 2, rootRadius: 4, tipRadius: 0, reach: 9, flankAngle: 0 },
      edge: 8,
      field: 'rootRadius',
      limit: 'most',
    },
    {
      name: 'radii longer than the flank',
      changed: { reach: 3 },
      field: 'reach',
      limit: 'least',
    },
    {
      name: 'a flank that the clearance takes up with one sharp corner',
      changed: { reach: 1.1, tipRadius: 0, rootRadius: 0.6, flankAngle: 0 },
      clearance: 1.2,
      field: 'reach',
      limit: 'least',
    },
    {
      name: 'tips that meet in the middle',
      changed: { rootWidth: 3, reach: 9, tipRadius: 2.8, rootRadius: 0 },
      field: 'tipRadius',
      limit: 'most',
    },
    {
      name: 'a head that leaves the tile',
      changed: { flankAngle: 40, rootRadius: 0.5, tipRadius: 0.5 },
      edge: 15,
      field: 'rootWidth',
      limit: 'most',
    },
    {
      name: 'a narrow root whose long tail leaves the tile',
      changed: { rootWidth: 1, flankAngle: 45, rootRadius: 0.2, tipRadius: 0.2, reach: 9 },
      edge: 12,
      field: 'reach',
      limit: 'most',
    },
    {
      name: 'flanks too flat for lips that the clearance sharpens',
      changed: { rootWidth: 0.6, flankAngle: 45, rootRadius: 0, tipRadius: 0, reach: 4 },
      edge: 6,
      clearance: 2,
      field: 'flankAngle',
      limit: 'most',
    },
  ];

  it.each(cases)('$name', ({ changed, edge = 28, clearance = 0.12, field, limit }) => {
    const parameters = { ...sample, ...changed };
    const isRefused = (value: number) => {
      const closed = closeProfile({ ...parameters, [field]: value }, edge, clearance);
      return !closed.ok && closed.refusals.some((other) => other.because === found?.because);
    };
    const closed = closeProfile(parameters, edge, clearance);
    const found = closed.ok ? undefined : closed.refusals.find((other) => other.field === field);
    expect(found).toMatchObject({ field, limit });
    const bound = found?.value ?? NaN;
    const beyond = limit === 'most' ? 1e-6 : -1e-6;
    expect(isRefused(bound + beyond)).toBe(true);
    expect(isRefused(bound - beyond)).toBe(false);
  });

  it('closes altogether once the one thing that is wrong is mended', () => {
    const short = closeProfile({ ...sample, reach: 3 }, 28, 0.12);
    const least = short.ok ? NaN : (short.refusals[0]?.value ?? NaN);
    expect(closeProfile({ ...sample, reach: least + 1e-9 }, 28, 0.12).ok).toBe(true);
  });
});
