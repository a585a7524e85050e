import { describe, expect, it } from 'vitest';
import { outsideGap } from './outside-gap';

describe('square edges round a ring', () => {
  it('open by thickness times twice the tangent of the bevel', () => {
    expect(outsideGap({ staves: 32, boardThickness: 14 })).toBeCloseTo(2.757759, 6);
  });

  it('open less the more staves there are', () => {
    const few = outsideGap({ staves: 12, boardThickness: 14 });
    expect(outsideGap({ staves: 48, boardThickness: 14 })).toBeLessThan(few / 4);
  });
});
