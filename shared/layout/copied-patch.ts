/**
 * A rectangle of the pattern copied to be laid again, here or in another layout. It carries its own woods, so
 * it can say which are meant where others are stocked, and travels as a small JSON text of its own.
 */
import * as z from 'zod';
import { cellAt, decodeCells, encodeCells, type Grid } from './cells';
import { positionsInBox, type LaidGrid, type Tile, type TileBox } from './extent';
import { relayChange, type CellsChange } from './patch';
import { imagesOf, ONCE, type Repeats } from './repeats';
import { BOUNDS, woodSchema, type Wood } from './schema';

/** Tiles copied: one byte a tile as in a layout, the index into its own woods. */
export interface CopiedPatch extends LaidGrid {
  readonly woods: readonly Wood[];
}

const FORMAT = 'staveloom-patch';
const FORMAT_VERSION = 1;
/** More characters than the largest pattern with the longest names needs. */
const TEXT_MOST = 65_536;

const copiedPatchSchema = z.strictObject({
  format: z.literal(FORMAT),
  formatVersion: z.literal(FORMAT_VERSION),
  staves: z.int().min(1).max(BOUNDS.staves.most),
  courses: z.int().min(1).max(BOUNDS.courses.most),
  woods: z.array(woodSchema).min(1).max(BOUNDS.woods.most),
  cells: z.string(),
});

/** The tiles of a rectangle, with the woods among them in the order of the layout's. */
export function copyPatch(grid: LaidGrid, woods: readonly Wood[], box: TileBox): CopiedPatch {
  const laid = positionsInBox(grid, box).map((position) => grid.cells[position] ?? 0);
  const used = [...new Set(laid)].sort((a, b) => a - b);
  return {
    staves: box.staves,
    courses: box.courses,
    woods: used.flatMap((wood) => woods[wood] ?? []),
    cells: Uint8Array.from(laid, (wood) => used.indexOf(wood)),
  };
}

/** A copied patch as text for the clipboard. */
export function printCopiedPatch({ staves, courses, woods, cells }: CopiedPatch): string {
  return JSON.stringify({
    format: FORMAT,
    formatVersion: FORMAT_VERSION,
    staves,
    courses,
    woods,
    cells: encodeCells(cells),
  });
}

/** The copied patch in a text, or null when the text is anything else. */
export function readCopiedPatch(text: string): CopiedPatch | null {
  if (text.length > TEXT_MOST) return null;
  const parsed = copiedPatchSchema.safeParse(parsedJson(text));
  const cells = parsed.success ? decodeCells(parsed.data.cells) : null;
  if (!parsed.success || !cells) return null;
  const { staves, courses, woods } = parsed.data;
  if (cells.length !== staves * courses || cells.some((wood) => wood >= woods.length)) return null;
  if (new Set(woods.map(({ key }) => key)).size < woods.length) return null;
  return { staves, courses, woods, cells };
}

function parsedJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return null;
  }
}

export interface PatchPlace {
  /** Where the lower left tile of the patch goes. */
  readonly at: Tile;
  /** The layout's wood for each wood of the patch. */
  readonly woods: readonly number[];
  readonly repeats?: Repeats;
}

/** Positions a copied patch covers with the wood each gets; where repeats meet, the later one lies on top. */
export function copiedTiles(
  grid: Grid,
  patch: CopiedPatch,
  { at, woods, repeats = ONCE }: PatchPlace,
): Map<number, number> {
  const laid = new Map<number, number>();
  // a patch wider than the shell is laid once round and no further
  const staves = Math.min(patch.staves, grid.staves);
  for (let course = 0; course < patch.courses; course++) {
    for (let stave = 0; stave < staves; stave++) {
      const wood = woods[patch.cells[course * patch.staves + stave] ?? 0] ?? 0;
      const tile = { stave: at.stave + stave, course: at.course + course };
      for (const image of imagesOf(grid, tile, repeats)) {
        laid.set(cellAt(grid, image.stave, image.course), wood);
      }
    }
  }
  return laid;
}

/** The change that lays a copied patch, or null when it lies there already. */
export function layCopiedPatch(
  grid: LaidGrid,
  patch: CopiedPatch,
  place: PatchPlace,
): CellsChange | null {
  const wished = grid.cells.slice();
  for (const [position, wood] of copiedTiles(grid, patch, place)) wished[position] = wood;
  return relayChange(grid.cells, wished);
}
