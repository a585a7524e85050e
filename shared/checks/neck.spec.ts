import { expect, it } from 'vitest';
import { found } from './one-check.fixture';

it('a neck of 0.3 × the board is clear, a slimmer one a caution', () => {
  const neck = 6.2630624;
  expect(found('neck', { shell: { boardThickness: neck / 0.3 - 1e-3 } }).result).toBe('clear');
  const thick = found('neck', { shell: { boardThickness: 21 } });
  expect(thick).toMatchObject({
    result: 'caution',
    finding: 'The neck of the stave joint is 6.26 mm wide; a board of 21.00 mm asks for 6.30 mm.',
    remedy: 'Widen the neck, or take a thinner board.',
  });
});

it('the slimmer of both joints is named', () => {
  const slim = { profile: 'round', headRadius: 3, filletRadius: 2, reach: 8 } as const;
  expect(found('neck', { joint: { courseJoint: slim } }).finding).toMatch(
    /^The neck of the course joint/,
  );
});
