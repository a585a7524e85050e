import { describe, expect, it } from 'vitest';
import { checkContext } from './context';
import { found, lantern } from './one-check.fixture';
import { reachIn } from './reach-in';

/** Wide fillets behind a slim neck: only the mouth is in the cutter's way. */
const slim = { profile: 'round', headRadius: 3.6, filletRadius: 2.4, reach: 10 } as const;
const narrow = { staveJoint: slim, courseJoint: slim };

describe('room for the cutter', () => {
  it('is clear when the mouth is as wide as the cutter, and a stop when it is not', () => {
    const mouth = found('reach-in', { joint: narrow }).figure?.value ?? NaN;
    expect(mouth).toBeLessThan(4.8);
    expect(found('reach-in', { joint: narrow, cutter: { diameter: mouth } }).result).toBe('clear');
    expect(found('reach-in', { joint: narrow, cutter: { diameter: mouth + 0.001 } }).result).toBe(
      'stop',
    );
  });

  it('says how wide the mouth is, and which cutter would do', () => {
    const result = found('reach-in', { joint: narrow, cutter: { diameter: 4.7 } });
    expect(result.result).toBe('stop');
    expect(result.finding).toBe(
      'The narrowest socket mouth, on the stave joint, is 4.26 mm wide; the cutter is 4.7 mm.',
    );
    expect(result.remedy).toBe('Widen the neck, or take a 4.264 mm cutter.');
  });

  it('is a stop when the path crosses itself elsewhere, however wide the mouths', () => {
    const context = checkContext(lantern(), {});
    const fit = { ...context.fit, crossingAt: { x: 0, y: 0 }, largestCutter: 3 };
    const result = reachIn({ ...context, fit });
    expect(result.result).toBe('stop');
    expect(result.finding).toBe(
      'Between two edges of a piece there is less room than a 3.175 mm cutter needs.',
    );
    expect(result.remedy).toBe('Take a larger tile or a shorter reach, or take a 3 mm cutter.');
  });

  it('does not look for a mouth where both joints are waves', () => {
    const wave = { profile: 'round', headRadius: 2, filletRadius: 2, reach: 1 } as const;
    const waves = { joint: { staveJoint: wave, courseJoint: wave } };
    expect(found('reach-in', waves)).toMatchObject({ result: 'clear', figure: null });
  });

  it('does not look at the course joint of a single course', () => {
    const narrowCourse = { courseJoint: slim };
    const single = { shell: { courses: 1, finishedHeight: 26 }, joint: narrowCourse };
    const cutter = { diameter: 4.7 };
    expect(found('reach-in', { joint: narrowCourse, cutter }).result).toBe('stop');
    expect(found('reach-in', { ...single, cutter }).finding).toMatch(/on the stave joint/);
  });
});
