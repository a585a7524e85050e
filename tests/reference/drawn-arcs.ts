import type { Outline } from '@shared/geometry/outline';
import type { ArcSegment } from '@shared/geometry/segment';

/** The arcs a reader must find in a file of an outline: none of radius 0, a full turn as two. */
export function drawnArcs(outline: Outline): ArcSegment[] {
  return outline.segments
    .filter((segment) => segment.kind === 'arc')
    .filter((arc) => arc.radius > 0)
    .flatMap((arc) => (Math.abs(arc.sweep) > 6.2 ? [arc, arc] : [arc]));
}
