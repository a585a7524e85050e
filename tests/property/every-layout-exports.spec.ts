/**
 * Every layout that is accepted can be exported, and what is exported can be read: the layout as itself,
 * each DXF as one closed polyline with the area of its piece, each SVG as XML.
 */
import DxfParser from 'dxf-parser';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { buildBundle } from '@exports/bundle';
import { DXF_RELEASES } from '@exports/dxf/print-dxf';
import { areaOf } from '@shared/geometry/outline';
import { encodeCells } from '@shared/layout/cells';
import { readLayout, readLayoutText } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { tileOutline } from '@shared/pieces/tile-outline';
import { dxfVertices } from '../reference/dxf-parser-reading';
import { polylineArea } from '../reference/polyline-area';
import { xmlErrors } from '../reference/xml-readers';
import { FIXED_SEED } from './fixed-seed';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const roundJoint = fc.record({
  profile: fc.constant('round'),
  headRadius: between(0.2, 8),
  filletRadius: between(0, 5),
  reach: between(0.2, 14),
});

const dovetailJoint = fc.record({
  profile: fc.constant('dovetail'),
  rootWidth: between(0.5, 20),
  flankAngle: between(0, 30),
  reach: between(0.2, 12),
  tipRadius: between(0, 4),
  rootRadius: between(0, 4),
});

const joint = fc.oneof(roundJoint, dovetailJoint);
const woodName = fc.string({ minLength: 1, maxLength: 30, unit: 'grapheme' });

/** Documents, most of which hold together; the rest readLayout refuses. */
const documents = fc
  .record({
    staves: fc.integer({ min: 6, max: 14 }),
    courses: fc.integer({ min: 1, max: 5 }),
    tileWidth: between(12, 60),
    tileHeight: between(12, 60),
    scheme: fc.constantFrom('alternating', 'one-way'),
    clearance: between(0, 0.6),
    staveJoint: joint,
    courseJoint: joint,
    diameter: between(0.5, 6),
    names: fc.array(woodName, { minLength: 1, maxLength: 3 }),
    seed: fc.nat(),
  })
  .map((drawn) => {
    const { staves, courses, tileWidth, tileHeight, names } = drawn;
    const cells = Uint8Array.from(
      { length: staves * courses },
      (_, position) => (position * 7 + drawn.seed) % names.length,
    );
    return {
      format: 'staveloom-layout',
      formatVersion: 1,
      name: names[0],
      lengthUnit: 'mm',
      shell: {
        ...{ staves, courses, tileWidth, tileHeight, boardThickness: 14, skimAllowance: 0 },
        finishedOuterDiameter: (staves * tileWidth) / Math.PI,
        finishedInnerDiameter: (0.9 * staves * tileWidth) / Math.PI,
        finishedHeight: courses * tileHeight - 1,
      },
      joint: {
        ...{ scheme: drawn.scheme, clearance: drawn.clearance },
        ...{ staveJoint: drawn.staveJoint, courseJoint: drawn.courseJoint },
      },
      cutter: { diameter: drawn.diameter, fluteLength: 20 },
      woods: names.map((name, index) => ({ key: `w${index}`, name, colour: '#AA8855' })),
      cells: encodeCells(cells),
    };
  });

const accepted: fc.Arbitrary<Layout> = documents
  .map((document) => readLayout(document))
  .filter((reading) => reading.ok)
  .map((reading) => reading.layout);

test('every accepted layout exports and is read again', () => {
  fc.assert(
    fc.property(accepted, fc.constantFrom(...DXF_RELEASES), (layout, dxf) => {
      const override = { who: 'the tests', reason: 'whatever the checks say' };
      const options = { dxf, unit: 'mm', centrePath: true, version: null, override } as const;
      const result = buildBundle(layout, options);
      if (!result.ok) throw new Error('stopped in spite of an override');
      const textOf = (path: string) =>
        result.bundle.files.find((file) => file.path.endsWith(path))?.text ?? '';

      expect(readLayoutText(textOf('layout.json'))).toEqual({ ok: true, layout });
      const drawn = result.bundle.files.filter((file) => file.path.endsWith('.svg'));
      for (const { path, text } of drawn) expect(xmlErrors(text), path).toEqual([]);
      pieceKinds(layout).forEach((kind) => {
        const number = String(kind.number).padStart(2, '0');
        const path = `${number}-${layout.woods[kind.wood]?.key ?? ''}.dxf`;
        const read = dxfVertices(new DxfParser().parseSync(textOf(path)));
        expect(polylineArea(read)).toBeCloseTo(areaOf(tileOutline(layout, kind.edges)), 5);
      });
    }),
    { ...FIXED_SEED, numRuns: 100 },
  );
});
