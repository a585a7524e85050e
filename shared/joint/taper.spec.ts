import { expect, it } from 'vitest';
import { gapsWithTaper, measuredTaper, recommendedClearance } from './taper';

it('a test tab 0.06 mm wider at the deep face leans out by 0.03 mm', () => {
  expect(measuredTaper(7.26, 7.2)).toBeCloseTo(0.03, 12);
});

it('two tiles cut the same way up close their gap from c to c − 2δ', () => {
  expect(gapsWithTaper(0.12, 0.03, 'same-way-up')).toEqual({ wide: 0.12, narrow: 0.06 });
});

it('one tile turned over keeps the gap even at c − δ', () => {
  const { wide, narrow } = gapsWithTaper(0.12, 0.03, 'turned-over');
  expect(wide).toBeCloseTo(0.09, 12);
  expect(narrow).toBe(wide);
});

it('the recommended clearance leaves the wished gap at the narrow face', () => {
  for (const turned of ['turned-over', 'same-way-up'] as const) {
    const clearance = recommendedClearance(0.1, 0.03, turned);
    expect(gapsWithTaper(clearance, 0.03, turned).narrow).toBeCloseTo(0.1, 12);
  }
});
