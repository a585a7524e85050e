import { expect, it } from 'vitest';
import { found } from './one-check.fixture';

it('alternating tabs meet at the seam of an odd ring, one-way tabs never', () => {
  const odd = { shell: { staves: 33 } };
  expect(found('seam', {}).result).toBe('clear');
  expect(found('seam', odd)).toMatchObject({
    result: 'stop',
    figure: { value: 33, kind: 'count' },
    finding: 'Tabs alternate, but 33 staves are odd: at the seam tab would meet tab.',
    remedy: 'Take one stave more or less, or let the tabs run one way.',
  });
  expect(found('seam', { ...odd, joint: { scheme: 'one-way' } }).result).toBe('clear');
});
