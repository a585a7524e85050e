import { startingLayout } from '@shared/layout/starting-layout';
import { ringOf } from '@shared/shell/ring';
import { toRadians } from '@shared/units/angle';
import { expect, test } from 'vitest';
import { faceHeight, jointLensMarks } from './joint-lens';

const layout = startingLayout('Ring');
const { reach } = layout.joint.staveJoint;
const ring = ringOf(layout.shell, reach);
const lens = { centre: { x: 300, y: 300 }, radius: 120 };

test('at the joint both faces are equally high', () => {
  expect(faceHeight(ring, 0, 0, 'left')).toBeCloseTo(faceHeight(ring, 0, 0, 'right'), 12);
  expect(faceHeight(ring, 0, 0, 'left')).toBeCloseTo(ring.acrossCorners / 2, 9);
});

test('a tab stands proud of the next stave by 2 H tan β where it ends', () => {
  const proud = faceHeight(ring, 0, reach, 'left') - faceHeight(ring, 0, reach, 'right');
  expect(proud).toBeCloseTo(2 * reach * Math.tan(toRadians(ring.bevel)), 9);
  expect(proud).toBeCloseTo(ring.tabProud, 9);
});

test('the turned circles under the lens are arcs of the true radii', () => {
  const arcs = jointLensMarks(layout, ring, lens).flatMap((mark) =>
    mark.kind === 'path' && mark.look === 'turned' ? mark.segments : [],
  );
  expect(arcs.map((arc) => arc.kind === 'arc' && arc.radius)).toEqual([112, 103]);
});
