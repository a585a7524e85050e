/**
 * SVG read back by XML parsers (saxes, fast-xml-parser) and a path parser (svg-path-parser), and painted by a
 * renderer that is not ours (resvg). Sizes: 1 in = 25.4 mm = 96 px (CSS Values 3 §6.2); arcs: SVG 2 §9.3.8.
 */
import { Resvg } from '@resvg/resvg-js';
import { XMLParser } from 'fast-xml-parser';
import { parseSVG, type EllipticalArcCommand } from 'svg-path-parser';
import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { pieceSvg } from '@exports/svg/piece-svg';
import { areaOf, boundsOf, type Outline } from '@shared/geometry/outline';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { tileOutline } from '@shared/pieces/tile-outline';
import { drawnArcs } from './drawn-arcs';
import { fixtureLayout, fixtureNames } from './fixtures';
import { SAMPLE_OUTLINES, type SampleOutline } from './sample-outlines';
import { xmlErrors } from './xml-readers';

const svgSchema = z.object({
  svg: z.object({
    width: z.string(),
    height: z.string(),
    viewBox: z.string(),
    title: z.string(),
    path: z.strictObject({ d: z.string(), fill: z.string() }),
  }),
});

const parser = new XMLParser({ ignoreAttributes: false, attributeNamePrefix: '' });

/** Those large enough to be painted: pieces of real layouts and the outlines drawn by hand. */
const outlines: SampleOutline[] = [
  ...SAMPLE_OUTLINES.filter(({ name }) => name !== 'flat arc'),
  ...fixtureNames('ok').flatMap((name) => {
    const layout = fixtureLayout(name);
    return pieceKinds(layout)
      .slice(0, 4)
      .map((kind) => ({
        name: `${name}, kind ${kind.number}`,
        outline: tileOutline(layout, kind.edges),
      }));
  }),
];

function read(outline: Outline) {
  const text = pieceSvg({ outline, title: '</title><script>&"', colour: '#000000' });
  expect(xmlErrors(text)).toEqual([]);
  return { text, svg: svgSchema.parse(parser.parse(text)).svg };
}

describe.each(outlines)('$name as SVG', ({ outline }) => {
  const bounds = boundsOf(outline.segments);
  const width = bounds.maxX - bounds.minX;
  const height = bounds.maxY - bounds.minY;

  it('is as large as the piece, one user unit a millimetre, its origin kept', () => {
    const { svg } = read(outline);
    expect(svg.width.endsWith('mm')).toBe(true);
    expect(Number.parseFloat(svg.width)).toBeCloseTo(width, 5);
    expect(Number.parseFloat(svg.height)).toBeCloseTo(height, 5);
    const box = svg.viewBox.split(' ').map(Number);
    [bounds.minX, -bounds.maxY, width, height].forEach((value, index) => {
      expect(box[index]).toBeCloseTo(value, 5);
    });
  });

  it('is one closed path with the arcs of the model and a title that is only text', () => {
    const { svg } = read(outline);
    expect(svg.title).toBe('</title><script>&"');
    const commands = parseSVG(svg.path.d);
    expect(commands.filter((command) => command.code === 'M')).toHaveLength(1);
    expect(commands.at(-1)?.code).toBe('Z');
    const arcs = commands.filter(
      (command): command is EllipticalArcCommand => command.code === 'A',
    );
    const model = drawnArcs(outline);
    expect(arcs).toHaveLength(model.length);
    arcs.forEach((arc, index) => {
      expect(arc.rx).toBeCloseTo(model[index]?.radius ?? NaN, 5);
      expect(arc.ry).toBe(arc.rx);
      // y runs down: what turns counter-clockwise in the model turns the other way here
      expect(arc.sweep).toBe((model[index]?.sweep ?? NaN) < 0);
    });
  });

  it('painted by resvg it covers its area and reaches its four sides', () => {
    const { text } = read(outline);
    // resvg itself turns mm into pixels, 96 an inch, rounded to whole ones; enlarged to 20 a millimetre
    const pixelsPerMm = 20;
    const zoom = (pixelsPerMm * 25.4) / 96;
    const image = new Resvg(text, { fitTo: { mode: 'zoom', value: zoom } });
    expect(Math.abs(image.width - (width * 96) / 25.4)).toBeLessThanOrEqual(0.5);
    expect(Math.abs(image.height - (height * 96) / 25.4)).toBeLessThanOrEqual(0.5);
    const painted = image.render();
    const cover = coverage(painted.pixels, painted.width, painted.height);
    const area = cover.area / pixelsPerMm ** 2;
    expect(Math.abs(area / areaOf(outline) - 1)).toBeLessThan(2e-3);
    expect(cover.minX).toBeLessThanOrEqual(1);
    expect(cover.minY).toBeLessThanOrEqual(1);
    expect(cover.maxX).toBeGreaterThanOrEqual(painted.width - 2);
    expect(cover.maxY).toBeGreaterThanOrEqual(painted.height - 2);
  });
});

/** What is painted of an RGBA picture: its area in pixels, counting the grey of the rim, and its box. */
function coverage(pixels: Uint8Array, width: number, height: number) {
  const cover = { area: 0, minX: width, minY: height, maxX: 0, maxY: 0 };
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const alpha = pixels[(y * width + x) * 4 + 3] ?? 0;
      if (alpha === 0) continue;
      cover.area += alpha / 255;
      cover.minX = Math.min(cover.minX, x);
      cover.maxX = Math.max(cover.maxX, x);
      cover.minY = Math.min(cover.minY, y);
      cover.maxY = Math.max(cover.maxY, y);
    }
  }
  return cover;
}
