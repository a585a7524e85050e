import { distance } from '@shared/geometry/vector';
import { startingLayout } from '@shared/layout/starting-layout';
import type { Layout } from '@shared/layout/schema';
import { expect, test } from 'vitest';
import { cutterPlace, insideArcs } from './cutter-place';
import { jointFrame } from './joint-frame';
import { jointPicture } from './joint-picture';
import { onScreen, type Mark } from './picture-model';

const layout = startingLayout('Joint');
const size = { width: 800, height: 700 };

function withCutter(diameter: number): Layout {
  return { ...layout, cutter: { ...layout.cutter, diameter } };
}

function textsOf(marks: readonly Mark[]): string[] {
  return marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
}

test('tab and socket face each other on the same middle line, apart by the drawn gap', () => {
  for (const joint of ['staveJoint', 'courseJoint'] as const) {
    const frame = jointFrame(layout, joint, size);
    const [tab, socket] = [frame.tab.view.origin, frame.socket.view.origin];
    const tile = joint === 'courseJoint' ? layout.shell.tileHeight : layout.shell.tileWidth;
    expect(distance(tab, socket)).toBeCloseTo((tile + frame.apart) * frame.pixelsPerMm, 6);
    if (joint === 'courseJoint') expect(tab.x).toBeCloseTo(socket.x, 9);
    else expect(tab.y).toBeCloseTo(socket.y, 9);
  }
});

test('a cutter thin enough stands in the fillet and touches it in one point', () => {
  const { outline } = jointFrame(layout, 'courseJoint', size).tab;
  const index = insideArcs(outline).at(-1) ?? -1;
  const arc = outline.segments[index];
  const place = cutterPlace(outline, index, 3.175);
  expect(place?.room).toBeCloseTo(2.06 - 3.175 / 2, 9);
  expect(arc?.kind).toBe('arc');
  if (arc?.kind !== 'arc' || !place) return;
  expect(distance(arc.centre, place.centre) + 3.175 / 2).toBeCloseTo(arc.radius, 9);
});

test('a cutter too thick for the fillet stands on the shoulder and against the head', () => {
  const { outline } = jointFrame(layout, 'courseJoint', size).tab;
  const arcs = insideArcs(outline);
  const index = arcs.at(-1) ?? -1;
  const place = cutterPlace(outline, index, 6);
  const head = outline.segments[index - 1];
  expect(place?.room).toBeLessThan(0);
  expect(head?.kind).toBe('arc');
  if (head?.kind !== 'arc' || !place) return;
  expect(distance(head.centre, place.centre)).toBeCloseTo(head.radius + 3, 6);
  const shoulder = layout.shell.tileHeight / 2 - layout.joint.clearance / 2;
  expect(place.centre.y - shoulder).toBeCloseTo(3, 6);
});

test('the picture says by how much the cutter clears the fillet, or fails to', () => {
  expect(textsOf(jointPicture(layout, 'courseJoint', 'mm', size).marks)).toContain(
    'clears by 0.47',
  );
  expect(textsOf(jointPicture(withCutter(6), 'courseJoint', 'mm', size).marks)).toContain(
    'too thick by 0.94',
  );
});

test('reach and neck are drawn to scale between the true points', () => {
  const { marks } = jointPicture(layout, 'courseJoint', 'mm', size);
  expect(textsOf(marks)).toEqual(expect.arrayContaining(['reach 8.40', 'neck 7.00']));
});

test('a large tile with a small joint is cut off at the window, not shrunk away', () => {
  const large: Layout = {
    ...layout,
    shell: { ...layout.shell, tileWidth: 200, tileHeight: 200 },
  };
  const frame = jointFrame(large, 'courseJoint', size);
  const tip = frame.point(0, frame.profile.reach);
  const corner = onScreen(frame.tab.view, { x: 100, y: 100 });
  expect(frame.pixelsPerMm).toBeGreaterThan(15);
  expect(corner.x).toBeGreaterThan(size.width);
  expect(tip.y).toBeGreaterThan(0);
});

test('a wave has no mouth: a cutter that fits its arcs gets in, however wide the drawing makes its neck', () => {
  const wave = { profile: 'round', headRadius: 4, filletRadius: 4, reach: 6 } as const;
  const waves = { ...withCutter(8), joint: { ...layout.joint, courseJoint: wave } };
  const { profile } = jointFrame(waves, 'courseJoint', size);
  expect(profile.neck + waves.joint.clearance).toBeLessThan(8);
  expect(textsOf(jointPicture(waves, 'courseJoint', 'mm', size).marks)).not.toContain(
    'cutter does not get in',
  );
});
