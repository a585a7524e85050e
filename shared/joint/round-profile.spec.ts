import { describe, expect, it } from 'vitest';
import { directionAtEnd, directionAtStart, endOf, startOf } from '../geometry/segment';
import { closeProfile, edgeProfile } from './edge-profile';
import type { RoundParameters } from './parameters';
import { refusalSentence } from './refusal';
import { isWave } from './round-profile';

const sample: RoundParameters = {
  profile: 'round',
  headRadius: 3.6,
  filletRadius: 1.8,
  reach: 7.6,
};

describe('a round tab of head 3.6, fillet 1.8, reach 7.6 (worked example, checked numerically)', () => {
  const profile = edgeProfile(sample);

  it('has its fillets at 4.931531, a neck of 6.263062 and an undercut of 0.468469', () => {
    expect(profile.shoulder).toBeCloseTo(4.931531, 6);
    expect(profile.neck).toBeCloseTo(6.263062, 6);
    expect(profile.undercut).toBeCloseTo(0.468469, 6);
    expect(profile.headWidth).toBeCloseTo(7.2, 12);
  });

  it('runs from shoulder to shoulder without a break or a kink', () => {
    const { segments, shoulder } = profile;
    const [first, last] = [startOf(segments[0]!), endOf(segments.at(-1)!)];
    expect(first.x).toBeCloseTo(-shoulder, 12);
    expect(first.y).toBeCloseTo(0, 12);
    expect(last.x).toBeCloseTo(shoulder, 12);
    expect(last.y).toBeCloseTo(0, 12);
    segments.slice(1).forEach((segment, i) => {
      const before = segments[i]!;
      expect(startOf(segment).x).toBeCloseTo(endOf(before).x, 12);
      expect(startOf(segment).y).toBeCloseTo(endOf(before).y, 12);
      expect(directionAtStart(segment).x).toBeCloseTo(directionAtEnd(before).x, 9);
      expect(directionAtStart(segment).y).toBeCloseTo(directionAtEnd(before).y, 9);
    });
  });

  it('stands out by its reach', () => {
    const head = profile.segments[1]!;
    expect(head.kind === 'arc' && head.centre.y + head.radius).toBeCloseTo(7.6, 12);
  });
});

it('a head no higher than its fillet is a wave without undercut', () => {
  const wave: RoundParameters = { ...sample, reach: 5.39 };
  expect(isWave(wave)).toBe(true);
  expect(edgeProfile(wave).undercut).toBe(0);
  expect(isWave({ ...wave, reach: 5.41 })).toBe(false);
  expect(edgeProfile({ ...wave, reach: 5.41 }).undercut).toBeGreaterThan(0);
});

describe('parameters that do not close are refused by field and bound', () => {
  interface Case {
    readonly name: string;
    readonly parameters: RoundParameters;
    readonly edge: number;
    readonly clearance: number;
    readonly field: 'headRadius' | 'filletRadius' | 'reach';
    readonly limit: 'least' | 'most';
  }
  const cases: readonly Case[] = [
    {
      name: 'a reach at which the neck closes',
      parameters: { ...sample, reach: 10.5 },
      edge: 28,
      clearance: 0.12,
      field: 'reach',
      limit: 'most',
    },
    {
      name: 'a head smaller than the clearance takes off it',
      parameters: { profile: 'round', headRadius: 0.9, filletRadius: 1, reach: 1.2 },
      edge: 28,
      clearance: 2,
      field: 'headRadius',
      limit: 'least',
    },
    {
      name: 'a head wider than the tile',
      parameters: { profile: 'round', headRadius: 6, filletRadius: 0.2, reach: 11 },
      edge: 11,
      clearance: 0.1,
      field: 'headRadius',
      limit: 'most',
    },
    {
      name: 'fillets that run into the corners of the tile',
      parameters: { ...sample, filletRadius: 3 },
      edge: 11,
      clearance: 0.12,
      field: 'filletRadius',
      limit: 'most',
    },
    {
      name: 'lips that the clearance sharpens into the corners of the tile',
      parameters: { profile: 'round', headRadius: 2.4, filletRadius: 0.3, reach: 2.2 },
      edge: 6.2,
      clearance: 1,
      field: 'headRadius',
      limit: 'most',
    },
  ];

  it.each(cases)('$name', ({ parameters, edge, clearance, field, limit }) => {
    const closed = closeProfile(parameters, edge, clearance);
    expect(closed.ok).toBe(false);
    const refusal = closed.ok ? undefined : closed.refusals[0];
    expect(refusal).toMatchObject({ field, limit });
    const bound = refusal?.value ?? NaN;
    const beyond = limit === 'most' ? bound + 1e-6 : bound - 1e-6;
    expect(closeProfile({ ...parameters, [field]: bound }, edge, clearance).ok).toBe(true);
    expect(closeProfile({ ...parameters, [field]: beyond }, edge, clearance).ok).toBe(false);
  });

  it('a wave may be wider than half the tile: only its foot must fit', () => {
    const flat: RoundParameters = {
      profile: 'round',
      headRadius: 40,
      filletRadius: 40,
      reach: 1,
    };
    expect(closeProfile(flat, 28, 0.1).ok).toBe(true);
  });

  it('says so in one sentence, rounded to the side that will be accepted', () => {
    const closed = closeProfile({ ...sample, reach: 12 }, 28, 0.12);
    const refusal = closed.ok ? undefined : closed.refusals[0];
    expect(refusal && refusalSentence(refusal, 'mm')).toBe(
      'must be at most 10.46 mm: beyond it the neck closes',
    );
    expect(refusal && refusalSentence(refusal, 'in')).toBe(
      'must be at most 0.412 in: beyond it the neck closes',
    );
    expect(closeProfile({ ...sample, reach: 10.46 }, 28, 0.12).ok).toBe(true);
  });
});
