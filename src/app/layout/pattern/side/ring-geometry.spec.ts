import { describe, expect, it } from 'vitest';
import { arcPath, staveAngle, stavesTurned } from './ring-geometry';

describe('the ring seen from above', () => {
  it('has the seam at the top and runs against the clock', () => {
    expect(staveAngle(0, 32)).toBeCloseTo(-Math.PI / 2);
    const eighth = staveAngle(4, 32);
    expect(Math.cos(eighth)).toBeLessThan(0);
    expect(Math.sin(eighth)).toBeLessThan(0);
  });

  it('turns by a quarter from the top to the left', () => {
    expect(stavesTurned({ x: 0, y: -10 }, { x: -10, y: 0 })).toBeCloseTo(0.25);
    expect(stavesTurned({ x: 0, y: -10 }, { x: 10, y: 0 })).toBeCloseTo(-0.25);
  });

  it('takes the short way where the angle begins anew', () => {
    expect(stavesTurned({ x: -10, y: 1 }, { x: -10, y: -1 })).toBeCloseTo(-0.0317, 3);
  });

  it('draws the long way round for more than half the ring', () => {
    expect(arcPath(staveAngle(0, 32), staveAngle(24, 32), 10)).toBe(
      'M0.00 -10.00A10 10 0 1 0 10.00 0.00',
    );
  });
});
