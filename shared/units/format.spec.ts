import { describe, expect, it } from 'vitest';
import { toDegrees, toRadians } from './angle';
import { formatAngle, formatLength, formatLengthFigure, formatShare } from './format';
import { fromMillimetres, toMillimetres } from './length';

describe('lengths', () => {
  it('are shown to 0.01 mm and 0.001 in', () => {
    expect(formatLength(28, 'mm')).toBe('28.00 mm');
    expect(formatLength(28, 'in')).toBe('1.102 in');
    expect(formatLengthFigure(3.175, 'in')).toBe('0.125');
  });

  it('that round to nothing carry no sign', () => {
    expect(formatLength(-0.001, 'mm')).toBe('0.00 mm');
    expect(formatLength(-0.01, 'mm')).toBe('-0.01 mm');
  });

  it('come back from inches as they were', () => {
    expect(fromMillimetres(25.4, 'in')).toBe(1);
    expect(toMillimetres(0.125, 'in')).toBe(3.175);
    expect(toMillimetres(fromMillimetres(7.6, 'in'), 'in')).toBeCloseTo(7.6, 12);
  });
});

describe('angles and shares', () => {
  it('are shown to 0.01° and in whole percent', () => {
    expect(formatAngle(5.625)).toBe('5.63°');
    expect(formatAngle(-0.001)).toBe('0.00°');
    expect(formatShare(0.08)).toBe('8 %');
  });

  it('half a turn is π', () => {
    expect(toRadians(180)).toBe(Math.PI);
    expect(toDegrees(Math.PI / 2)).toBe(90);
  });
});
