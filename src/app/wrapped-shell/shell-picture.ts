/**
 * A shell for drawings without depth: the true outlines of its tiles, flattened once, to be laid on a
 * turned cylinder. Only a picture: nothing is cut from it.
 */
import { lengthOf, pointOnCircle, startOf, type Segment } from '@shared/geometry/segment';
import type { Layout } from '@shared/layout/schema';
import { edgesKey, nominalTileOutline } from '@shared/pieces/tile-outline';
import { tileEdges } from '@shared/pieces/tile-edges';
import type { Millimetres, PointMm } from '@shared/units/length';

/** One tile: its wood's colour, its centre from the seam and the bottom, and its outline around that. */
export interface PictureTile {
  readonly stave: number;
  readonly course: number;
  readonly colour: string;
  readonly centre: PointMm;
  readonly outline: readonly PointMm[];
}

export interface ShellPicture {
  readonly staves: number;
  readonly courses: number;
  readonly tileWidth: Millimetres;
  readonly tileHeight: Millimetres;
  readonly outerRadius: Millimetres;
  readonly innerRadius: Millimetres;
  /** The finished ends, measured from the untrimmed bottom. */
  readonly bottom: Millimetres;
  readonly top: Millimetres;
  readonly tiles: readonly PictureTile[];
}

/** The picture of a layout; outlines are flattened to chords no longer than a tenth of a tile. */
export function pictureOf(layout: Layout): ShellPicture {
  const { shell } = layout;
  const trim = (shell.courses * shell.tileHeight - shell.finishedHeight) / 2;
  return {
    staves: shell.staves,
    courses: shell.courses,
    tileWidth: shell.tileWidth,
    tileHeight: shell.tileHeight,
    outerRadius: shell.finishedOuterDiameter / 2,
    innerRadius: shell.finishedInnerDiameter / 2,
    bottom: trim,
    top: trim + shell.finishedHeight,
    tiles: tilesOf(layout),
  };
}

function tilesOf(layout: Layout): PictureTile[] {
  const { staves, courses, tileWidth, tileHeight } = layout.shell;
  const flattened = new Map<string, PointMm[]>();
  return Array.from({ length: staves * courses }, (_, position) => {
    const stave = position % staves;
    const course = Math.floor(position / staves);
    const edges = tileEdges(layout.joint.scheme, { staves, courses }, stave, course);
    const key = edgesKey(edges);
    const known = flattened.get(key);
    const outline =
      known ??
      flatten(nominalTileOutline(layout, edges).segments, Math.min(tileWidth, tileHeight) / 10);
    flattened.set(key, outline);
    return {
      stave,
      course,
      colour: layout.woods[layout.cells[position] ?? 0]?.colour ?? '#888888',
      centre: { x: (stave + 0.5) * tileWidth, y: (course + 0.5) * tileHeight },
      outline,
    };
  });
}

/** Corners of a chain of chords along the segments, none longer than `chord`. */
function flatten(segments: readonly Segment[], chord: Millimetres): PointMm[] {
  return segments.flatMap((segment) => {
    const from = startOf(segment);
    const steps = Math.max(1, Math.ceil(lengthOf(segment) / chord));
    return Array.from({ length: steps }, (_, step) => {
      const share = step / steps;
      if (segment.kind === 'arc') {
        const angle = segment.startAngle + segment.sweep * share;
        return pointOnCircle(segment.centre, segment.radius, angle);
      }
      const { to } = segment;
      return { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
    });
  });
}
