import { closeProfile, edgeProfile } from '@shared/joint/edge-profile';
import type { JointParameters } from '@shared/joint/parameters';
import { expect, test } from 'vitest';
import { otherProfile } from './other-profile';

const round: JointParameters = {
  profile: 'round',
  headRadius: 3.6,
  filletRadius: 1.8,
  reach: 7.6,
};

test('a round joint becomes a dovetail that closes, with the same reach', () => {
  const dovetail = otherProfile(round, 28, 0.12);
  expect(dovetail).toMatchObject({ profile: 'dovetail', reach: 7.6 });
  expect(dovetail && closeProfile(dovetail, 28, 0.12).ok).toBe(true);
});

test('and turns back into a round joint that locks', () => {
  const dovetail = otherProfile(round, 28, 0.12);
  const back = dovetail && otherProfile(dovetail, 28, 0.12);
  expect(back).toMatchObject({ profile: 'round', reach: 7.6 });
  expect(back && closeProfile(back, 28, 0.12).ok).toBe(true);
  expect(back && edgeProfile(back).undercut).toBeGreaterThan(0.12);
});
