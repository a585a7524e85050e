import { expect, test } from 'vitest';
import { ringsOfStaves, ringsOfWidth, type DiameterWish } from './wished-diameter';

const wish: DiameterWish = {
  outerDiameter: 280,
  wall: 9,
  skimAllowance: 0.5,
  reach: 7.6,
  boardThickness: 14,
  scheme: 'alternating',
};

test('tiles of 28 mm make a 280 mm shell with 32 staves, not with 31', () => {
  const rings = ringsOfWidth(wish, 28);
  expect(rings[0]?.staves).toBe(32);
  expect(rings[0]?.acrossFlats).toBeCloseTo(28 / Math.tan(Math.PI / 32), 9);
  expect(rings[0]?.turnedAway).toBeCloseTo(14 / Math.tan(Math.PI / 32) - 140, 9);
  expect(rings[0]?.play).toBeCloseTo(0, 9);
});

test('each ring offered leaves the skim allowance and a board thick enough', () => {
  for (const ring of [...ringsOfWidth(wish, 40), ...ringsOfStaves(wish, 25)]) {
    expect(ring.turnedAway).toBeGreaterThanOrEqual(wish.skimAllowance - 1e-9);
    expect(ring.boardThickness).toBeGreaterThanOrEqual(ring.boardLeast);
    expect(ring.boardThickness).toBeGreaterThanOrEqual(wish.boardThickness);
  }
});

test('alternating tabs are offered even rings only, tabs one way all of them', () => {
  const staves = (scheme: DiameterWish['scheme']) =>
    ringsOfWidth({ ...wish, scheme }, 28).map((ring) => ring.staves);
  expect(staves('alternating')).toEqual([32, 34, 36, 38, 40]);
  expect(staves('one-way')).toEqual([32, 33, 34, 35, 36]);
});

test('a number of staves gets the narrowest tile in half millimetres', () => {
  const rings = ringsOfStaves(wish, 32);
  expect(rings.map((ring) => ring.tileWidth)).toEqual([28, 28.5, 29, 29.5, 30]);
});

test('a diameter that no accepted ring reaches is offered nothing', () => {
  expect(ringsOfWidth({ ...wish, outerDiameter: 25_000 }, 28)).toEqual([]);
});

test('a wall that leaves no bore beyond the tabs is offered nothing', () => {
  expect(ringsOfWidth({ ...wish, outerDiameter: 60, wall: 25 }, 28)).toEqual([]);
});
