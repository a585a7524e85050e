import { describe, expect, it } from 'vitest';
import { grainColour, grainOf } from './grain';

describe('grain', () => {
  it('the same colour always has the same grain, however it is written', () => {
    expect(grainOf('#dcc39a')).toEqual(grainOf('#DCC39A'));
  });

  it('two woods do not share their grain', () => {
    expect(grainOf('#DCC39A')).not.toEqual(grainOf('#5B3A29'));
  });

  it('no line reaches over the edge of the strip', () => {
    for (const line of grainOf('#A34B33')) {
      expect(line.at - line.width / 2).toBeGreaterThanOrEqual(0);
      expect(line.at + line.width / 2).toBeLessThanOrEqual(1);
    }
  });

  it('a line darkens with black and lightens with white', () => {
    expect(grainColour({ at: 0.5, width: 0.01, depth: 0.1 })).toBe('rgb(0 0 0 / 10.0%)');
    expect(grainColour({ at: 0.5, width: 0.01, depth: -0.05 })).toBe('rgb(255 255 255 / 5.0%)');
  });
});
