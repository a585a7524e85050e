import { expect, it } from 'vitest';
import { found } from './one-check.fixture';

it('undercut over the clearance locks; up to it is a caution', () => {
  expect(found('undercut', { joint: { clearance: 0.46 } }).result).toBe('clear');
  const loose = found('undercut', { joint: { clearance: 0.47 } });
  expect(loose).toMatchObject({ result: 'caution', limit: { value: 0.47 } });
  expect(loose.figure?.value).toBeCloseTo(0.468469, 6);
  expect(loose.finding).toBe(
    'The stave joint holds by 0.47 mm of undercut on each side; the clearance is 0.47 mm.',
  );
});

it('a wave does not lock whatever the clearance', () => {
  const wave = { profile: 'round', headRadius: 3.6, filletRadius: 2, reach: 5 } as const;
  const result = found('undercut', { joint: { courseJoint: wave, clearance: 0 } });
  expect(result).toMatchObject({
    result: 'caution',
    finding: 'The course joint is a wave without undercut: it does not lock.',
  });
});
