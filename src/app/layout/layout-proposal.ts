/**
 * Values a person is typing. As soon as all of them together make a layout that holds together, they
 * become one edit; until then the document keeps its last good values, nothing typed is lost, and each
 * field says what it must be.
 */
import { computed, signal, type Signal } from '@angular/core';
import type { Grid } from '@shared/layout/cells';
import { problemsOf } from '@shared/layout/consistency';
import {
  applyPatch,
  fieldChange,
  type Change,
  type FieldPath,
  type LayoutFields,
} from '@shared/layout/patch';
import { resizeChange, type Carry } from '@shared/layout/carry';
import type { Layout, Problem } from '@shared/layout/schema';
import { madeChanges } from './draft';
import type { LayoutStore } from './layout-store';

/** Values by field. */
export type Wishes = Partial<LayoutFields>;

interface GridWish {
  readonly grid: Grid;
  readonly carry: Carry;
}

export class LayoutProposal {
  private readonly wishes = signal<Wishes>({});
  private readonly gridWish = signal<GridWish | null>(null);

  /** The document with what is being typed, whether it holds together or not. */
  readonly candidate: Signal<Layout>;
  readonly problems: Signal<readonly Problem[]>;
  /** The candidate when it holds together, the document otherwise: what drawings show. */
  readonly drawn: Signal<Layout>;

  constructor(private readonly store: LayoutStore) {
    const sound = computed(() => withCells(store.soundLayout(), store.cells()));
    const changes = computed(() => this.changes(sound()));
    this.candidate = computed(() => applyPatch(sound(), changes()));
    this.problems = computed(() => (changes().length > 0 ? problemsOf(this.candidate()) : []));
    this.drawn = computed(() => (this.problems().length === 0 ? this.candidate() : sound()));
  }

  /** Fields were typed in: an edit as soon as the whole holds together. */
  wish(wished: Wishes, label: string): void {
    this.wishes.update((wishes) => ({ ...wishes, ...wished }));
    this.settle(label);
  }

  /** A size of the grid is being typed: drawn, but not yet an edit, since tiles would be cut off. */
  preview(grid: Grid): void {
    this.gridWish.set({ grid, carry: 'keep' });
  }

  /** The typed size of the grid counts, and the pattern is carried over like this. */
  resize(grid: Grid, carry: Carry, label: string): void {
    this.gridWish.set({ grid, carry });
    this.settle(label);
  }

  /** The typed size of the grid is given up. */
  leaveSize(): void {
    this.gridWish.set(null);
  }

  /** Takes back what was typed and did not hold together. */
  forget(): void {
    this.wishes.set({});
    this.gridWish.set(null);
  }

  /** The sentence for a field, or null. */
  problemOf(field: string): string | null {
    const problem = this.problems().find((found) => found.field === field);
    return problem ? `${sentence(problem.message)}.` : null;
  }

  private settle(label: string): void {
    const patch = this.changes(this.store.layout());
    if (problemsOf(applyPatch(this.store.layout(), patch)).length > 0) return;
    this.store.edit(label, ...patch);
    this.forget();
  }

  private changes(layout: Layout): Change[] {
    const wishes = this.wishes();
    const wish = this.gridWish();
    const paths = Object.keys(wishes) as FieldPath[];
    return [
      ...madeChanges([wish && resizeChange(layout, wish.grid, wish.carry)]),
      ...madeChanges(paths.map((path) => changeOf(layout, path, wishes))),
    ];
  }
}

/** The layout with today's tiles, which `soundLayout` does not follow. */
function withCells(layout: Layout, cells: Uint8Array): Layout {
  return cells.length === layout.cells.length ? { ...layout, cells } : layout;
}

function changeOf(layout: Layout, path: FieldPath, wishes: Wishes): Change | null {
  const value = wishes[path];
  return value === undefined ? null : fieldChange(layout, path, value);
}

function sentence(message: string): string {
  return message.charAt(0).toUpperCase() + message.slice(1);
}
