import { describe, expect, it } from 'vitest';
import { printDecimal } from './decimal';

describe('numbers in files', () => {
  it('keep what was asked and drop trailing zeros', () => {
    expect(printDecimal(4.931531, 6)).toBe('4.931531');
    expect(printDecimal(2.5, 6)).toBe('2.5');
    expect(printDecimal(100, 6)).toBe('100');
    expect(printDecimal(100, 0)).toBe('100');
  });

  it('never print an exponent or a negative zero', () => {
    expect(printDecimal(1e-9, 6)).toBe('0');
    expect(printDecimal(-1e-9, 6)).toBe('0');
    expect(printDecimal(-0, 6)).toBe('0');
    expect(printDecimal(1e-6, 6)).toBe('0.000001');
  });
});
