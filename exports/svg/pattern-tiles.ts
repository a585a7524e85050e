/**
 * The tiles of the map. What a tile shows (outline, wood, kind number, face-down mark) is defined once for
 * all tiles that show the same and placed with <use>, so the largest shell stays under a megabyte.
 */
import { tileName, tileOf } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import type { PieceKind } from '@shared/pieces/piece-kind';
import { tileEdges, type TileEdges } from '@shared/pieces/tile-edges';
import { nominalTileOutline } from '@shared/pieces/tile-outline';
import { pathData } from './path-data';
import type { MapSize } from './pattern-map';
import { faceDownMark, inkOn, LINE_COLOUR, patternDecimal as decimal } from './pattern-marks';
import { element, textElement, type Markup } from './xml';

/** Beyond this many tiles their names stand only at the ends of courses and staves. */
const NAMED_TILES_MOST = 5000;

export interface DrawnTiles {
  /** What the tiles refer to. */
  readonly definitions: readonly Markup[];
  /** One group a course, from the bottom. */
  readonly courses: readonly Markup[];
}

/** A tile as the map shows it. */
interface MapTile {
  readonly kind: PieceKind;
  readonly edges: TileEdges;
  readonly way: 'up' | 'down';
  readonly colour: string;
}

/** Every tile of the layout in its place: seam at x = 0, untrimmed bottom at y = 0, y running down. */
export function drawTiles(layout: Layout, kinds: readonly PieceKind[], map: MapSize): DrawnTiles {
  const { shell } = layout;
  const named = shell.staves * shell.courses <= NAMED_TILES_MOST;
  const drawings = new Map<string, Markup>();
  const rows: Markup[][] = Array.from({ length: shell.courses }, () => []);
  mapTiles(layout, kinds).forEach((tile, position) => {
    const { stave, course } = tileOf(shell, position);
    const id = tileId(tile);
    if (!drawings.has(id)) drawings.set(id, tileDrawing(layout, tile, map));
    const x = decimal((stave + 0.5) * shell.tileWidth);
    const row = rows[course];
    row?.push(element('use', { href: `#${id}`, x }));
    if (named) row?.push(tileLabel(tileName(stave, course), x, tile, map));
  });
  return {
    definitions: [...drawings.values()],
    courses: rows.map((tiles, course) => {
      const y = decimal(-(course + 0.5) * shell.tileHeight);
      return element('g', { transform: `translate(0 ${y})` }, tiles);
    }),
  };
}

/** The tiles in the order of the cells. */
function mapTiles(layout: Layout, kinds: readonly PieceKind[]): MapTile[] {
  const tiles = new Array<MapTile>(layout.cells.length);
  for (const kind of kinds) {
    const down = new Set(kind.faceDown);
    const colour = layout.woods[kind.wood]?.colour ?? '#ffffff';
    for (const position of kind.positions) {
      const { stave, course } = tileOf(layout.shell, position);
      const edges = tileEdges(layout.joint.scheme, layout.shell, stave, course);
      tiles[position] = { kind, edges, way: down.has(position) ? 'down' : 'up', colour };
    }
  }
  return tiles;
}

/** The same for tiles that show the same, and short since it stands in every tile: "k3ustft". */
function tileId({ kind, edges, way }: MapTile): string {
  const { left, right, bottom, top } = edges;
  const initials = [way, left, right, bottom, top].map((word) => word.charAt(0)).join('');
  return `k${kind.number}${initials}`;
}

function tileDrawing(layout: Layout, tile: MapTile, map: MapSize): Markup {
  const { segments } = nominalTileOutline(layout, tile.edges);
  const ink = inkOn(tile.colour);
  const number = textElement('text', String(tile.kind.number), {
    y: decimal(0.36 * map.core),
    'font-size': decimal(0.54 * map.core),
    fill: ink,
  });
  const path = { fill: tile.colour, stroke: LINE_COLOUR, d: pathData(segments, { flipY: true }) };
  return element('g', { id: tileId(tile) }, [
    element('path', path),
    number,
    ...(tile.way === 'down' ? [faceDownMark(map.core, ink)] : []),
  ]);
}

function tileLabel(name: string, x: string, { colour }: MapTile, map: MapSize): Markup {
  return textElement('text', name, {
    x,
    y: decimal(-0.14 * map.core),
    'font-size': decimal(0.3 * map.core),
    fill: inkOn(colour),
  });
}
