import { describe, expect, it } from 'vitest';
import { ringOf, type RingSizes } from './ring';

/** N 40, apothem 6.95, bore 13, no skim: worked example, checked numerically; any unit, since all scale. */
const worked: RingSizes = {
  staves: 40,
  tileWidth: 2 * 6.95 * Math.tan(Math.PI / 40),
  finishedOuterDiameter: 13.8,
  finishedInnerDiameter: 13,
  skimAllowance: 0,
};

describe('40 staves, apothem 6.95, bored to 6.5, tabs of 0.3 (worked example)', () => {
  const ring = ringOf(worked, 0.3);

  it('cuts its edges at 4.5° and turns 9° at each joint', () => {
    expect(ring.bevel).toBe(4.5);
    expect(ring.jointTurn).toBe(9);
  });

  it('asks for a board of 0.500480, of which the tabs ask for 0.030443', () => {
    expect(ring.boardLeast).toBeCloseTo(0.50048, 6);
    expect(ring.boardLeastWithoutTabs).toBeCloseTo(0.470037, 6);
    expect(ring.boardLeastWithoutTabs).toBeCloseTo(6.95 - 6.5 * Math.cos(Math.PI / 40), 12);
  });

  it('has tabs that stand 0.047221 proud before turning', () => {
    expect(ring.tabProud).toBeCloseTo(0.047221, 6);
  });

  it('is half a tile and the tab wide on the blank, over the cosine of the bevel', () => {
    const halfTile = worked.tileWidth / 2;
    expect(ring.blankHalfWidthLeast).toBeCloseTo(halfTile + 0.3 / Math.cos(Math.PI / 40), 12);
  });

  it('is turned down by the apothem less the finished radius', () => {
    expect(ring.turnedAway).toBeCloseTo(0.05, 12);
    expect(ring.wall).toBeCloseTo(0.4, 12);
  });
});

it('the far end of a tab on the inner face just reaches the bored circle less the skim', () => {
  const [sizes, reach, beta] = [{ ...worked, skimAllowance: 0.02 }, 0.3, Math.PI / 40];
  const { boardLeast, apothem } = ringOf(sizes, reach);
  // the tab's end lies `reach` square off the joint's radial line, on the inner face of its own stave
  const alongJoint = (apothem - boardLeast + reach * Math.sin(beta)) / Math.cos(beta);
  expect(Math.hypot(alongJoint, reach)).toBeCloseTo(6.5 - 0.02, 9);
});
