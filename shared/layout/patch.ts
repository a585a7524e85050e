/**
 * Edits as data. A patch is a list of changes in order; each names what was there before and what is there
 * after, so it can be applied, inverted and squashed without the document it came from. The browser's undo,
 * its save queue and the server all use these functions.
 */
import type { Build, Cutter, Joint, Layout, Wood } from './schema';

/** Tiles laid: positions in the cells with the wood before and after. */
export interface CellsChange {
  readonly kind: 'cells';
  readonly positions: readonly number[];
  readonly before: readonly number[];
  readonly after: readonly number[];
}

/** The fields a change may set. The sizes of the grid change with `resize`, never alone. */
export interface LayoutFields {
  name: string;
  lengthUnit: Layout['lengthUnit'];
  'shell.tileWidth': number;
  'shell.tileHeight': number;
  'shell.finishedOuterDiameter': number;
  'shell.finishedInnerDiameter': number;
  'shell.finishedHeight': number;
  'shell.boardThickness': number;
  'shell.skimAllowance': number;
  'joint.scheme': Joint['scheme'];
  'joint.clearance': number;
  'joint.staveJoint': Joint['staveJoint'];
  'joint.courseJoint': Joint['courseJoint'];
  'cutter.diameter': Cutter['diameter'];
  'cutter.fluteLength': Cutter['fluteLength'];
  'build.way': Build['way'];
  'build.turnOver': boolean;
  'build.spareShare': number;
  'build.spareMinimum': number;
  woods: readonly Wood[];
}

export type FieldPath = keyof LayoutFields;

/** One field set. */
export type FieldChange = {
  [P in FieldPath]: {
    readonly kind: 'field';
    readonly path: P;
    readonly before: LayoutFields[P];
    readonly after: LayoutFields[P];
  };
}[FieldPath];

/** Size and pattern of the grid at one moment. */
export interface GridState {
  readonly staves: number;
  readonly courses: number;
  readonly cells: Uint8Array;
}

/** Another number of staves or courses, with the whole pattern before and after. */
export interface ResizeChange {
  readonly kind: 'resize';
  readonly before: GridState;
  readonly after: GridState;
}

export type Change = CellsChange | FieldChange | ResizeChange;

export type Patch = readonly Change[];

/** The change that sets one field of this layout, or null when it already has that value. */
export function fieldChange<P extends FieldPath>(
  layout: Layout,
  path: P,
  after: LayoutFields[P],
): FieldChange | null {
  const before = readField(layout, path);
  if (sameValue(before, after)) return null;
  return { kind: 'field', path, before, after } as FieldChange;
}

/** The change that lays one wood on some tiles, or null when they all have it. */
export function layChange(
  cells: Uint8Array,
  positions: Iterable<number>,
  wood: number,
): CellsChange | null {
  const changed = [...new Set(positions)].filter((p) => cells[p] !== wood).sort((a, b) => a - b);
  if (changed.length === 0) return null;
  return {
    kind: 'cells',
    positions: changed,
    before: changed.map((p) => cells[p] ?? 0),
    after: changed.map(() => wood),
  };
}

/** The change from one pattern to another of the same size, or null when they are the same. */
export function relayChange(cells: Uint8Array, wished: Uint8Array): CellsChange | null {
  const positions = [...cells.keys()].filter((p) => cells[p] !== wished[p]);
  if (positions.length === 0) return null;
  return {
    kind: 'cells',
    positions,
    before: positions.map((p) => cells[p] ?? 0),
    after: positions.map((p) => wished[p] ?? 0),
  };
}

/** The value of a field. */
export function readField<P extends FieldPath>(layout: Layout, path: P): LayoutFields[P] {
  const [group, name] = path.split('.') as [keyof Layout, string | undefined];
  const value = layout[group];
  return (name === undefined ? value : (value as Record<string, unknown>)[name]) as LayoutFields[P];
}

/** The layout after the patch. Positions outside the grid are ignored by nobody: callers validate first. */
export function applyPatch(layout: Layout, patch: Patch): Layout {
  return patch.reduce(applyChange, layout);
}

function applyChange(layout: Layout, change: Change): Layout {
  switch (change.kind) {
    case 'cells': {
      const cells = layout.cells.slice();
      change.positions.forEach((position, i) => {
        cells[position] = change.after[i] ?? 0;
      });
      return { ...layout, cells };
    }
    case 'field':
      return writeField(layout, change.path, change.after);
    case 'resize': {
      const { staves, courses, cells } = change.after;
      return { ...layout, shell: { ...layout.shell, staves, courses }, cells: cells.slice() };
    }
  }
}

function writeField(layout: Layout, path: FieldPath, value: unknown): Layout {
  const [group, name] = path.split('.') as [keyof Layout, string | undefined];
  if (name === undefined) return { ...layout, [group]: value };
  return { ...layout, [group]: { ...(layout[group] as object), [name]: value } };
}

/** The patch that takes this one back. */
export function invertPatch(patch: Patch): Patch {
  return patch.map(invertChange).reverse();
}

function invertChange(change: Change): Change {
  return { ...change, before: change.after, after: change.before } as Change;
}

/** One patch with the effect of both in turn: strokes over the same tiles and fields melt together. */
export function squashPatches(first: Patch, second: Patch): Patch {
  return second.reduce(squashChange, first);
}

function squashChange(patch: Patch, next: Change): Patch {
  const at = meltingPlace(patch, next);
  if (at === -1) return [...patch, next];
  const melted = melt(patch[at] as Change, next);
  return [...patch.slice(0, at), ...(melted ? [melted] : []), ...patch.slice(at + 1)];
}

/** Index of the change `next` can melt into without passing a change whose order matters, or −1. */
function meltingPlace(patch: Patch, next: Change): number {
  for (let i = patch.length - 1; i >= 0; i--) {
    const earlier = patch[i] as Change;
    if (earlier.kind === next.kind && samePlace(earlier, next)) return i;
    if (!commute(earlier, next)) return -1;
  }
  return -1;
}

function samePlace(a: Change, b: Change): boolean {
  return a.kind !== 'field' || (b.kind === 'field' && a.path === b.path);
}

function commute(a: Change, b: Change): boolean {
  const fieldOnly = a.kind === 'field' || b.kind === 'field';
  return fieldOnly;
}

function melt(first: Change, second: Change): Change | null {
  if (first.kind === 'cells' && second.kind === 'cells') return meltCells(first, second);
  const melted = { ...second, before: first.before } as Change;
  return sameValue(melted.before, melted.after) ? null : melted;
}

function meltCells(first: CellsChange, second: CellsChange): CellsChange | null {
  const woods = new Map<number, { before: number; after: number }>();
  for (const change of [first, second]) {
    change.positions.forEach((position, i) => {
      const before = woods.get(position)?.before ?? change.before[i] ?? 0;
      woods.set(position, { before, after: change.after[i] ?? 0 });
    });
  }
  const kept = [...woods].filter(([, w]) => w.before !== w.after).sort(([a], [b]) => a - b);
  if (kept.length === 0) return null;
  return {
    kind: 'cells',
    positions: kept.map(([position]) => position),
    before: kept.map(([, w]) => w.before),
    after: kept.map(([, w]) => w.after),
  };
}

/** What two patches both touch, or null when they can be applied in either order. */
export interface Overlap {
  readonly positions: readonly number[];
  readonly fields: readonly FieldPath[];
  /** True when one of them resizes the grid and the other touches cells or the grid. */
  readonly grid: boolean;
}

/** The places two patches made on the same document both touch, or null when there are none. */
export function overlapOf(a: Patch, b: Patch): Overlap | null {
  const touchedB = positionsOf(b);
  const fieldsB = new Set(fieldsOf(b));
  const positions = [...positionsOf(a)].filter((p) => touchedB.has(p)).sort((x, y) => x - y);
  const fields = fieldsOf(a).filter((path) => fieldsB.has(path));
  const grid = (resizes(a) && touchesGrid(b)) || (resizes(b) && touchesGrid(a));
  return positions.length > 0 || fields.length > 0 || grid ? { positions, fields, grid } : null;
}

/** Every tile position a patch lays. */
export function positionsOf(patch: Patch): Set<number> {
  return new Set(patch.flatMap((change) => (change.kind === 'cells' ? change.positions : [])));
}

/** Every field a patch sets. */
export function fieldsOf(patch: Patch): FieldPath[] {
  return [...new Set(patch.flatMap((change) => (change.kind === 'field' ? [change.path] : [])))];
}

/** True when the patch changes the number of staves or courses. */
export function resizes(patch: Patch): boolean {
  return patch.some((change) => change.kind === 'resize');
}

function touchesGrid(patch: Patch): boolean {
  return patch.some((change) => change.kind !== 'field' || change.path === 'woods');
}

/** True when two document values are equal, key order aside. */
export function sameValue(a: unknown, b: unknown): boolean {
  return canonical(a) === canonical(b);
}

function canonical(value: unknown): string {
  return JSON.stringify(value, (_, v: unknown) => {
    if (v instanceof Uint8Array) return Array.from(v);
    if (v === null || typeof v !== 'object' || Array.isArray(v)) return v;
    return Object.fromEntries(Object.entries(v).sort(([x], [y]) => (x < y ? -1 : 1)));
  });
}

/** The patch that turns one layout into another; empty when they are the same. */
export function patchBetween(from: Layout, to: Layout): Patch {
  const changes: Change[] = [];
  for (const path of FIELD_PATHS) {
    const change = fieldChange(from, path, readField(to, path));
    if (change) changes.push(change);
  }
  const gridChange = gridChangeBetween(from, to);
  return gridChange ? [...changes, gridChange] : changes;
}

function gridChangeBetween(from: Layout, to: Layout): Change | null {
  const before = gridStateOf(from);
  const after = gridStateOf(to);
  if (before.staves !== after.staves || before.courses !== after.courses) {
    return { kind: 'resize', before, after };
  }
  return relayChange(from.cells, to.cells);
}

/** Size and pattern of a layout. */
export function gridStateOf(layout: Layout): GridState {
  return { staves: layout.shell.staves, courses: layout.shell.courses, cells: layout.cells };
}

/** Every field, in the order of the file. */
export const FIELD_PATHS: readonly FieldPath[] = [
  'name',
  'lengthUnit',
  'shell.tileWidth',
  'shell.tileHeight',
  'shell.finishedOuterDiameter',
  'shell.finishedInnerDiameter',
  'shell.finishedHeight',
  'shell.boardThickness',
  'shell.skimAllowance',
  'joint.scheme',
  'joint.clearance',
  'joint.staveJoint',
  'joint.courseJoint',
  'cutter.diameter',
  'cutter.fluteLength',
  'build.way',
  'build.turnOver',
  'build.spareShare',
  'build.spareMinimum',
  'woods',
];
