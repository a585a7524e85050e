import { bulgeOf, lengthOf, startOf, type Segment } from '@shared/geometry/segment';
import type { Outline } from '@shared/geometry/outline';
import { POINT_TOLERANCE } from '@shared/geometry/tolerance';
import { fromMillimetres, type LengthUnit, type PointMm } from '@shared/units/length';

/** A vertex of a polyline: where a segment starts and how it bends (group 42), in the file's unit. */
export interface DxfVertex {
  readonly x: number;
  readonly y: number;
  readonly bulge: number;
}

/**
 * Decimals of what is written. A reader finds a radius from chord and bulge, so errors of either grow with
 * radius / chord: these keep a 150 mm radius on a 0.01 mm chord within 1e-5 mm.
 */
export const DXF_DECIMALS = 10;
export const BULGE_DECIMALS = 14;

/** A bulge grows without end towards a full circle; such arcs are written as two. */
const LONGEST_SWEEP = (350 * Math.PI) / 180;

/**
 * The vertices of a closed outline, in the file's unit. Segments shorter than a millionth of a millimetre
 * are left out: some machines stop on them.
 */
export function verticesOf(outline: Outline, unit: LengthUnit): DxfVertex[] {
  return outline.segments
    .filter((segment) => lengthOf(segment) >= POINT_TOLERANCE)
    .flatMap(partsOf)
    .map((part) => vertexAt(startOf(part), bulgeOf(part), unit));
}

function partsOf(segment: Segment): Segment[] {
  if (segment.kind === 'line' || Math.abs(segment.sweep) < LONGEST_SWEEP) return [segment];
  const half = segment.sweep / 2;
  return [
    { ...segment, sweep: half },
    { ...segment, startAngle: segment.startAngle + half, sweep: half },
  ];
}

function vertexAt(point: PointMm, bulge: number, unit: LengthUnit): DxfVertex {
  return {
    x: roundForDxf(fromMillimetres(point.x, unit)),
    y: roundForDxf(fromMillimetres(point.y, unit)),
    bulge: roundForDxf(bulge, BULGE_DECIMALS),
  };
}

/** Rounded as it is written; what is next to nothing becomes 0, so no number needs an exponent. */
export function roundForDxf(value: number, decimals = DXF_DECIMALS): number {
  return Math.abs(value) < POINT_TOLERANCE ? 0 : Number(value.toFixed(decimals));
}
