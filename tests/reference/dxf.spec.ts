/**
 * DXF read back by readers that are not ours: ezdxf (Debian's python3-ezdxf, its audit and its
 * bulge_to_arc) and dxf-parser (npm). Group codes: Autodesk DXF Reference.
 */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import DxfParser from 'dxf-parser';
import { afterAll, describe, expect, it } from 'vitest';
import type { DxfDrawing } from '@exports/dxf/drawing';
import { DXF_RELEASES, printDxf, type DxfRelease } from '@exports/dxf/print-dxf';
import { areaOf, type Outline } from '@shared/geometry/outline';
import { fromMillimetres, type LengthUnit } from '@shared/units/length';
import { drawnArcs } from './drawn-arcs';
import { dxfVertices } from './dxf-parser-reading';
import { readWithEzdxf } from './dxf-readers';
import { polylineArea } from './polyline-area';
import { SAMPLE_OUTLINES } from './sample-outlines';

const HOSTILE = '%%d =cmd() <script> "x" </title> ^J \\U+0041 é 🪵\n0\nEOF';
const UNITS: readonly LengthUnit[] = ['mm', 'in'];
const folder = mkdtempSync(join(tmpdir(), 'staveloom-dxf-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function drawingOf(outline: Outline, unit: LengthUnit): DxfDrawing {
  return {
    unit,
    layers: ['PART', 'CENTRE_PATH', 'LABEL', 'BOARD'],
    outlines: [{ layer: 'PART', outline }],
    labels: [{ layer: 'LABEL', at: { x: 0, y: 0 }, height: 2, text: HOSTILE }],
  };
}

interface Sample {
  readonly name: string;
  readonly release: DxfRelease;
  readonly unit: LengthUnit;
  readonly outline: Outline;
  readonly path: string;
  readonly text: string;
}

const samples = DXF_RELEASES.flatMap((release) =>
  UNITS.flatMap((unit) =>
    SAMPLE_OUTLINES.map(({ name, outline }, index): Sample => {
      const path = join(folder, `${release}-${unit}-${index}.dxf`);
      const text = printDxf(drawingOf(outline, unit), release);
      writeFileSync(path, text);
      return { name, release, unit, outline, path, text };
    }),
  ),
);
const readings = readWithEzdxf(samples.map((sample) => sample.path));

describe.each(samples.map((sample, index) => ({ ...sample, reading: readings[index] })))(
  '$release in $unit, $name, read by ezdxf',
  ({ release, unit, outline, reading }) => {
    it('audits with no error and no fix', () => {
      expect(reading?.errors).toEqual([]);
      expect(reading?.fixes).toEqual([]);
      expect(reading?.others).toEqual([]);
    });

    it('is the release and the unit that were asked for', () => {
      expect(reading?.version).toBe(release === 'r12' ? 'AC1009' : 'AC1015');
      if (release === 'r2000') expect(reading?.insunits).toBe(unit === 'mm' ? 4 : 1);
      expect(reading?.layers).toEqual(
        expect.arrayContaining(['PART', 'CENTRE_PATH', 'LABEL', 'BOARD']),
      );
    });

    it('is one closed polyline with the radii of the model within 1e-4 mm', () => {
      expect(reading?.polylines).toHaveLength(1);
      const polyline = reading?.polylines[0];
      expect(polyline).toMatchObject({
        type: release === 'r12' ? 'POLYLINE' : 'LWPOLYLINE',
        layer: 'PART',
        closed: true,
      });
      const arcs = drawnArcs(outline);
      expect(polyline?.arcs).toHaveLength(arcs.length);
      arcs.forEach((arc, index) => {
        const read = polyline?.arcs[index];
        const mm = unit === 'in' ? 25.4 : 1;
        expect(Math.abs((read?.radius ?? NaN) * mm - arc.radius)).toBeLessThan(1e-4);
        expect(Math.abs((read?.centre[0] ?? NaN) * mm - arc.centre.x)).toBeLessThan(1e-4);
        expect(Math.abs((read?.centre[1] ?? NaN) * mm - arc.centre.y)).toBeLessThan(1e-4);
        expect(Math.sign(read?.bulge ?? NaN)).toBe(Math.sign(arc.sweep));
      });
    });

    it('encloses the area of the model', () => {
      const area = polylineArea(reading?.polylines[0]?.points ?? []);
      const scale = fromMillimetres(1, unit) ** 2;
      expect(area).toBeCloseTo(areaOf(outline) * scale, 6);
    });

    it('has no segment without length', () => {
      const points = reading?.polylines[0]?.points ?? [];
      points.forEach(([x, y], index) => {
        const [x2, y2] = points[(index + 1) % points.length] ?? [x, y];
        expect(Math.hypot(x2 - x, y2 - y)).toBeGreaterThan(1e-7);
      });
    });

    it('carries a hostile name as plain text on its layer', () => {
      expect(reading?.texts).toHaveLength(1);
      expect(reading?.texts[0]?.layer).toBe('LABEL');
      expect(reading?.texts[0]?.plain).toBe(
        '% %d =cmd() <script> "x" </title> ^J \\U+0041 é ? 0 EOF',
      );
    });
  },
);

describe.each(samples)(
  '$release in $unit, $name, read by dxf-parser',
  ({ unit, text, outline }) => {
    it('finds the same closed polyline', () => {
      const read = new DxfParser().parseSync(text);
      expect(Object.keys(read?.tables.layer.layers ?? {})).toEqual(
        expect.arrayContaining(['PART', 'CENTRE_PATH', 'LABEL', 'BOARD']),
      );
      const area = polylineArea(dxfVertices(read));
      expect(area).toBeCloseTo(areaOf(outline) * fromMillimetres(1, unit) ** 2, 6);
    });
  },
);
