/** A downloaded bundle as another program sees it: unzipped by fflate, its DXF read by dxf-parser. */
import { readFileSync } from 'node:fs';
import DxfParser from 'dxf-parser';
import { strFromU8, unzipSync } from 'fflate';
import * as z from 'zod';
import { dxfVertices, type DxfPoint } from '../../reference/dxf-parser-reading';

const side = z.enum(['tab', 'socket', 'flat']);

const manifestSchema = z.object({
  layout: z.object({ name: z.string(), staves: z.number(), courses: z.number() }),
  version: z.object({ number: z.number(), note: z.string() }),
  unit: z.literal('mm'),
  clearance: z.number(),
  checks: z.array(z.object({ key: z.string(), result: z.string() })),
  files: z.array(z.object({ path: z.string(), sha256: z.string() })),
  pieces: z.array(
    z.object({
      files: z.array(z.string()),
      wood: z.string(),
      edges: z.object({ left: side, right: side, bottom: side, top: side }),
      count: z.number(),
      tiles: z.array(z.string()),
    }),
  ),
});
export type OpenedManifest = z.infer<typeof manifestSchema>;
export type OpenedPiece = OpenedManifest['pieces'][number];

export interface OpenedBundle {
  readonly names: readonly string[];
  readonly manifest: OpenedManifest;
  text(path: string): string;
}

/** Opens a ZIP on the disk; throws where it or its manifest is not what it should be. */
export function openBundle(path: string): OpenedBundle {
  const files = unzipSync(readFileSync(path));
  const text = (name: string) => {
    const file = files[name];
    if (!file) throw new Error(`the bundle has no ${name}`);
    return strFromU8(file);
  };
  const manifest = manifestSchema.parse(JSON.parse(text('manifest.json')));
  return { names: Object.keys(files), manifest, text };
}

/** What someone would measure on a piece: millimetres when the file is. */
export interface Measured {
  /** Of every arc, ascending. */
  readonly radii: readonly number[];
  readonly width: number;
  readonly height: number;
}

/** Measures the one closed polyline of a piece's DXF. */
export function measurePiece(bundle: OpenedBundle, piece: OpenedPiece): Measured {
  const path = piece.files.find((file) => file.endsWith('.dxf')) ?? '';
  const vertices = dxfVertices(new DxfParser().parseSync(bundle.text(path)));
  const spans = vertices.map((from, i) =>
    spanOf(from, vertices[(i + 1) % vertices.length] ?? from),
  );
  const xs = spans.flatMap((span) => span.xs);
  const ys = spans.flatMap((span) => span.ys);
  return {
    radii: spans.flatMap((span) => span.radius ?? []).sort((a, b) => a - b),
    width: Math.max(...xs) - Math.min(...xs),
    height: Math.max(...ys) - Math.min(...ys),
  };
}

interface Span {
  readonly radius: number | null;
  /** Where it begins and, on an arc, its outermost points. */
  readonly xs: readonly number[];
  readonly ys: readonly number[];
}

/** From one vertex to the next. A bulge is the tangent of a quarter of the arc's angle (DXF reference). */
function spanOf([x1, y1, bulge]: DxfPoint, [x2, y2]: DxfPoint): Span {
  if (bulge === 0) return { radius: null, xs: [x1], ys: [y1] };
  const chord = Math.hypot(x2 - x1, y2 - y1);
  const radius = (chord * (1 + bulge ** 2)) / (4 * Math.abs(bulge));
  const toCentre = (1 - bulge ** 2) / (4 * bulge);
  const cx = (x1 + x2) / 2 - (y2 - y1) * toCentre;
  const cy = (y1 + y2) / 2 + (x2 - x1) * toCentre;
  const from = Math.atan2(y1 - cy, x1 - cx);
  const sweep = 4 * Math.atan(bulge);
  const outermost = [0, 1, 2, 3]
    .map((quarter) => (quarter * Math.PI) / 2)
    .filter((angle) => isOn(angle, from, sweep));
  return {
    radius,
    xs: [x1, ...outermost.map((angle) => cx + radius * Math.cos(angle))],
    ys: [y1, ...outermost.map((angle) => cy + radius * Math.sin(angle))],
  };
}

function isOn(angle: number, from: number, sweep: number): boolean {
  const turn = 2 * Math.PI;
  const along = sweep > 0 ? angle - from : from - angle;
  return ((along % turn) + turn) % turn <= Math.abs(sweep);
}
