/** Facts of the trade: common practice, no source. */
import { describe, expect, it } from 'vitest';
import { arc, line } from '@shared/geometry/shapes.fixture';
import { cutterFit } from '@shared/joint/cutter-fit';
import type { Layout } from '@shared/layout/schema';
import { smallLayout } from '@shared/layout/small-layout.fixture';
import { cutList } from '@shared/pieces/cut-list';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { cuttingTime } from '@shared/pieces/time';
import { ringOf } from '@shared/shell/ring';
import { trimOf } from '@shared/shell/trim';
import { formatLength } from '@shared/units/format';
import { fromMillimetres, toMillimetres } from '@shared/units/length';

const inches = (figure: number) => toMillimetres(figure, 'in');

describe('40 staves of 1.1 in (common practice, no source)', () => {
  const ring = ringOf(
    {
      staves: 40,
      tileWidth: inches(1.1),
      finishedOuterDiameter: inches(13.875),
      finishedInnerDiameter: inches(13.125),
      skimAllowance: 0,
    },
    0,
  );

  it('have their edges cut at 4.5°, and each joint turns 9°', () => {
    expect(ring.bevel).toBe(4.5);
    expect(ring.jointTurn).toBe(9);
  });

  it('measure 44 in round: a nominal 14 in shell', () => {
    expect(formatLength(ring.girth, 'in')).toBe('44.000 in');
    expect(Math.round(fromMillimetres(ring.acrossFlats, 'in'))).toBe(14);
  });
});

it('8 courses of 1.1 in for an 8 in shell lose 0.4 in at each end (common practice, no source)', () => {
  const trim = trimOf({ courses: 8, tileHeight: inches(1.1), finishedHeight: inches(8) });
  expect(formatLength(trim.eachEnd, 'in')).toBe('0.400 in');
});

/** Two woods in a checker, tabs alternating. */
function checker(staves: number, courses: number): Layout {
  const layout = smallLayout();
  const cells = new Uint8Array(staves * courses);
  cells.forEach((_, i) => (cells[i] = (Math.floor(i / staves) + (i % staves)) % 2));
  return { ...layout, shell: { ...layout.shell, staves, courses }, cells };
}

it('a checker of two woods on 40 × 8 is cut as four piece kinds (common practice, no source)', () => {
  const kinds = pieceKinds(checker(40, 8));
  const counts = kinds.map(({ wood, count }) => [wood, count]);
  expect(counts).toEqual([
    [0, 40],
    [0, 120],
    [1, 40],
    [1, 120],
  ]);
  expect(cutList(checker(40, 8)).tiles).toBe(320);
});

it('320 blanks at 2 minutes and 40 staves at 16 take 640 and 640 (common practice, no source)', () => {
  const time = cuttingTime({ blanks: 320, minutesPerBlank: 2, staves: 40, minutesPerStave: 16 });
  expect(time).toEqual({ blanks: 640, staveEdges: 640, total: 1280 });
});

it('a 1/8 in cutter fits no inside radius under 1/16 in (common practice, no source)', () => {
  const notched = (radius: number) => ({
    segments: [
      line(-10, -10, 10, -10),
      line(10, -10, 10, 10),
      line(10, 10, radius, 10),
      arc(0, 10, radius, 0, -180),
      line(-radius, 10, -10, 10),
      line(-10, 10, -10, -10),
    ],
  });
  expect(cutterFit(notched(inches(1 / 16)), inches(1 / 8)).fits).toBe(true);
  expect(cutterFit(notched(inches(0.0624)), inches(1 / 8)).fits).toBe(false);
});
