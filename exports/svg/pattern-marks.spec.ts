import { expect, it } from 'vitest';
import { inkOn } from './pattern-marks';

it('ink is dark on pale woods and pale on dark ones', () => {
  expect(inkOn('#E3CFA6')).toBe('#000000');
  expect(inkOn('#5A3D2B')).toBe('#ffffff');
  expect(inkOn('#FFFFFF')).toBe('#000000');
  expect(inkOn('#000000')).toBe('#ffffff');
});
