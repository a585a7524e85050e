/**
 * Exact offsets of chains of lines and arcs: a line moves square to itself, an arc keeps its centre and
 * changes its radius, so arcs stay arcs. Distances are to the right of travel: outside an outline that runs
 * counter-clockwise. Where an outside corner opens, the offset runs round it on an arc about the corner, as
 * the centre of a cutter does; where neighbours run into each other they are cut at their meeting point.
 */
import type { Millimetres, PointMm } from '../units/length';
import { selfCrossing } from './crossing';
import { supportIntersections, turnFromStart } from './intersect';
import type { Outline } from './outline';
import {
  directionAtEnd,
  directionAtStart,
  endOf,
  middleOf,
  startOf,
  type Segment,
} from './segment';
import { POINT_TOLERANCE } from './tolerance';
import { cross, distance } from './vector';

/** An offset outline, or why there is none and where. */
export type OffsetResult =
  | { readonly ok: true; readonly outline: Outline }
  | {
      readonly ok: false;
      readonly reason: 'arc-collapses' | 'crosses-itself';
      readonly at: PointMm;
    };

/** The outline at a distance outside (positive) or inside (negative) of this one. */
export function offsetOutline(outline: Outline, outward: Millimetres): OffsetResult {
  const moved: Segment[] = [];
  for (const segment of outline.segments) {
    const shifted = offsetSegment(segment, outward);
    if (!shifted) return { ok: false, reason: 'arc-collapses', at: middleOf(segment) };
    moved.push(shifted);
  }
  const joined = joinRound(outline.segments, moved, outward);
  const crossing = selfCrossing(joined);
  return crossing
    ? { ok: false, reason: 'crosses-itself', at: crossing }
    : { ok: true, outline: { segments: joined } };
}

/** The segment moved to the right of its travel, or null when an arc's radius would fall under zero. */
export function offsetSegment(segment: Segment, right: Millimetres): Segment | null {
  if (segment.kind === 'line') {
    const along = directionAtStart(segment);
    const shift = { x: along.y * right, y: -along.x * right };
    return {
      kind: 'line',
      from: { x: segment.from.x + shift.x, y: segment.from.y + shift.y },
      to: { x: segment.to.x + shift.x, y: segment.to.y + shift.y },
    };
  }
  const radius = segment.radius + (segment.sweep > 0 ? right : -right);
  if (radius < -POINT_TOLERANCE) return null;
  return { ...segment, radius: Math.max(0, radius) };
}

/**
 * An open chain moved to the right of its travel. An outside arc smaller than the distance vanishes and its
 * neighbours meet in a sharp corner. Null when neighbours that should meet do not.
 */
export function offsetChain(segments: readonly Segment[], right: Millimetres): Segment[] | null {
  const chain: Segment[] = [];
  for (const segment of segments) {
    const moved = offsetSegment(segment, right);
    if (!moved) continue;
    const last = chain.at(-1);
    if (!last || distance(endOf(last), startOf(moved)) <= POINT_TOLERANCE) {
      chain.push(moved);
      continue;
    }
    const met = meet(last, moved, startOf(segment));
    if (!met) return null;
    chain.splice(-1, 1, ...met);
  }
  return chain;
}

function joinRound(
  originals: readonly Segment[],
  moved: readonly Segment[],
  outward: Millimetres,
): Segment[] {
  const chain = [...moved];
  const joins: (Segment | null)[] = moved.map(() => null);
  for (let i = 0; i < chain.length; i++) {
    const j = (i + 1) % chain.length;
    const [a, b] = [chain[i] as Segment, chain[j] as Segment];
    if (distance(endOf(a), startOf(b)) <= POINT_TOLERANCE) continue;
    const corner = endOf(originals[i] as Segment);
    const turn = turnAt(originals[i] as Segment, originals[j] as Segment);
    const met = turn * outward > 0 ? null : meet(a, b, corner);
    if (met) [chain[i], chain[j]] = met;
    else joins[i] = cornerArc(originals[i] as Segment, corner, turn, outward);
  }
  return chain.flatMap((segment, i) => (joins[i] ? [segment, joins[i]] : [segment]));
}

/** Angle by which travel turns at a corner, left positive. */
function turnAt(before: Segment, after: Segment): number {
  const [a, b] = [directionAtEnd(before), directionAtStart(after)];
  return Math.atan2(cross(a, b), a.x * b.x + a.y * b.y);
}

function cornerArc(before: Segment, corner: PointMm, turn: number, outward: Millimetres): Segment {
  const along = directionAtEnd(before);
  const right = Math.atan2(-along.x, along.y);
  return {
    kind: 'arc',
    centre: corner,
    radius: Math.abs(outward),
    startAngle: outward > 0 ? right : right + Math.PI,
    sweep: turn,
  };
}

/** Both segments cut or lengthened to their meeting point nearest to a corner; null when they never meet. */
function meet(a: Segment, b: Segment, corner: PointMm): [Segment, Segment] | null {
  const points = supportIntersections(a, b);
  if (points.length === 0) return null;
  const point = points.reduce((p, q) => (distance(q, corner) < distance(p, corner) ? q : p));
  return [endedAt(a, point), startedAt(b, point)];
}

function endedAt(segment: Segment, point: PointMm): Segment {
  if (segment.kind === 'line') return { ...segment, to: point };
  return { ...segment, sweep: Math.sign(segment.sweep) * nearestTurn(segment, point) };
}

function startedAt(segment: Segment, point: PointMm): Segment {
  if (segment.kind === 'line') return { ...segment, from: point };
  const end = segment.startAngle + segment.sweep;
  const backwards = { ...segment, startAngle: end, sweep: -segment.sweep };
  const turn = nearestTurn(backwards, point);
  const hand = Math.sign(segment.sweep);
  return { ...segment, startAngle: end - hand * turn, sweep: hand * turn };
}

/** Travel from the arc's start to a point, taken on the lap nearest to the arc's own sweep. */
function nearestTurn(arc: Segment & { kind: 'arc' }, point: PointMm): number {
  const angle = Math.atan2(point.y - arc.centre.y, point.x - arc.centre.x);
  const turn = turnFromStart(arc, angle);
  const full = 2 * Math.PI;
  return [turn - full, turn, turn + full].reduce((a, b) =>
    Math.abs(b - Math.abs(arc.sweep)) < Math.abs(a - Math.abs(arc.sweep)) ? b : a,
  );
}
