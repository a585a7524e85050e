/**
 * The DXF pieces of whole bundles, read back by ezdxf (Debian's python3-ezdxf; its audit and its
 * bulge_to_arc) and held against the model's outlines and, for the cutter's centre line, against the part
 * in the same file.
 */
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { buildBundle, type Bundle, type BundleOptions } from '@exports/bundle';
import { DXF_RELEASES } from '@exports/dxf/print-dxf';
import type { ArcSegment } from '@shared/geometry/segment';
import { cutterFit } from '@shared/joint/cutter-fit';
import type { Layout } from '@shared/layout/schema';
import { pieceKinds } from '@shared/pieces/piece-kinds';
import { tileOutline } from '@shared/pieces/tile-outline';
import { drawnArcs } from './drawn-arcs';
import { readWithEzdxf, type DxfReading } from './dxf-readers';
import { fixtureLayout, fixtureNames } from './fixtures';

const folder = mkdtempSync(join(tmpdir(), 'staveloom-bundles-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

interface Case {
  readonly name: string;
  readonly layout: Layout;
  readonly options: BundleOptions;
  readonly bundle: Bundle;
  readonly paths: readonly string[];
}

function caseOf(name: string, options: Omit<BundleOptions, 'version' | 'override'>): Case {
  const layout = fixtureLayout(name);
  const override = { who: 'the reference tests', reason: 'to read every piece' };
  const whole: BundleOptions = { ...options, version: null, override };
  const result = buildBundle(layout, whole);
  if (!result.ok) throw new Error(`${name} was stopped in spite of an override`);
  const dxf = result.bundle.files.filter((file) => file.path.endsWith('.dxf'));
  const paths = dxf.map((file) => {
    const path = join(folder, `${options.dxf}-${options.unit}`, name, file.path);
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, file.text);
    return path;
  });
  return { name, layout, options: whole, bundle: result.bundle, paths };
}

const cases = fixtureNames('ok').flatMap((name) =>
  DXF_RELEASES.flatMap((dxf) =>
    (['mm', 'in'] as const).map((unit) => caseOf(name, { dxf, unit, centrePath: true })),
  ),
);
const readings = new Map<string, DxfReading>();
const everyPath = cases.flatMap((each) => each.paths);
readWithEzdxf(everyPath).forEach((reading, index) => {
  readings.set(everyPath[index] ?? '', reading);
});

function arcsOfModel(layout: Layout, index: number): ArcSegment[] {
  const kind = pieceKinds(layout)[index];
  if (kind === undefined) throw new Error(`there is no piece kind ${index + 1}`);
  return drawnArcs(tileOutline(layout, kind.edges));
}

function polylineOf(reading: DxfReading | undefined, layer: string) {
  return reading?.polylines.find((polyline) => polyline.layer === layer);
}

describe.each(cases)('$name as $options.dxf in $options.unit', ({ layout, options, paths }) => {
  const read = paths.map((path) => readings.get(path));
  const mm = options.unit === 'in' ? 25.4 : 1;

  it('every piece kind has a file that audits with no error and no fix', () => {
    expect(paths).toHaveLength(pieceKinds(layout).length);
    for (const reading of read) {
      expect(reading).toMatchObject({ errors: [], fixes: [], others: [] });
      expect(reading?.version).toBe(options.dxf === 'r12' ? 'AC1009' : 'AC1015');
      if (options.dxf === 'r2000') expect(reading?.insunits).toBe(options.unit === 'mm' ? 4 : 1);
    }
  });

  it('one closed part with the radii of the model within 1e-4 mm', () => {
    read.forEach((reading, index) => {
      const part = polylineOf(reading, 'PART');
      expect(part?.closed).toBe(true);
      const model = arcsOfModel(layout, index);
      expect(part?.arcs).toHaveLength(model.length);
      part?.arcs.forEach((arc, i) => {
        expect(Math.abs(arc.radius * mm - (model[i]?.radius ?? NaN))).toBeLessThan(1e-4);
        expect(Math.abs(arc.centre[0] * mm - (model[i]?.centre.x ?? NaN))).toBeLessThan(1e-4);
        expect(Math.abs(arc.centre[1] * mm - (model[i]?.centre.y ?? NaN))).toBeLessThan(1e-4);
      });
    });
  });

  it('the centre path runs half a cutter outside the part, or is left out where it cannot', () => {
    read.forEach((reading, index) => {
      const kind = pieceKinds(layout)[index];
      const outline = kind && tileOutline(layout, kind.edges);
      const fits = outline !== undefined && cutterFit(outline, layout.cutter.diameter).fits;
      const part = polylineOf(reading, 'PART');
      const path = polylineOf(reading, 'CENTRE_PATH');
      expect(reading?.layers).toContain('CENTRE_PATH');
      expect(path !== undefined).toBe(fits);
      if (!path) return;
      expect(path.closed).toBe(true);
      const half = layout.cutter.diameter / 2;
      for (const arc of path.arcs) {
        const radius = arc.radius * mm;
        const partners = part?.arcs.filter(
          ({ centre }) => Math.hypot(centre[0] - arc.centre[0], centre[1] - arc.centre[1]) < 1e-6,
        );
        const round = partners?.map((p) => p.radius * mm + (p.bulge > 0 ? half : -half)) ?? [];
        const nearest = Math.min(...[half, ...round].map((wanted) => Math.abs(wanted - radius)));
        expect(nearest).toBeLessThan(1e-4);
      }
    });
  });

  it('the label says number, wood and unit', () => {
    read.forEach((reading, index) => {
      expect(reading?.texts).toHaveLength(1);
      expect(reading?.texts[0]?.plain).toContain(`(${options.unit})`);
      expect(reading?.texts[0]?.plain.startsWith(String(index + 1).padStart(2, '0'))).toBe(true);
    });
  });
});
