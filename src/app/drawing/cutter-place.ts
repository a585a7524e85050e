import { offsetChain } from '@shared/geometry/offset';
import type { Outline } from '@shared/geometry/outline';
import { endOf, pointOnCircle, type ArcSegment, type Segment } from '@shared/geometry/segment';
import type { Millimetres, PointMm } from '@shared/units/length';

/** Where a cutter stands in an inside arc: as deep as it goes. */
export interface CutterPlace {
  readonly centre: PointMm;
  /** How much rounder the arc is than the cutter; negative when the cutter leaves wood in it. */
  readonly room: Millimetres;
}

/**
 * The cutter in an inside arc of an outline. One that is too thick stands where it touches both
 * neighbours of the arc; null when it touches nothing there.
 */
export function cutterPlace(
  outline: Outline,
  index: number,
  diameter: Millimetres,
): CutterPlace | null {
  const { segments } = outline;
  const arc = segments[index];
  if (arc?.kind !== 'arc') return null;
  const room = arc.radius - diameter / 2;
  if (room >= 0) return { centre: deepest(arc, room), room };
  const before = segments[(index + segments.length - 1) % segments.length] as Segment;
  const after = segments[(index + 1) % segments.length] as Segment;
  const first = offsetChain([before, arc, after], diameter / 2)?.[0];
  return first ? { centre: endOf(first), room } : null;
}

function deepest({ centre, startAngle, sweep }: ArcSegment, room: Millimetres): PointMm {
  return pointOnCircle(centre, room, startAngle + sweep / 2);
}

/** Indexes of the inside arcs (those that turn clockwise round the wood) among some segments. */
export function insideArcs(outline: Outline): number[] {
  return outline.segments.flatMap((segment, i) =>
    segment.kind === 'arc' && segment.sweep < 0 ? [i] : [],
  );
}
