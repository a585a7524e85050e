/** The shell from the side before turning: the courses, and what the two trim lines take off. */
import { cellAt } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import { ringOf } from '@shared/shell/ring';
import { trimOf } from '@shared/shell/trim';
import { toRadians } from '@shared/units/angle';
import { formatLength, formatLengthFigure } from '@shared/units/format';
import type { LengthUnit, Millimetres } from '@shared/units/length';
import { uprightDimension } from './dimension';
import {
  onScreen,
  polygon,
  type Mark,
  type Picture,
  type PixelSize,
  type View,
} from './picture-model';

/** More tiles than this are drawn as plain courses: one could not tell them apart at this size. */
const TILES_DRAWN_MOST = 1_600;

/** The staves that face the reader, each with its left and right edge as seen from the side. */
export function facingStaves(
  staves: number,
  corner: Millimetres,
): { stave: number; from: Millimetres; to: Millimetres }[] {
  const beta = toRadians(180 / staves);
  return Array.from({ length: staves }, (_, stave) => {
    const turn = 2 * stave * beta;
    return { stave, from: corner * Math.sin(turn), to: corner * Math.sin(turn + 2 * beta) };
  }).filter(({ from, to }) => to - from > 1e-9);
}

/** The picture of heights and trim. */
export function heightPicture(layout: Layout, unit: LengthUnit, size: PixelSize): Picture {
  const ring = ringOf(layout.shell, layout.joint.staveJoint.reach);
  const trim = trimOf(layout.shell);
  const pixelsPerMm = Math.max(
    0.01,
    Math.min((size.width - 150) / ring.acrossCorners, (size.height - 48) / trim.untrimmedHeight),
  );
  const view = {
    pixelsPerMm,
    origin: { x: size.width / 2, y: (size.height + trim.untrimmedHeight * pixelsPerMm) / 2 },
  };
  const half = ring.acrossCorners / 2;
  return {
    title:
      `The shell from the side: ${layout.shell.courses} courses make ` +
      `${formatLength(trim.untrimmedHeight, unit)}, trimmed to ` +
      `${formatLength(layout.shell.finishedHeight, unit)}.`,
    caption: 'From the side, with the trim lines',
    marks: [
      ...tileMarks(layout, half, view),
      ...trimMarks(trim.lower, trim.upper, half, view),
      ...heightMarks(layout, trim.lower, trim.upper, half, view, unit),
    ],
  };
}

function tileMarks(layout: Layout, corner: Millimetres, view: View): Mark[] {
  const { staves, courses, tileHeight } = layout.shell;
  const facing = facingStaves(staves, corner);
  const plain = facing.length * courses > TILES_DRAWN_MOST;
  const across = plain ? [{ stave: 0, from: -corner, to: corner }] : facing;
  return across.flatMap(({ stave, from, to }) =>
    Array.from({ length: courses }, (_, course): Mark => {
      const wood = layout.woods[layout.cells[cellAt(layout.shell, stave, course)] ?? 0];
      const [bottom, top] = [course * tileHeight, (course + 1) * tileHeight];
      return {
        kind: 'path',
        segments: polygon([
          { x: from, y: bottom },
          { x: to, y: bottom },
          { x: to, y: top },
          { x: from, y: top },
        ]),
        view,
        look: 'wood',
        wood: { colour: wood?.colour ?? '#C8B08A', grain: null },
      };
    }),
  );
}

function trimMarks(lower: Millimetres, upper: Millimetres, half: Millimetres, view: View): Mark[] {
  return [lower, upper].map((height) => ({
    kind: 'line',
    from: onScreen(view, { x: -half - 10 / view.pixelsPerMm, y: height }),
    to: onScreen(view, { x: half + 10 / view.pixelsPerMm, y: height }),
    look: 'trim',
  }));
}

function heightMarks(
  layout: Layout,
  lower: Millimetres,
  upper: Millimetres,
  half: Millimetres,
  view: View,
  unit: LengthUnit,
): Mark[] {
  const right = onScreen(view, { x: half, y: lower });
  const left = onScreen(view, { x: -half, y: lower });
  const whole = onScreen(view, { x: -half, y: layout.shell.courses * layout.shell.tileHeight });
  return [
    ...uprightDimension(
      { x: right.x + 26, y: right.y },
      onScreen(view, { x: 0, y: upper }).y,
      formatLengthFigure(layout.shell.finishedHeight, unit),
    ),
    ...uprightDimension(
      { x: left.x - 24, y: view.origin.y },
      whole.y,
      formatLengthFigure(layout.shell.courses * layout.shell.tileHeight, unit),
      'left',
    ),
  ];
}
