/**
 * Which side of a closed chain a point lies on, exactly, arcs included. Arcs are cut where they turn back
 * in y, so that a level ray to the right meets every piece at most once; pieces own their lower end and
 * not their upper one, so a ray through a corner is counted once.
 */
import type { Millimetres, PointMm } from '../units/length';
import { endOf, pointOnCircle, startOf, type ArcSegment, type Segment } from './segment';

/** A piece that only rises or only falls, with the x at which it is met at a height between its ends. */
interface Flank {
  readonly low: Millimetres;
  readonly high: Millimetres;
  readonly xAt: (y: Millimetres) => Millimetres;
}

/** A test that answers whether a point lies inside the closed chain; worked out once, asked often. */
export function insideTest(segments: readonly Segment[]): (point: PointMm) => boolean {
  const flanks = segments.flatMap(flanksOf);
  return (point) => {
    let inside = false;
    for (const flank of flanks) {
      if (point.y < flank.low || point.y >= flank.high) continue;
      if (flank.xAt(point.y) > point.x) inside = !inside;
    }
    return inside;
  };
}

function flanksOf(segment: Segment): Flank[] {
  return segment.kind === 'line' ? lineFlank(segment.from, segment.to) : arcFlanks(segment);
}

function lineFlank(from: PointMm, to: PointMm): Flank[] {
  if (from.y === to.y) return [];
  const slope = (to.x - from.x) / (to.y - from.y);
  return [
    {
      low: Math.min(from.y, to.y),
      high: Math.max(from.y, to.y),
      xAt: (y) => from.x + (y - from.y) * slope,
    },
  ];
}

const HALF_TURN = Math.PI;

function arcFlanks(arc: ArcSegment): Flank[] {
  const first = Math.min(arc.startAngle, arc.startAngle + arc.sweep);
  const last = Math.max(arc.startAngle, arc.startAngle + arc.sweep);
  const startsLow = arc.sweep >= 0;
  const ends = startsLow ? [startOf(arc).y, endOf(arc).y] : [endOf(arc).y, startOf(arc).y];
  const turns: number[] = [];
  const quarter = HALF_TURN / 2;
  for (let k = Math.ceil((first - quarter) / HALF_TURN); k * HALF_TURN + quarter < last; k++) {
    if (k * HALF_TURN + quarter > first) turns.push(k * HALF_TURN + quarter);
  }
  const angles = [first, ...turns, last];
  const heights = [
    ends[0] as number,
    ...turns.map((angle) => pointOnCircle(arc.centre, arc.radius, angle).y),
    ends[1] as number,
  ];
  return angles.slice(1).flatMap((angle, i) => {
    const middle = (angle + (angles[i] as number)) / 2;
    return arcFlank(
      arc,
      heights[i] as number,
      heights[i + 1] as number,
      Math.cos(middle) >= 0 ? 1 : -1,
    );
  });
}

/** The half of the circle to the right (1) or left (−1) of its centre, between two heights. */
function arcFlank(arc: ArcSegment, y0: Millimetres, y1: Millimetres, sign: 1 | -1): Flank[] {
  if (y0 === y1) return [];
  const { centre, radius } = arc;
  return [
    {
      low: Math.min(y0, y1),
      high: Math.max(y0, y1),
      xAt: (y) => centre.x + sign * Math.sqrt(Math.max(0, radius ** 2 - (y - centre.y) ** 2)),
    },
  ];
}
