/**
 * Two libraries that draw look at the same outlines. maker.js 0.19 (Apache-2.0) reads the SVG into its own
 * lines and arcs and measures the chain it finds; paper.js 0.12 (MIT) measures areas and overlaps. paper.js
 * draws arcs as cubics, which costs up to 3e-4 of an area, so it tells a wrong piece and not a fine one.
 */
import makerjs from 'makerjs';
import paper from 'paper/dist/paper-core';
import { describe, expect, it } from 'vitest';
import { pathData } from '@exports/svg/path-data';
import { areaOf, boundsOf, type Outline } from '@shared/geometry/outline';
import { lengthOf } from '@shared/geometry/segment';
import type { Layout } from '@shared/layout/schema';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { tileEdges } from '@shared/pieces/tile-edges';
import { nominalTileOutline, tileOutline } from '@shared/pieces/tile-outline';
import { drawnArcs } from './drawn-arcs';
import { fixtureLayout, fixtureNames } from './fixtures';
import { SAMPLE_OUTLINES, type SampleOutline } from './sample-outlines';
import { movedBy } from './true-arcs';

const CUBICS = 3e-4;

const scope = new paper.PaperScope();
scope.setup(new paper.Size(1, 1));

const drawn = ({ segments }: Outline) => pathData(segments, { flipY: true });
const inPaper = (outline: Outline) => new scope.CompoundPath(drawn(outline));
const areaInPaper = (item: paper.PathItem) =>
  Math.abs((item as paper.CompoundPath | paper.Path).area);

const layouts = fixtureNames('ok').map((name) => ({ name, layout: fixtureLayout(name) }));

/**
 * Pieces of real layouts and outlines drawn by hand. Two are left out that six decimals cannot hold: SVG
 * finds a centre from the two ends, and a flat arc or half a turn leaves it open.
 */
const outlines: readonly SampleOutline[] = [
  ...SAMPLE_OUTLINES.filter(({ name }) => name !== 'flat arc' && name !== 'disc'),
  ...layouts.flatMap(({ name, layout }) =>
    pieceKinds(layout).map((kind) => ({
      name: `${name}, kind ${kind.number}`,
      outline: tileOutline(layout, kind.edges),
    })),
  ),
];

describe.each(outlines)('$name', ({ outline }) => {
  it('is one closed chain to maker.js, with the length, size and radii of the model', () => {
    const model = makerjs.importer.fromSVGPathData(drawn(outline));
    const chain = makerjs.model.findSingleChain(model);
    const length = outline.segments.reduce((sum, segment) => sum + lengthOf(segment), 0);
    expect(chain.endless).toBe(true);
    expect(Math.abs(chain.pathLength - length)).toBeLessThan(1e-4);
    const extents = makerjs.measure.modelExtents(model);
    const bounds = boundsOf(outline.segments);
    const sides = [bounds.minX, bounds.minY, bounds.maxX, bounds.maxY];
    const { low, high } = extents ?? { low: [], high: [] };
    [low[0], low[1], high[0], high[1]].forEach((found, i) => {
      expect(Math.abs((found ?? NaN) - (sides[i] ?? NaN))).toBeLessThan(1e-4);
    });
    const radii = chain.links.flatMap(({ walkedPath: { pathContext } }) =>
      'radius' in pathContext ? [Number(pathContext.radius)] : [],
    );
    const ascending = (a: number, b: number) => a - b;
    const wished = drawnArcs(outline).map(({ radius }) => radius);
    expect(radii).toHaveLength(wished.length);
    wished.sort(ascending);
    radii.sort(ascending).forEach((radius, i) => {
      expect(Math.abs(radius - (wished[i] ?? NaN))).toBeLessThan(1e-4);
    });
  });

  it('has the area of the model to paper.js', () => {
    const area = areaOf(outline);
    expect(Math.abs(areaInPaper(inPaper(outline)) / area - 1)).toBeLessThan(CUBICS);
  });
});

describe.each(layouts)('neighbours of $name, laid side by side in paper.js', ({ layout }) => {
  const joined = [
    { name: 'at a stave joint', stave: 1, course: 0 },
    ...(layout.shell.courses > 1 ? [{ name: 'at a course joint', stave: 0, course: 1 }] : []),
  ];

  it.each(joined)('$name fill their rectangle before clearance, and never overlap after', (of) => {
    const [one, two] = [nominal(layout, 0, 0), nominal(layout, of.stave, of.course)];
    const together = areaOf(one) + areaOf(two);
    const united = inPaper(one).unite(inPaper(two));
    expect(Math.abs(areaInPaper(united) / together - 1)).toBeLessThan(CUBICS);
    const [first, second] = [cut(layout, 0, 0), cut(layout, of.stave, of.course)];
    const overlap = areaInPaper(inPaper(first).intersect(inPaper(second)));
    expect(overlap).toBeLessThan(CUBICS * together);
  });
});

function edgesAt({ joint, shell }: Layout, stave: number, course: number) {
  return tileEdges(joint.scheme, shell, stave, course);
}

function nominal(layout: Layout, stave: number, course: number): Outline {
  const outline = nominalTileOutline(layout, edgesAt(layout, stave, course));
  return inPlace(layout, outline, stave, course);
}

function cut(layout: Layout, stave: number, course: number): Outline {
  return inPlace(layout, tileOutline(layout, edgesAt(layout, stave, course)), stave, course);
}

function inPlace({ shell }: Layout, { segments }: Outline, stave: number, course: number): Outline {
  return { segments: movedBy(segments, stave * shell.tileWidth, course * shell.tileHeight) };
}
