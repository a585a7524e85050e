/**
 * Undo and redo as patches. A step is what one gesture did; undoing it is itself an edit that is saved.
 * Steps hold tile positions, so when somebody else resizes the grid the steps are forgotten: their
 * positions would name other tiles.
 */
import { computed, signal } from '@angular/core';
import type { Patch } from '@shared/layout/patch';

/** One thing done, as it is named in "Undo …". */
export interface Step {
  readonly label: string;
  readonly patch: Patch;
}

export class EditHistory {
  private readonly done = signal<readonly Step[]>([]);
  private readonly undone = signal<readonly Step[]>([]);

  readonly undoLabel = computed(() => this.done().at(-1)?.label ?? null);
  readonly redoLabel = computed(() => this.undone().at(-1)?.label ?? null);

  /** Notes a step; what was undone before it can no longer be redone. */
  note(step: Step): void {
    this.done.update((steps) => [...steps, step]);
    this.undone.set([]);
  }

  /** Moves the last step to the undone ones and returns it. */
  takeUndo(): Step | null {
    return move(this.done, this.undone);
  }

  /** Moves the last undone step back and returns it. */
  takeRedo(): Step | null {
    return move(this.undone, this.done);
  }

  forget(): void {
    this.done.set([]);
    this.undone.set([]);
  }
}

type Steps = ReturnType<typeof signal<readonly Step[]>>;

function move(from: Steps, to: Steps): Step | null {
  const step = from().at(-1);
  if (!step) return null;
  from.update((steps) => steps.slice(0, -1));
  to.update((steps) => [...steps, step]);
  return step;
}
