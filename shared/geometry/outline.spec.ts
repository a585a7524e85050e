import { expect, it } from 'vitest';
import { areaOf, boundsOf } from './outline';
import { arc, line, notchedSquare, roundedRectangle, square } from './shapes.fixture';

it('areas are exact, arcs included', () => {
  expect(areaOf(square)).toBe(100);
  expect(areaOf(roundedRectangle)).toBeCloseTo(200 - (4 - Math.PI) * 4, 12);
  expect(areaOf(notchedSquare)).toBeCloseTo(400 - 4.5 * Math.PI, 12);
  expect(areaOf({ segments: [arc(3, -2, 2, 10, 360)] })).toBeCloseTo(4 * Math.PI, 12);
});

it('an outline that runs clockwise has a negative area', () => {
  const turned = { segments: [line(0, 0, 0, 2), line(0, 2, 2, 0), line(2, 0, 0, 0)] };
  expect(areaOf(turned)).toBe(-2);
});

it('the box of an arc holds its extremes, not those of its circle', () => {
  const top = boundsOf([arc(0, 0, 5, 60, 60)]);
  expect(top.maxY).toBeCloseTo(5, 12);
  expect(top.minY).toBeCloseTo(5 * Math.sin(Math.PI / 3), 12);
  expect(top.maxX).toBeCloseTo(2.5, 12);
  expect(boundsOf([arc(0, 0, 5, 90, -180)]).maxX).toBeCloseTo(5, 12);
});
