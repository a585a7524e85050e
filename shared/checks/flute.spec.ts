import { expect, it } from 'vitest';
import { found } from './one-check.fixture';

it('flutes as long as the board is thick are clear, shorter ones a stop', () => {
  expect(found('flute', { cutter: { fluteLength: 14 } }).result).toBe('clear');
  expect(found('flute', { cutter: { fluteLength: 13.99 } })).toMatchObject({
    result: 'stop',
    finding: "The cutter's flutes are 13.99 mm long; the board is 14.00 mm.",
    remedy: 'Take a cutter with longer flutes, or a thinner board.',
  });
});
