import { describe, expect, it } from 'vitest';
import { offsetChain, offsetOutline, type OffsetResult } from './offset';
import { areaOf, type Outline } from './outline';
import { arc, line, notchedSquare, roundedRectangle, square } from './shapes.fixture';

function areaAt(outline: Outline, outward: number): number {
  const result = offsetOutline(outline, outward);
  if (!result.ok) throw new Error(`${result.reason} at ${result.at.x}, ${result.at.y}`);
  return areaOf(result.outline);
}

function failure(result: OffsetResult): string {
  return result.ok ? 'none' : result.reason;
}

describe('a 20 × 20 square with a semicircular notch of radius 3 (closed forms)', () => {
  const { PI, sqrt, acos } = Math;

  it.each([0, 1, 2, 3])('grows by %d mm: corners round off, the notch narrows', (d) => {
    const exact =
      d === 0
        ? 400 - 4.5 * PI
        : 400 + 80 * d + PI * d ** 2 - (6 * d - (PI * d ** 2) / 2) - (PI * (3 - d) ** 2) / 2;
    expect(areaAt(notchedSquare, d)).toBeCloseTo(exact, 9);
  });

  it.each([1, 2, 3])('shrinks by %d mm: corners stay sharp, the notch widens', (d) => {
    const radius = 3 + d;
    const segment = radius ** 2 * acos(d / radius) - d * sqrt(radius ** 2 - d ** 2);
    expect(areaAt(notchedSquare, -d)).toBeCloseTo((20 - 2 * d) ** 2 - segment, 9);
  });

  it('names the notch when it is asked to close it', () => {
    const result = offsetOutline(notchedSquare, 3.1);
    expect(result).toMatchObject({ ok: false, reason: 'arc-collapses', at: { y: 7 } });
  });
});

describe('a 20 × 10 rectangle with corners of radius 2 (A + P d + π d²)', () => {
  it.each([0.5, 1, 4])('grows by %d mm', (d) => {
    const [area, girth] = [196.566370614, 56.566370614];
    expect(areaAt(roundedRectangle, d)).toBeCloseTo(area + girth * d + Math.PI * d ** 2, 6);
  });

  it('comes back to itself', () => {
    const out = offsetOutline(roundedRectangle, 1.5);
    expect(out.ok && areaAt(out.outline, -1.5)).toBeCloseTo(areaOf(roundedRectangle), 9);
  });

  it('has no inside left when its corners shrink by more than their radius', () => {
    expect(failure(offsetOutline(roundedRectangle, -2.5))).toBe('arc-collapses');
  });
});

describe('a chain that would run over itself', () => {
  const slot: Outline = {
    segments: [
      line(-10, -10, 10, -10),
      line(10, -10, 10, 10),
      line(10, 10, 2, 10),
      line(2, 10, 2, 0),
      line(2, 0, -2, 0),
      line(-2, 0, -2, 10),
      line(-2, 10, -10, 10),
      line(-10, 10, -10, -10),
    ],
  };

  it('crosses itself when a slot 4 mm wide grows by more than 2 mm', () => {
    expect(failure(offsetOutline(slot, 1.9))).toBe('none');
    expect(failure(offsetOutline(slot, 2.1))).toBe('crosses-itself');
  });

  it('only touches itself at exactly 2 mm, which is still free', () => {
    expect(failure(offsetOutline(slot, 2))).toBe('none');
  });
});

describe('an open chain', () => {
  it('loses an outside arc smaller than the distance and meets in a sharp corner', () => {
    const chain = [line(0, 0, 9, 0), arc(9, 1, 1, -90, 90), line(10, 1, 10, 10)];
    const moved = offsetChain(chain, -2);
    expect(moved).toEqual([line(0, 2, 8, 2), line(8, 2, 8, 10)]);
  });

  it('keeps the centre of an inside arc and widens its radius', () => {
    const chain = [line(0, 0, 9, 0), arc(9, -1, 1, 90, -90), line(10, -1, 10, -10)];
    const moved = offsetChain(chain, -2);
    expect(moved?.[1]).toMatchObject({ centre: { x: 9, y: -1 }, radius: 3 });
  });

  it('is refused when neighbours that should meet never do', () => {
    const chain = [line(0, 0, 9, 0), arc(9, 1, 1, -90, 180), line(9, 2, 0, 2)];
    expect(offsetChain(chain, -2)).toBeNull();
  });
});

it('a square grows at its corners on arcs about them', () => {
  const result = offsetOutline(square, 1);
  expect(result.ok && result.outline.segments.filter(({ kind }) => kind === 'arc')).toHaveLength(4);
});
