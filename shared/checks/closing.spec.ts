import { expect, it } from 'vitest';
import { found } from './one-check.fixture';

const odd = { shell: { staves: 25, boardThickness: 12 } };

it('an even ring closes as two halves with no play', () => {
  expect(found('closing', {})).toMatchObject({
    result: 'clear',
    finding: 'The ring closes as two halves of 16 staves, with no play needed.',
  });
});

it('an odd ring is a stop until the clearance is its play', () => {
  const play = 12 * Math.tan(Math.PI / 50);
  expect(found('closing', { ...odd, joint: { clearance: play } }).result).toBe('clear');
  expect(found('closing', odd)).toMatchObject({
    result: 'stop',
    finding:
      'The ring closes as 12 staves against 13, which needs 0.75 mm of play at the last two joints; the clearance is 0.12 mm.',
    remedy: 'Take an even number of staves: two equal halves close without play.',
  });
});
