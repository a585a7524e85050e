/** Layout files of every shape the schema allows, sensible sizes and extremes mixed. */
import fc from 'fast-check';
import { encodeCells } from '@shared/layout/cells';
import { BOUNDS, type LayoutFile } from '@shared/layout/schema';

type JointFile = LayoutFile['joint']['staveJoint'];

/** Numbers of a bounded field: anywhere, at its ends, and round figures as people type them. */
function within(bound: { least: number; most: number }, usual: number): fc.Arbitrary<number> {
  const span = Math.min(bound.most, usual) - bound.least;
  return fc.oneof(
    { weight: 1, arbitrary: fc.constantFrom(bound.least, bound.most) },
    { weight: 4, arbitrary: fc.nat(1000).map((n) => bound.least + (span * n) / 1000) },
    {
      weight: 2,
      arbitrary: fc.nat(100).map((n) => Number((bound.least + (span * n) / 100).toFixed(1))),
    },
  );
}

/** A share of the tile, so that most joints have a chance of fitting; now and then anything. */
function onTile(
  tile: number,
  share: { from: number; to: number },
  bound: { least: number; most: number },
): fc.Arbitrary<number> {
  const clamped = (value: number) => Math.min(bound.most, Math.max(bound.least, value));
  return fc.oneof(
    { weight: 1, arbitrary: within(bound, tile) },
    {
      weight: 8,
      arbitrary: fc
        .nat(500)
        .map((n) => clamped(tile * (share.from + ((share.to - share.from) * n) / 500))),
    },
  );
}

function roundOn(tile: number): fc.Arbitrary<JointFile> {
  return fc.record({
    profile: fc.constant('round' as const),
    headRadius: onTile(tile, { from: 0.02, to: 0.3 }, BOUNDS.headRadius),
    filletRadius: onTile(tile, { from: 0, to: 0.15 }, BOUNDS.radius),
    reach: onTile(tile, { from: 0.02, to: 0.5 }, BOUNDS.reach),
  });
}

function dovetailOn(tile: number): fc.Arbitrary<JointFile> {
  return fc.record({
    profile: fc.constant('dovetail' as const),
    rootWidth: onTile(tile, { from: 0.02, to: 0.6 }, BOUNDS.rootWidth),
    flankAngle: within(BOUNDS.flankAngle, 20),
    reach: onTile(tile, { from: 0.05, to: 0.5 }, BOUNDS.reach),
    tipRadius: onTile(tile, { from: 0, to: 0.1 }, BOUNDS.radius),
    rootRadius: onTile(tile, { from: 0, to: 0.1 }, BOUNDS.radius),
  });
}

function jointOn(tile: number): fc.Arbitrary<JointFile> {
  return fc.oneof(roundOn(tile), dovetailOn(tile));
}

const text = fc
  .string({ unit: 'grapheme', minLength: 1, maxLength: 20 })
  .map((name) => `${name.replace(/[\p{C}\p{Z}]/gu, '')}·`);

function woodsAndCells(count: number): fc.Arbitrary<Pick<LayoutFile, 'woods' | 'cells'>> {
  return fc
    .tuple(fc.integer({ min: 1, max: BOUNDS.woods.most }), text, fc.nat(1_000_000))
    .map(([woods, name, seed]) => ({
      woods: Array.from({ length: woods }, (_, i) => ({
        key: `wood-${i}`,
        name: `${name} ${i}`,
        colour: `#${(i * 0x0a0907).toString(16).padStart(6, '0')}`,
        sawn: (['flat', 'rift', 'quarter'] as const)[i % 3] ?? 'flat',
      })),
      cells: encodeCells(Uint8Array.from({ length: count }, (_, i) => (i * 31 + seed) % woods)),
    }));
}

interface Grid {
  readonly staves: number;
  readonly courses: number;
  readonly tileWidth: number;
  readonly tileHeight: number;
}

const grid: fc.Arbitrary<Grid> = fc.record({
  staves: fc.oneof(fc.integer({ min: 6, max: 40 }), fc.constantFrom(6, 7, 239, 240)),
  courses: fc.oneof(fc.integer({ min: 1, max: 12 }), fc.constantFrom(1, 2, 3, 120)),
  tileWidth: within(BOUNDS.tile, 60),
  tileHeight: within(BOUNDS.tile, 60),
});

/** A shell that holds the ring of these staves, give or take. */
function shellOn({ staves, courses, tileWidth, tileHeight }: Grid) {
  const acrossFlats = tileWidth / Math.tan(Math.PI / staves);
  const near = (value: number, bound: { least: number; most: number }, from: number, to: number) =>
    fc
      .nat(100)
      .map((n) =>
        Math.min(bound.most, Math.max(bound.least, value * (from + ((to - from) * n) / 100))),
      );
  return fc.record({
    staves: fc.constant(staves),
    courses: fc.constant(courses),
    tileWidth: fc.constant(tileWidth),
    tileHeight: fc.constant(tileHeight),
    finishedOuterDiameter: near(acrossFlats, BOUNDS.diameter, 0.9, 1.02),
    finishedInnerDiameter: near(acrossFlats, BOUNDS.diameter, 0.4, 0.95),
    finishedHeight: near(courses * tileHeight, BOUNDS.height, 0.6, 1.05),
    boardThickness: within(BOUNDS.board, 30),
    skimAllowance: within(BOUNDS.skimAllowance, 1),
  });
}

/** Any layout file the schema accepts field by field; the fields need not go together. */
export const layoutFiles: fc.Arbitrary<LayoutFile> = grid.chain((size) =>
  fc
    .record({
      name: text,
      lengthUnit: fc.constantFrom('mm' as const, 'in' as const),
      shell: shellOn(size),
      joint: fc.record({
        scheme: fc.constantFrom('alternating' as const, 'one-way' as const),
        clearance: within(BOUNDS.clearance, 0.4),
        staveJoint: jointOn(size.tileHeight),
        courseJoint: jointOn(size.tileWidth),
      }),
      cutter: fc.record({
        diameter: within(BOUNDS.cutterDiameter, 6.35),
        fluteLength: within(BOUNDS.fluteLength, 30),
      }),
      build: fc.record({
        way: fc.constantFrom('stave-by-stave' as const, 'tile-by-tile' as const),
        turnOver: fc.boolean(),
        spareShare: within(BOUNDS.spareShare, 0.2),
        spareMinimum: fc.nat(BOUNDS.spareMinimum.most),
      }),
      content: woodsAndCells(size.staves * size.courses),
    })
    .map(({ content, ...rest }) => ({
      format: 'staveloom-layout' as const,
      formatVersion: 1 as const,
      ...rest,
      ...content,
    })),
);
