import type { Layout } from '../layout/schema';
import type { PieceKind } from './piece-kind';
import { spareCount } from './spares';
import { faceDown, halfTurned, tileEdges, type TileEdges } from './tile-edges';
import { edgesKey } from './tile-outline';

/** True when tiles of this course lie face down: every other tile of a stave, where pieces are turned over. */
export function liesFaceDown(layout: Pick<Layout, 'build'>, course: number): boolean {
  return layout.build.turnOver && course % 2 === 1;
}

interface Growing {
  wood: number;
  edges: TileEdges;
  mirrored: boolean;
  positions: number[];
  faceDown: number[];
  halfTurned: number[];
}

/** The kinds cut from one drawing, by wood. */
type KindsOfDrawing = (Growing | undefined)[];

/**
 * The piece kinds of a layout, by wood and then in the order of its tiles from A 1. Every tile is looked at
 * once; whatever needs more than an array's place is done once a course.
 */
export function pieceKinds(layout: Layout): PieceKind[] {
  const { staves, courses } = layout.shell;
  const found: Growing[] = [];
  const kinds = new Map<string, KindsOfDrawing>();
  const drawings = new Map<string, Drawing>();
  for (let course = 0; course < courses; course++) {
    const down = liesFaceDown(layout, course);
    // along a course only the parity of the stave matters
    const alongCourse = [0, 1].map((stave) => {
      const edges = tileEdges(layout.joint.scheme, layout.shell, stave, course);
      const drawing = drawingOf(drawings, edges, down ? 'down' : 'up');
      return { drawing, kinds: kindsOf(kinds, drawing) };
    });
    for (let stave = 0; stave < staves; stave++) {
      const position = course * staves + stave;
      const here = alongCourse[stave % 2] as (typeof alongCourse)[number];
      const wood = layout.cells[position] ?? 0;
      const kind = (here.kinds[wood] ??= firstOf(found, wood, here.drawing));
      kind.positions.push(position);
      if (down) kind.faceDown.push(position);
      if (here.drawing.halfTurned) kind.halfTurned.push(position);
    }
  }
  return numbered(found, layout);
}

function kindsOf(kinds: Map<string, KindsOfDrawing>, { key }: Drawing): KindsOfDrawing {
  const known = kinds.get(key) ?? [];
  kinds.set(key, known);
  return known;
}

function firstOf(found: Growing[], wood: number, { edges, mirrored }: Drawing): Growing {
  const kind: Growing = { wood, edges, mirrored, positions: [], faceDown: [], halfTurned: [] };
  found.push(kind);
  return kind;
}

function numbered(found: readonly Growing[], layout: Layout): PieceKind[] {
  return [...found]
    .sort((a, b) => a.wood - b.wood)
    .map((kind, i) => ({
      ...kind,
      number: i + 1,
      count: kind.positions.length,
      spares: spareCount(kind.positions.length, layout.build),
    }));
}

/** How a tile's piece lies on the machine. */
interface Drawing {
  readonly key: string;
  readonly edges: TileEdges;
  readonly mirrored: boolean;
  readonly halfTurned: boolean;
}

/**
 * The first drawing made that serves a tile, up to half a turn, or its own. `drawings` holds every drawing
 * made so far, so the lowest tile decides how its kind is drawn.
 */
function drawingOf(drawings: Map<string, Drawing>, edges: TileEdges, way: 'up' | 'down'): Drawing {
  const onMachine = way === 'down' ? faceDown(edges) : edges;
  const key = edgesKey(onMachine);
  const known = drawings.get(key);
  if (known) return known;
  const own: Drawing = {
    key,
    edges: onMachine,
    mirrored: key !== edgesKey(edges),
    halfTurned: false,
  };
  drawings.set(key, own);
  const turned = edgesKey(halfTurned(onMachine));
  if (!drawings.has(turned)) drawings.set(turned, { ...own, halfTurned: true });
  return own;
}
