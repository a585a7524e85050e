import { startingLayout } from '@shared/layout/starting-layout';
import { ringOf } from '@shared/shell/ring';
import { expect, test } from 'vitest';
import { facingStaves, heightPicture } from './height-picture';
import { onScreen } from './picture-model';
import { ringPicture, staveCorners } from './ring-picture';
import { staveSection } from './stave-picture';

const layout = startingLayout('Ring');
const ring = ringOf(layout.shell, layout.joint.staveJoint.reach);
const size = { width: 820, height: 540 };

test('staves close round the ring, counter-clockwise from the seam towards the reader', () => {
  const first = staveCorners(layout, ring, 0);
  const last = staveCorners(layout, ring, layout.shell.staves - 1);
  expect(first[0]?.x).toBeCloseTo(0, 9);
  expect(first[0]?.y).toBeCloseTo(-ring.acrossCorners / 2, 9);
  expect(first[1]?.x).toBeGreaterThan(0);
  expect(last[1]?.x).toBeCloseTo(first[0]?.x ?? NaN, 9);
});

test('a stave is as wide outside as its tile and as thick as its board', () => {
  const [inner, , outerRight, outerLeft] = staveSection(layout, ring);
  expect((outerRight?.x ?? 0) - (outerLeft?.x ?? 0)).toBeCloseTo(layout.shell.tileWidth, 9);
  expect((outerLeft?.y ?? 0) - (inner?.y ?? 0)).toBeCloseTo(layout.shell.boardThickness, 9);
});

test('the turned circles are drawn to the scale of the staves, within the picture', () => {
  const { marks } = ringPicture(layout, 'mm', size);
  const circles = marks.filter((mark) => mark.kind === 'circle');
  expect(circles.map((circle) => circle.look)).toEqual(['turned', 'turned']);
  const [outer, inner] = circles.map((circle) => circle.radius);
  expect((outer ?? 0) / (inner ?? 1)).toBeCloseTo(224 / 206, 9);
  const stave = marks.find((mark) => mark.kind === 'path');
  const corner = stave && onScreen(stave.view, { x: ring.acrossCorners / 2, y: 0 });
  expect(corner?.x).toBeLessThan(size.width);
  expect((outer ?? 0) / ((corner?.x ?? 0) - (stave?.view.origin.x ?? 0))).toBeCloseTo(
    224 / ring.acrossCorners,
    9,
  );
});

test('the picture tells its figures to those who do not see it, in the reader’s unit', () => {
  expect(ringPicture(layout, 'in', size).title).toContain('8.819 in');
});

test('from the side one sees half the staves, in order from left to right', () => {
  const facing = facingStaves(24, 100).sort((a, b) => a.from - b.from);
  expect(facing.map(({ stave }) => stave)).toEqual([18, 19, 20, 21, 22, 23, 0, 1, 2, 3, 4, 5]);
});

test('trim lines lie at the ends of the finished height', () => {
  const trims = heightPicture(layout, 'mm', { width: 400, height: 210 }).marks.flatMap((mark) =>
    mark.kind === 'line' && mark.look === 'trim' ? [mark.from.y] : [],
  );
  const whole = heightPicture(layout, 'mm', { width: 400, height: 210 });
  const scale = whole.marks.find((mark) => mark.kind === 'path')?.view.pixelsPerMm ?? NaN;
  expect((trims[0] ?? 0) - (trims[1] ?? 0)).toBeCloseTo(228 * scale, 9);
});
