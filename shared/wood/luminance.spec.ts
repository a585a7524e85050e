import { expect, test } from 'vitest';
import { luminanceOf } from './luminance';

test('black is 0, white is 1, and green weighs most (WCAG 2.2)', () => {
  expect(luminanceOf('#000000')).toBe(0);
  expect(luminanceOf('#FFFFFF')).toBeCloseTo(1, 12);
  expect(luminanceOf('#FF0000')).toBeCloseTo(0.2126, 12);
  expect(luminanceOf('#00ff00')).toBeCloseTo(0.7152, 12);
  expect(luminanceOf('#808080')).toBeCloseTo(0.21586, 5);
});
