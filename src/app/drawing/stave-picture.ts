/** One stave in section: the board, its bevels, and what turning leaves of it. */
import type { ArcSegment } from '@shared/geometry/segment';
import type { Layout } from '@shared/layout/schema';
import { ringOf, type Ring } from '@shared/shell/ring';
import { toRadians } from '@shared/units/angle';
import { formatAngle, formatLength, formatLengthFigure } from '@shared/units/format';
import type { LengthUnit, PointMm } from '@shared/units/length';
import { levelDimension, uprightDimension } from './dimension';
import {
  onScreen,
  polygon,
  type Mark,
  type Picture,
  type PixelSize,
  type View,
} from './picture-model';

/** Corners of the section, y towards the outside of the shell, the axis at the origin. */
export function staveSection(layout: Layout, ring: Ring): PointMm[] {
  const slope = Math.tan(toRadians(ring.bevel));
  const inner = ring.apothem - layout.shell.boardThickness;
  const at = (y: number, side: -1 | 1) => ({ x: side * y * slope, y });
  return [at(inner, -1), at(inner, 1), at(ring.apothem, 1), at(ring.apothem, -1)];
}

/** The picture of one stave in section. */
export function stavePicture(layout: Layout, unit: LengthUnit, size: PixelSize): Picture {
  const ring = ringOf(layout.shell, layout.joint.staveJoint.reach);
  const { boardThickness, tileWidth } = layout.shell;
  const pixelsPerMm = Math.max(
    0.1,
    Math.min((size.width - 150) / tileWidth, (size.height - 104) / boardThickness),
  );
  const top = (size.height - boardThickness * pixelsPerMm) / 2 + 6;
  const view = {
    pixelsPerMm,
    origin: { x: size.width / 2, y: top + ring.apothem * pixelsPerMm },
  };
  const colour = layout.woods[0]?.colour ?? '#C8B08A';
  const section = staveSection(layout, ring);
  return {
    title:
      `One stave in section: ${formatLength(tileWidth, unit)} wide outside, a board of ` +
      `${formatLength(boardThickness, unit)}, each edge bevelled ${formatAngle(ring.bevel)}.`,
    caption: 'One stave in section',
    marks: [
      {
        kind: 'path',
        segments: polygon(section),
        view,
        look: 'wood',
        wood: { colour, grain: null },
      },
      ...turnedArcs(layout, ring, view),
      ...sizeMarks(layout, ring, view, unit),
    ],
  };
}

function turnedArcs({ shell }: Layout, ring: Ring, view: View): Mark[] {
  const half = toRadians(ring.bevel) * 1.25;
  return [shell.finishedOuterDiameter, shell.finishedInnerDiameter].map((diameter) => {
    const arc: ArcSegment = {
      kind: 'arc',
      centre: { x: 0, y: 0 },
      radius: diameter / 2,
      startAngle: Math.PI / 2 - half,
      sweep: 2 * half,
    };
    return { kind: 'path', segments: [arc], view, look: 'turned' };
  });
}

function sizeMarks(layout: Layout, ring: Ring, view: View, unit: LengthUnit): Mark[] {
  const { boardThickness, tileWidth } = layout.shell;
  const left = onScreen(view, { x: -tileWidth / 2, y: ring.apothem });
  const right = onScreen(view, { x: tileWidth / 2, y: ring.apothem });
  const foot = left.y + boardThickness * view.pixelsPerMm;
  const bevel: Mark = {
    kind: 'text',
    at: { x: view.origin.x, y: foot + 26 },
    text: `edges bevelled ${formatAngle(ring.bevel)}`,
    anchor: 'middle',
    look: 'label',
  };
  return [
    ...levelDimension({ x: left.x, y: left.y - 20 }, right.x, formatLengthFigure(tileWidth, unit)),
    ...uprightDimension(
      { x: left.x - 22, y: foot },
      left.y,
      formatLengthFigure(boardThickness, unit),
      'left',
    ),
    bevel,
  ];
}
