import type { IDxf } from 'dxf-parser';
import * as z from 'zod';

/** A vertex as x, y and bulge. */
export type DxfPoint = readonly [x: number, y: number, bulge: number];

const polylineSchema = z.object({
  layer: z.literal('PART'),
  shape: z.literal(true),
  vertices: z.array(z.object({ x: z.number(), y: z.number(), bulge: z.number().optional() })),
});

/** The vertices of the one closed polyline on layer PART of what dxf-parser read. */
export function dxfVertices(read: IDxf | null): DxfPoint[] {
  const polylines =
    read?.entities.filter(
      (entity) => entity.type.endsWith('POLYLINE') && entity.layer === 'PART',
    ) ?? [];
  if (polylines.length !== 1) throw new Error(`expected one polyline, found ${polylines.length}`);
  return polylineSchema
    .parse(polylines[0])
    .vertices.map(({ x, y, bulge }): DxfPoint => [x, y, bulge ?? 0]);
}
