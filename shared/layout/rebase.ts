/**
 * What happens to my unsaved edits when somebody else's were saved first. Mine are taken back, theirs are
 * applied, and mine are stated again on the result: a tile both laid keeps mine (and is reported), a field
 * both set is left as theirs and reported as a contest for the person to decide, everything else merges.
 * Where one side changed the size of the grid, tiles are followed by stave and course, not by position.
 */
import { carryPattern } from './carry';
import { cellAt, tileOf, type Grid } from './cells';
import {
  applyPatch,
  fieldsOf,
  readField,
  resizes,
  sameValue,
  type CellsChange,
  type Change,
  type FieldChange,
  type Patch,
  type ResizeChange,
} from './patch';
import type { Layout } from './schema';

/** A field, or the size of the grid, that both set differently. */
export type Contest = ContestedField | ContestedGrid;

export interface ContestedField {
  readonly kind: 'field';
  /** The change that would set mine over theirs. */
  readonly mine: FieldChange;
}

export interface ContestedGrid {
  readonly kind: 'grid';
  readonly mine: Grid;
  readonly theirs: Grid;
}

export interface Rebased {
  /** My patches, in the same order and number, stated on the document after theirs. */
  readonly mine: readonly Patch[];
  /** The document with theirs and mine. */
  readonly layout: Layout;
  /** Positions both laid, in the final grid, ascending; mine is on top. */
  readonly overlaid: readonly number[];
  readonly contests: readonly Contest[];
}

/** My patches made on `base`, stated again on the document after theirs. */
export function rebase(base: Layout, theirs: Patch, mine: readonly Patch[]): Rebased {
  const walk = new Walk(base, theirs);
  const restated = mine.map((patch) => patch.flatMap((change) => walk.restate(change) ?? []));
  return {
    mine: restated,
    layout: walk.now,
    overlaid: [...walk.overlaid].sort((a, b) => a - b),
    contests: [...walk.contests.values()],
  };
}

/** The patch with what it now finds as its "before", without changes that no longer change anything. */
export function restatePatch(layout: Layout, patch: Patch): Patch {
  return rebase(layout, [], [patch]).mine[0] ?? [];
}

/**
 * The part of an undo or redo that nobody else has overtaken: tiles and fields that still hold what the step
 * left there. What others set since stays theirs. A step that resized the grid is kept whole.
 */
export function stillMine(layout: Layout, step: Patch): Patch {
  if (resizes(step)) return step;
  let now = layout;
  const kept: Change[] = [];
  for (const change of step) {
    const mine = stillMineOf(now, change);
    if (!mine) continue;
    kept.push(mine);
    now = applyPatch(now, [mine]);
  }
  return kept;
}

function stillMineOf(now: Layout, change: Change): Change | null {
  if (change.kind === 'field') {
    return sameValue(readField(now, change.path), change.before) ? change : null;
  }
  if (change.kind !== 'cells') return change;
  const held = [...change.positions.keys()].filter(
    (i) => now.cells[change.positions[i] ?? 0] === change.before[i],
  );
  if (held.length === 0) return null;
  return {
    kind: 'cells',
    positions: held.map((i) => change.positions[i] ?? 0),
    before: held.map((i) => change.before[i] ?? 0),
    after: held.map((i) => change.after[i] ?? 0),
  };
}

/** Two timelines side by side: mine without theirs (`was`) and mine after theirs (`now`). */
class Walk {
  private was: Layout;
  now: Layout;
  overlaid = new Set<number>();
  readonly contests = new Map<string, Contest>();
  private readonly theirFields: ReadonlySet<string>;
  private readonly theyResized: boolean;
  /** Positions they laid, in the grid of `now`. */
  private theirTiles: Set<number>;

  constructor(base: Layout, theirs: Patch) {
    this.was = base;
    this.now = applyPatch(base, theirs);
    this.theirFields = new Set(fieldsOf(theirs));
    this.theyResized = resizes(theirs);
    this.theirTiles = tilesLaid(base, theirs);
  }

  restate(change: Change): Change | null {
    const restated = this.restated(change);
    this.was = applyPatch(this.was, [change]);
    if (restated) this.now = applyPatch(this.now, [restated]);
    return restated;
  }

  private restated(change: Change): Change | null {
    switch (change.kind) {
      case 'cells':
        return this.restatedCells(change);
      case 'field':
        return this.restatedField(change);
      case 'resize':
        return this.restatedResize(change);
    }
  }

  private restatedCells(change: CellsChange): CellsChange | null {
    const follow = follower(this.was.shell, this.now.shell);
    const laid: { position: number; before: number; after: number }[] = [];
    change.positions.forEach((from, i) => {
      const position = follow(from);
      const after = change.after[i] ?? 0;
      if (position === null || after >= this.now.woods.length) return;
      const before = this.now.cells[position] ?? 0;
      if (before === after) return;
      if (this.theirTiles.has(position)) this.overlaid.add(position);
      laid.push({ position, before, after });
    });
    if (laid.length === 0) return null;
    laid.sort((a, b) => a.position - b.position);
    return {
      kind: 'cells',
      positions: laid.map((tile) => tile.position),
      before: laid.map((tile) => tile.before),
      after: laid.map((tile) => tile.after),
    };
  }

  private restatedField(change: FieldChange): FieldChange | null {
    const before = readField(this.now, change.path);
    const restated = { ...change, before } as FieldChange;
    const changes = !sameValue(before, change.after);
    if (!this.theirFields.has(change.path)) return changes ? restated : null;
    if (changes) this.contests.set(change.path, { kind: 'field', mine: restated });
    else this.contests.delete(change.path);
    return null;
  }

  private restatedResize(change: ResizeChange): ResizeChange | null {
    const { staves, courses } = change.after;
    if (this.theyResized) {
      const theirs = { staves: this.now.shell.staves, courses: this.now.shell.courses };
      if (theirs.staves === staves && theirs.courses === courses) this.contests.delete('grid');
      else this.contests.set('grid', { kind: 'grid', mine: { staves, courses }, theirs });
      return null;
    }
    return this.resizedUnderTheirs(change);
  }

  /** My resize with their tiles carried into it where my resize itself left the tile alone. */
  private resizedUnderTheirs(change: ResizeChange): ResizeChange {
    const cells = change.after.cells.slice();
    const follow = follower(this.now.shell, change.after);
    const kept = carryPattern(change.before, change.after, 'keep').cells;
    const carried = new Set<number>();
    for (const from of this.theirTiles) {
      const position = follow(from);
      if (position === null) continue;
      carried.add(position);
      if (kept[position] === cells[position]) cells[position] = this.now.cells[from] ?? 0;
      else this.overlaid.add(position);
    }
    this.theirTiles = carried;
    this.overlaid = new Set([...this.overlaid].flatMap((from) => follow(from) ?? []));
    const { staves, courses } = this.now.shell;
    return {
      kind: 'resize',
      before: { staves, courses, cells: this.now.cells },
      after: { ...change.after, cells },
    };
  }
}

/** The positions a patch lays, each in the grid the patch ends with. */
function tilesLaid(base: Layout, patch: Patch): Set<number> {
  let grid: Grid = base.shell;
  let laid = new Set<number>();
  for (const change of patch) {
    if (change.kind === 'cells') change.positions.forEach((position) => laid.add(position));
    if (change.kind !== 'resize') continue;
    const follow = follower(grid, change.after);
    laid = new Set([...laid].flatMap((position) => follow(position) ?? []));
    grid = change.after;
  }
  return laid;
}

/** Where a tile of one grid lies in another, or null when it is not there any more. */
function follower(from: Grid, to: Grid): (position: number) => number | null {
  if (from.staves === to.staves && from.courses === to.courses) return (position) => position;
  return (position) => {
    const { stave, course } = tileOf(from, position);
    return stave < to.staves && course < to.courses ? cellAt(to, stave, course) : null;
  };
}
