/**
 * Segments as the `d` of an SVG path: lines as L, arcs as A, so an arc stays an arc. Coordinates keep six
 * decimals: a millionth of a millimetre. Arcs of radius 0 and segments shorter than the last decimal are
 * left out, since SVG readers turn them into stray lines.
 */
import { endOf, middleOf, startOf, type Segment } from '@shared/geometry/segment';
import { POINT_TOLERANCE } from '@shared/geometry/tolerance';
import type { PointMm } from '@shared/units/length';
import { printDecimal } from '../decimal';

export const SVG_DECIMALS = 6;

/**
 * An arc that nearly comes back to its start is drawn in two: SVG finds the centre from the two ends, and
 * drops an arc whose ends coincide (SVG 2 §9.5.1).
 */
const LONGEST_SWEEP = (350 * Math.PI) / 180;

export interface PathOptions {
  /** Mirrors y, for drawings in millimetres whose y runs up shown where y runs down. */
  readonly flipY?: boolean;
}

/**
 * The path data of a chain of segments in their own units; closed with Z when the chain ends where it
 * starts. Empty when nothing is left to draw.
 */
export function pathData(segments: readonly Segment[], options: PathOptions = {}): string {
  const first = segments[0];
  const last = segments[segments.length - 1];
  if (first === undefined || last === undefined) return '';
  const up = options.flipY === true ? -1 : 1;
  const start = startOf(first);
  const closed = samePoint(start, endOf(last));
  const startText = pointText(start, up);
  let current = startText;
  let data = '';
  for (const segment of segments) {
    const closing = closed && segment === last;
    for (const part of partsOf(segment)) {
      const end = closing && part.last ? startText : pointText(part.end, up);
      if (end === current || (closing && segment.kind === 'line')) continue;
      data += commandOf(segment, part.sweep, up) + end;
      current = end;
    }
  }
  return data === '' ? '' : `M${startText}${data}${closed ? 'Z' : ''}`;
}

interface Part {
  readonly end: PointMm;
  readonly sweep: number;
  readonly last: boolean;
}

function partsOf(segment: Segment): Part[] {
  if (segment.kind === 'line') return [{ end: segment.to, sweep: 0, last: true }];
  if (segment.radius < POINT_TOLERANCE) return [];
  const whole = { end: endOf(segment), sweep: segment.sweep, last: true };
  if (Math.abs(segment.sweep) < LONGEST_SWEEP) return [whole];
  const half = segment.sweep / 2;
  return [
    { end: middleOf(segment), sweep: half, last: false },
    { ...whole, sweep: half },
  ];
}

function commandOf(segment: Segment, sweep: number, up: number): string {
  if (segment.kind === 'line') return 'L';
  const radius = printDecimal(segment.radius, SVG_DECIMALS);
  const large = Math.abs(sweep) > Math.PI ? 1 : 0;
  const increasing = sweep * up > 0 ? 1 : 0;
  return `A${radius} ${radius} 0 ${large} ${increasing} `;
}

function pointText(point: PointMm, up: number): string {
  return `${printDecimal(point.x, SVG_DECIMALS)} ${printDecimal(up * point.y, SVG_DECIMALS)}`;
}

function samePoint(a: PointMm, b: PointMm): boolean {
  return Math.hypot(a.x - b.x, a.y - b.y) < POINT_TOLERANCE;
}
