/** The ring from above: every stave with its own wood, the turned circles, and a joint under the lens. */
import { cellAt, courseLetters } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import { ringOf, type Ring } from '@shared/shell/ring';
import { toRadians } from '@shared/units/angle';
import { formatLength, formatLengthFigure } from '@shared/units/format';
import type { LengthUnit, PointMm } from '@shared/units/length';
import { levelDimension } from './dimension';
import { jointLensMarks } from './joint-lens';
import {
  circleMark,
  onScreen,
  polygon,
  type Mark,
  type Picture,
  type PixelSize,
  type View,
} from './picture-model';

/** The picture of a layout that holds together. */
export function ringPicture(layout: Layout, unit: LengthUnit, size: PixelSize): Picture {
  const ring = ringOf(layout.shell, layout.joint.staveJoint.reach);
  const place = placeOf(ring, size);
  const lens = {
    centre: {
      x: place.view.origin.x + place.radius * 1.06,
      y: place.view.origin.y + place.radius * 0.66,
    },
    radius: place.radius * 0.56,
  };
  return {
    title: titleOf(layout, ring, unit),
    caption: `From above at course ${courseLetters(courseShown(layout))}; a tab of the stave joint under the lens`,
    marks: [
      ...staveMarks(layout, ring, place.view),
      ...turnedMarks(layout, place.view),
      ...seamMarks(ring, place.view),
      ...diameterMarks(layout, place.view, unit),
      { kind: 'lens', ...lens, marks: jointLensMarks(layout, ring, lens) },
      ...proudWords(ring, lens, size, unit),
    ],
  };
}

/** Pictures narrower than this have their words set in short lines, in pixels. */
const NARROW = 560;

interface Place {
  readonly view: View;
  /** Of the corners, in pixels. */
  readonly radius: number;
}

function placeOf(ring: Ring, { width, height }: PixelSize): Place {
  const radius = Math.max(20, Math.min((width - 40) / 2.62, (height - 44) / 2.28));
  const view = {
    pixelsPerMm: radius / (ring.acrossCorners / 2),
    origin: { x: width / 2 - radius * 0.31, y: 14 + radius },
  };
  return { view, radius };
}

function titleOf(layout: Layout, ring: Ring, unit: LengthUnit): string {
  const { staves, finishedOuterDiameter, finishedInnerDiameter } = layout.shell;
  return (
    `The ring from above: ${staves} staves, ${formatLength(ring.acrossFlats, unit)} across the flats, ` +
    `turned outside to ${formatLength(finishedOuterDiameter, unit)} and ` +
    `bored to ${formatLength(finishedInnerDiameter, unit)}.`
  );
}

/** Corners of a stave seen from above; staves run counter-clockwise from the seam, which faces the reader. */
export function staveCorners(layout: Layout, ring: Ring, stave: number): PointMm[] {
  const beta = toRadians(ring.bevel);
  const middle = -Math.PI / 2 + (2 * stave + 1) * beta;
  const inner = ring.apothem - layout.shell.boardThickness;
  const corner = (apothem: number, side: -1 | 1): PointMm => ({
    x: (apothem / Math.cos(beta)) * Math.cos(middle + side * beta),
    y: (apothem / Math.cos(beta)) * Math.sin(middle + side * beta),
  });
  return [corner(ring.apothem, -1), corner(ring.apothem, 1), corner(inner, 1), corner(inner, -1)];
}

/** The course whose woods the ring is drawn in: halfway up. */
function courseShown({ shell }: Layout): number {
  return Math.floor(shell.courses / 2);
}

function staveMarks(layout: Layout, ring: Ring, view: View): Mark[] {
  const { staves } = layout.shell;
  const course = courseShown(layout);
  return Array.from({ length: staves }, (_, stave) => {
    const wood = layout.woods[layout.cells[cellAt(layout.shell, stave, course)] ?? 0];
    return {
      kind: 'path',
      segments: polygon(staveCorners(layout, ring, stave)),
      view,
      look: 'wood',
      wood: { colour: wood?.colour ?? '#C8B08A', grain: null },
    };
  });
}

function turnedMarks({ shell }: Layout, view: View): Mark[] {
  const centre = { x: 0, y: 0 };
  return [
    circleMark(view, centre, shell.finishedOuterDiameter / 2, 'turned'),
    circleMark(view, centre, shell.finishedInnerDiameter / 2, 'turned'),
  ];
}

function seamMarks(ring: Ring, view: View): Mark[] {
  const foot = onScreen(view, { x: 0, y: -ring.acrossCorners / 2 });
  return [
    {
      kind: 'line',
      from: { x: foot.x, y: foot.y - 26 },
      to: { x: foot.x, y: foot.y + 8 },
      look: 'seam',
    },
    {
      kind: 'text',
      at: { x: foot.x, y: foot.y + 18 },
      text: 'seam',
      anchor: 'middle',
      look: 'teal',
    },
  ];
}

function diameterMarks({ shell }: Layout, view: View, unit: LengthUnit): Mark[] {
  const radius = shell.finishedOuterDiameter / 2;
  const from = onScreen(view, { x: -radius, y: 0 });
  const to = onScreen(view, { x: radius, y: 0 });
  const text = `⌀ ${formatLengthFigure(shell.finishedOuterDiameter, unit)}`;
  return [
    ...levelDimension(from, to.x, text, 'in-line'),
    {
      kind: 'text',
      at: { x: view.origin.x, y: view.origin.y + 40 },
      text: 'dashed: turned circles',
      anchor: 'middle',
      look: 'teal',
    },
  ];
}

function proudWords(
  ring: Ring,
  lens: { centre: { x: number; y: number }; radius: number },
  size: PixelSize,
  unit: LengthUnit,
): Mark[] {
  const stands = `the tab stands ${formatLength(ring.tabProud, unit)}`;
  const lines =
    size.width < NARROW
      ? [stands, 'proud outside, and lies', 'as much higher inside']
      : [`${stands} proud outside`, 'and lies as much higher inside'];
  const x = Math.max(8, lens.centre.x - lens.radius - 14);
  return lines.map((text, i) => ({
    kind: 'text',
    at: { x, y: size.height - 12 - (lines.length - 1 - i) * 18 },
    text,
    anchor: 'end',
    look: 'label',
  }));
}
