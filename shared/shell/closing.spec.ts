import { describe, expect, it } from 'vitest';
import { assemblyOrder, closingOf, playNeeded } from './closing';

describe('a ring of 25 staves cannot close without play', () => {
  const closing = closingOf({ staves: 25, boardThickness: 12 });

  it('needs t · tan(90°/N) = 0.755 mm over 12 mm (worked example)', () => {
    expect(closing.play).toBeCloseTo(0.755, 3);
    expect(closing.play).toBeCloseTo(12 * Math.tan(Math.PI / 50), 12);
  });

  it('is built as 12 staves against 13, dry at 12 | 13 and at the seam', () => {
    expect(closing.parts).toEqual([
      { from: 1, to: 12 },
      { from: 13, to: 25 },
    ]);
    expect(closing.dryJoints).toEqual([
      [12, 13],
      [25, 1],
    ]);
  });

  it('has no better split than the nearly equal one', () => {
    const plays = Array.from({ length: 24 }, (_, i) => playNeeded(25, i + 1, 12));
    expect(Math.min(...plays)).toBeCloseTo(closing.play, 12);
  });
});

it('a ring of 40 staves closes as two halves of 20 with no play', () => {
  const closing = closingOf({ staves: 40, boardThickness: 12 });
  expect(closing.play).toBe(0);
  expect(closing.parts.map(({ from, to }) => to - from + 1)).toEqual([20, 20]);
});

it('the last stave alone would need far more play than two halves', () => {
  expect(playNeeded(40, 1, 12)).toBeGreaterThan(100);
});

it('both parts are glued first, tried dry together, and closed at once', () => {
  const order = assemblyOrder(closingOf({ staves: 8, boardThickness: 12 }));
  expect(order).toEqual([
    { kind: 'glue-part', staves: { from: 1, to: 4 } },
    { kind: 'glue-part', staves: { from: 5, to: 8 } },
    { kind: 'dry-fit', staves: { from: 1, to: 8 } },
    { kind: 'close', staves: { from: 1, to: 8 } },
  ]);
});
