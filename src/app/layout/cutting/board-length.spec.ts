import { describe, expect, it } from 'vitest';
import { formatBoardLength } from './board-length';

describe('a length of board', () => {
  it('is told in metres, rounded up to a centimetre', () => {
    expect(formatBoardLength(11_420, 'mm')).toBe('11.42 m');
    expect(formatBoardLength(11_420.01, 'mm')).toBe('11.43 m');
    expect(formatBoardLength(86, 'mm')).toBe('0.09 m');
  });

  it('is told in feet to a reader of inches', () => {
    expect(formatBoardLength(304.8, 'in')).toBe('1.0 ft');
    expect(formatBoardLength(305, 'in')).toBe('1.1 ft');
  });

  it('does not round up what only floating point added', () => {
    expect(formatBoardLength(0.1 + 0.2 + 9.7, 'mm')).toBe('0.01 m');
  });
});
