import { describe, expect, it } from 'vitest';
import { selfCrossing } from './crossing';
import { arc, line, notchedSquare, roundedRectangle, square } from './shapes.fixture';

describe('a chain that crosses itself', () => {
  it('is found where two of its lines cross', () => {
    const bow = [line(0, 0, 4, 4), line(4, 4, 4, 0), line(4, 0, 0, 4), line(0, 4, 0, 0)];
    expect(selfCrossing(bow)).toEqual({ x: 2, y: 2 });
  });

  it('is found where an arc bulges through a line', () => {
    const bulged = [
      line(0, 0, 10, 0),
      line(10, 0, 10, 4),
      line(10, 4, 8, 4),
      arc(5, 4, 3, 0, -180),
      line(2, 4, 0, 4),
      line(0, 4, 0, 0),
    ];
    expect(selfCrossing(bulged)).toBeNull();
    const deeper = bulged.map((segment) =>
      segment.kind === 'arc' ? arc(5, 0, 5, 53.13, -286.26) : segment,
    );
    expect(selfCrossing(deeper)).not.toBeNull();
  });

  it('is not found in outlines that close', () => {
    for (const { segments } of [square, notchedSquare, roundedRectangle]) {
      expect(selfCrossing(segments)).toBeNull();
    }
  });
});

describe('a chain that only touches itself', () => {
  const hourglass = (waist: number) =>
    [
      line(-6, -6, 6, -6),
      arc(6, 0, 6, -90, -90),
      arc(6, 0, 6, 180, -90),
      line(6, 6, -6, 6),
      arc(-6, 0, 6, 90, -90),
      arc(-6, 0, 6, 0, -90),
    ].map((segment) =>
      segment.kind === 'arc'
        ? { ...segment, centre: { x: Math.sign(segment.centre.x) * (6 + waist), y: 0 } }
        : segment,
    );

  it('is free at two arcs that meet in one point', () => {
    expect(selfCrossing(hourglass(0))).toBeNull();
  });

  it('is not free once they overlap by a thousandth', () => {
    expect(selfCrossing(hourglass(-0.001))).not.toBeNull();
  });
});
