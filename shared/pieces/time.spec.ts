import { expect, it } from 'vitest';
import { cuttingTime } from './time';

it('blanks and stave edges are timed apart and together', () => {
  const time = cuttingTime({ blanks: 10, minutesPerBlank: 3, staves: 4, minutesPerStave: 12.5 });
  expect(time).toEqual({ blanks: 30, staveEdges: 50, total: 80 });
});
