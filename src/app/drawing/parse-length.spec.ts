import { describe, expect, it } from 'vitest';
import { parseLength } from './parse-length';

const millimetres = (text: string, unit: 'mm' | 'in') => {
  const parsed = parseLength(text, unit);
  return parsed.ok ? parsed.millimetres : parsed.message;
};

describe('a length as typed', () => {
  it('a comma counts as a decimal point', () => {
    expect(millimetres('3,6', 'mm')).toBe(3.6);
    expect(millimetres('.5', 'mm')).toBe(0.5);
  });

  it('inches and fractions of an inch become millimetres', () => {
    expect(millimetres('1', 'in')).toBe(25.4);
    expect(millimetres('1 1/8', 'in')).toBeCloseTo(28.575, 9);
    expect(millimetres('1/8', 'in')).toBeCloseTo(3.175, 9);
  });

  it('a unit that is written wins over the unit of the field', () => {
    expect(millimetres('3.175 mm', 'in')).toBe(3.175);
    expect(millimetres('1/8"', 'mm')).toBeCloseTo(3.175, 9);
    expect(millimetres('2.8 cm', 'mm')).toBe(28);
  });

  it('words, nothing at all and a fraction over zero are answered with a sentence', () => {
    expect(millimetres('wide', 'mm')).toBe('“wide” is not a length. Write it like 28.00.');
    expect(millimetres('  ', 'mm')).toBe('Enter a length.');
    expect(millimetres('1/0', 'in')).toContain('is not a length');
    expect(millimetres('1e308', 'mm')).toContain('is not a length');
  });
});
