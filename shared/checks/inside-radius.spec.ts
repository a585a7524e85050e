import { describe, expect, it } from 'vitest';
import { found } from './one-check.fixture';

const round = (filletRadius: number) => ({
  profile: 'round' as const,
  headRadius: 3.6,
  filletRadius,
  reach: 7.2,
});

/** The stave joint's fillet so that it is cut at this radius after a clearance of 0.12 mm. */
const cutAt = (radius: number) => ({ joint: { staveJoint: round(radius - 0.06) } });

describe('the tightest inside radius against half the cutter', () => {
  it('is clear from the finishing margin of 8 % on', () => {
    expect(found('inside-radius', cutAt(1.5875 * 1.08 + 1e-9))).toMatchObject({
      result: 'clear',
      limit: { value: 1.5875, kind: 'length' },
    });
  });

  it('is a caution under it, and still at exactly half the cutter', () => {
    expect(found('inside-radius', cutAt(1.714)).result).toBe('caution');
    expect(found('inside-radius', cutAt(1.5875)).result).toBe('caution');
  });

  it('is a stop under half the cutter', () => {
    expect(found('inside-radius', cutAt(1.587)).result).toBe('stop');
  });

  it('says what it found, what the cutter needs, and which cutter would do', () => {
    const result = found('inside-radius', cutAt(1.4));
    expect(result.finding).toBe(
      'The neck fillet of the stave joint is cut at 1.40 mm; a 3.175 mm cutter needs 1.59 mm.',
    );
    expect(result.remedy).toBe('Widen the neck fillet or take a 2.8 mm cutter.');
    expect(found('inside-radius', cutAt(1.4), { lengthUnit: 'in' }).finding).toBe(
      'The neck fillet of the stave joint is cut at 0.055 in; a 0.125 in cutter needs 0.063 in.',
    );
  });

  it('tells figures apart that would be rounded to the same', () => {
    expect(found('inside-radius', cutAt(1.586)).finding).toBe(
      'The neck fillet of the stave joint is cut at 1.586 mm; a 3.175 mm cutter needs 1.587 mm.',
    );
  });

  it('names the head of a round joint and the root or the tip of a dovetail', () => {
    const head = { ...round(3), headRadius: 1.2, reach: 2.6 };
    expect(found('inside-radius', { joint: { courseJoint: head } }).finding).toMatch(
      /^The head of the course joint is cut at 1\.26 mm/,
    );
    const dovetail = { profile: 'dovetail', rootWidth: 8, flankAngle: 10, reach: 6 } as const;
    const tipped = { ...dovetail, tipRadius: 1, rootRadius: 2 };
    expect(found('inside-radius', { joint: { courseJoint: tipped } }).finding).toMatch(/^The tip /);
    const rooted = { ...dovetail, tipRadius: 2, rootRadius: 1 };
    expect(found('inside-radius', { joint: { courseJoint: rooted } }).finding).toMatch(
      /^The root fillet of the course joint is cut at 1\.06 mm/,
    );
  });
});
