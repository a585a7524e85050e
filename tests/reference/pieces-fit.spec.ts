/**
 * The pieces of a bundle fit together: DXF files read by dxf-parser, laid in their places as their manifest
 * says and measured with @flatten-js/core, which has true arcs. Neighbours never overlap, and between them
 * is the clearance.
 */
import flatten from '@flatten-js/core';
import DxfParser from 'dxf-parser';
import { describe, expect, it } from 'vitest';
import { buildBundle, type Bundle } from '@exports/bundle';
import { tileOf } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import type { PieceKind } from '@shared/pieces/piece-kind';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { dxfVertices, type DxfPoint } from './dxf-parser-reading';
import { fixtureLayout } from './fixtures';

const FIXTURES = [
  'ferry-hall-lantern.json',
  'two-woods-in-a-checker.json',
  'one-way-of-25-staves.json',
];

function bundleOf(layout: Layout): Bundle {
  const override = { who: 'the tests', reason: 'to lay the pieces out' };
  const options = { dxf: 'r2000', unit: 'mm', centrePath: false, version: null, override } as const;
  const result = buildBundle(layout, options);
  if (!result.ok) throw new Error('stopped in spite of an override');
  return result.bundle;
}

/** The parts of the bundle in the order of the kinds, as points and bulges. */
function partsOf(bundle: Bundle): DxfPoint[][] {
  return bundle.files
    .filter((file) => file.path.endsWith('.dxf'))
    .map((file) => dxfVertices(new DxfParser().parseSync(file.text)));
}

/** A tile's piece in its place: turned over and by half a turn as its kind says, then moved. */
function placed(layout: Layout, kinds: PieceKind[], parts: DxfPoint[][], position: number) {
  const kind = kinds.find((each) => each.positions.includes(position));
  const part = kind && parts[kind.number - 1];
  if (!kind || !part) throw new Error(`no piece fills tile ${position}`);
  const { stave, course } = tileOf(layout.shell, position);
  const turn = kind.halfTurned.includes(position) ? -1 : 1;
  // A piece lies on the machine after half a turn; seen from outside, one cut face down is mirrored.
  const over = kind.faceDown.includes(position) ? -1 : 1;
  return part.map(([x, y, bulge]): DxfPoint => [
    over * turn * x + stave * layout.shell.tileWidth,
    turn * y + course * layout.shell.tileHeight,
    over * bulge,
  ]);
}

function polygonOf(points: readonly DxfPoint[]): flatten.Polygon {
  const polygon = new flatten.Polygon();
  polygon.addFace(
    points.map(([x, y, bulge], index) => {
      const [x2, y2] = points[(index + 1) % points.length] ?? [x, y];
      const [from, to] = [flatten.point(x, y), flatten.point(x2, y2)];
      if (bulge === 0) return flatten.segment(from, to);
      // sagitta = bulge × chord / 2; the centre lies on the middle line of the chord
      const along = (1 - bulge ** 2) / (4 * bulge);
      const centre = flatten.point(
        (x + x2) / 2 - (y2 - y) * along,
        (y + y2) / 2 + (x2 - x) * along,
      );
      const angleTo = (end: flatten.Point) => Math.atan2(end.y - centre.y, end.x - centre.x);
      const radius = Math.hypot(x - centre.x, y - centre.y);
      return flatten.arc(centre, radius, angleTo(from), angleTo(to), bulge > 0);
    }),
  );
  return polygon;
}

function overlapOf(a: flatten.Polygon, b: flatten.Polygon): number {
  return Math.abs(flatten.BooleanOperations.intersect(a, b).area());
}

describe.each(FIXTURES)('the DXF pieces of %s', (name) => {
  const layout = fixtureLayout(name);
  const { staves, courses, tileWidth } = layout.shell;
  const kinds = pieceKinds(layout);
  const parts = partsOf(bundleOf(layout));
  const at = (stave: number, course: number) =>
    placed(layout, kinds, parts, course * staves + stave);
  const round = (points: DxfPoint[]) =>
    points.map(([x, y, bulge]): DxfPoint => [x + staves * tileWidth, y, bulge]);
  const levels = [0, 1, courses - 2];

  const staveJoints = levels.flatMap((course) => [
    { joint: `staves 1 and 2, course ${course + 1}`, a: at(0, course), b: at(1, course) },
    { joint: `staves 2 and 3, course ${course + 1}`, a: at(1, course), b: at(2, course) },
  ]);
  // An odd ring of one-way tiles closes at the seam as well as an even ring of alternating ones.
  const seam = levels.map((course) => ({
    joint: `the seam, course ${course + 1}`,
    a: at(staves - 1, course),
    b: round(at(0, course)),
  }));
  const courseJoints = levels.flatMap((course) =>
    [0, 1].map((stave) => ({
      joint: `courses ${course + 1} and ${course + 2}, stave ${stave + 1}`,
      a: at(stave, course),
      b: at(stave, course + 1),
    })),
  );

  it.each([...staveJoints, ...seam, ...courseJoints])(
    'leave the clearance at $joint',
    ({ a, b }) => {
      const [one, other] = [polygonOf(a), polygonOf(b)];
      expect(overlapOf(one, other)).toBe(0);
      expect(Math.abs(one.distanceTo(other)[0] - layout.joint.clearance)).toBeLessThan(1e-6);
    },
  );
});
