import { describe, expect, it } from 'vitest';
import { runChecks } from '../checks/run-checks';
import { smallLayout } from '../layout/small-layout.fixture';
import { layoutFit, layoutOutlines } from '../pieces/layout-fit';
import type { RoundParameters } from './parameters';
import { smallestJoint, type SmallestJointWish } from './smallest-joint';
import { closeProfile, edgeProfile, mouthOf } from './edge-profile';

const wish: SmallestJointWish = {
  cutterDiameter: 3.175,
  finishingMargin: 0.08,
  clearance: 0.12,
  undercut: 0.4,
  scheme: 'alternating',
  webMinimum: 2.5,
};

/** A layout of square tiles with this joint on every side. */
function layoutWith(parameters: RoundParameters, tile: number, of: SmallestJointWish) {
  const layout = smallLayout();
  return {
    ...layout,
    shell: { ...layout.shell, tileWidth: tile, tileHeight: tile },
    joint: {
      scheme: of.scheme,
      clearance: of.clearance,
      staveJoint: parameters,
      courseJoint: parameters,
    },
    cutter: { ...layout.cutter, diameter: of.cutterDiameter },
  };
}

const jointChecks = ['inside-radius', 'reach-in', 'undercut', 'web'];

function resultsOf(parameters: RoundParameters, tile: number, of: SmallestJointWish): string[] {
  return runChecks(layoutWith(parameters, tile, of), of)
    .filter(({ key }) => jointChecks.includes(key))
    .map(({ key, result }) => `${key} ${result}`);
}

describe('the smallest joint for a 1/8 in cutter (worked by hand from the tangency)', () => {
  const joint = smallestJoint(wish);

  it('has inside radii and mouth 8 % over the cutter, after clearance', () => {
    expect(joint.filletRadius).toBeCloseTo(1.5875 * 1.08 - 0.06, 12);
    expect(joint.neck).toBeCloseTo(3.175 * 1.08 - 0.12, 12);
    expect(joint.headRadius).toBeCloseTo(joint.neck / 2 + 0.4, 12);
  });

  it('has the wished neck and undercut at its reach', () => {
    const { headRadius, filletRadius, reach } = joint;
    const profile = edgeProfile({ profile: 'round', headRadius, filletRadius, reach });
    expect(profile.neck).toBeCloseTo(joint.neck, 9);
    expect(profile.undercut).toBeCloseTo(0.4, 9);
  });

  it('is offered in hundredths, none of them under the least', () => {
    const { headRadius, filletRadius, reach } = joint.parameters;
    for (const figure of [headRadius, filletRadius, reach]) {
      expect(Math.abs(figure * 100 - Math.round(figure * 100))).toBeLessThan(1e-9);
    }
    expect(edgeProfile(joint.parameters).neck).toBeGreaterThanOrEqual(joint.neck);
    expect(edgeProfile(joint.parameters).undercut).toBeGreaterThanOrEqual(0.4 - 1e-9);
  });
});

const wishes = [3.175, 1.5875, 6, 0.5].flatMap((cutterDiameter) =>
  [0, 0.12, 0.8, 2].flatMap((clearance) =>
    (['alternating', 'one-way'] as const).map((scheme) => ({
      ...wish,
      cutterDiameter,
      clearance,
      scheme,
      undercut: clearance + 0.3,
    })),
  ),
);

describe.each(wishes)('$cutterDiameter mm cutter, clearance $clearance, $scheme', (of) => {
  const joint = smallestJoint(of);
  const { headRadius, filletRadius, reach } = joint;
  const exact: RoundParameters = { profile: 'round', headRadius, filletRadius, reach };
  const tile = Math.max(6, joint.tileLeast + 1e-6);

  it('closes, fits the cutter and is clear in every check of the joint', () => {
    for (const parameters of [exact, joint.parameters]) {
      const room = Math.max(tile, parameters === exact ? 0 : tile + 0.3);
      expect(closeProfile(parameters, room, of.clearance).ok).toBe(true);
      const eased = { ...of, finishingMargin: of.finishingMargin - 1e-9 };
      expect(resultsOf(parameters, room, eased)).toEqual(jointChecks.map((key) => `${key} clear`));
    }
  });

  it('has no smaller one: less fillet, head or neck costs the margin, less tile the web', () => {
    const inside = (parameters: RoundParameters) =>
      layoutFit(layoutWith(parameters, tile + 1, of)).tightest?.radius ?? NaN;
    const margined = (of.cutterDiameter / 2) * (1 + of.finishingMargin);
    if (filletRadius > 0.01) {
      expect(inside({ ...exact, filletRadius: filletRadius - 0.01 })).toBeLessThan(margined);
    }
    const narrower = { ...exact, reach: reach + 0.05 };
    const mouth = mouthOf(narrower, of.clearance) ?? Infinity;
    const closes = closeProfile(narrower, tile + 1, of.clearance).ok;
    expect(!closes || mouth < 2 * margined || filletRadius < of.clearance / 2).toBe(true);
    if (joint.tileLeast <= 6) return;
    const cramped = layoutWith(exact, joint.tileLeast - 0.02, of);
    const fits = closeProfile(exact, joint.tileLeast - 0.02, of.clearance).ok;
    expect(layoutOutlines(cramped)).not.toEqual([]);
    expect(!fits || resultsOf(exact, joint.tileLeast - 0.02, of).includes('web caution')).toBe(
      true,
    );
  });
});
