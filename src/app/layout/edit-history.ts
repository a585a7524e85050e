/**
 * Undo and redo as patches. A step is what one gesture did; undoing it is itself an edit that is saved.
 * Steps hold tile positions, so when somebody else resizes the grid the steps are forgotten: their
 * positions would name other tiles.
 */
import { computed, signal } from '@angular/core';
import { fieldsOf, squashPatches, type Patch } from '@shared/layout/patch';

/** One thing done, as it is named in "Undo …". */
export interface Step {
  readonly label: string;
  readonly patch: Patch;
}

/** Typing in one field goes on as one step while its pauses are shorter than this, ms. */
const TYPING_PAUSE = 2_000;

export class EditHistory {
  private lastNoted = -Infinity;
  private readonly done = signal<readonly Step[]>([]);
  private readonly undone = signal<readonly Step[]>([]);

  readonly undoLabel = computed(() => this.done().at(-1)?.label ?? null);
  readonly redoLabel = computed(() => this.undone().at(-1)?.label ?? null);

  /** Notes a step, done at `now` (ms); what was undone before it can no longer be redone. */
  note(step: Step, now: number): void {
    const last = this.done().at(-1);
    const typing = now - this.lastNoted < TYPING_PAUSE && this.undone().length === 0;
    this.lastNoted = now;
    if (last && typing && setsSameFields(last, step)) {
      const patch = squashPatches(last.patch, step.patch);
      this.done.update((steps) => [...steps.slice(0, -1), { label: step.label, patch }]);
      return;
    }
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

/** True when both steps do nothing but set the same fields under the same name. */
function setsSameFields(a: Step, b: Step): boolean {
  const fields = fieldsOf(a.patch);
  const fieldsOnly = [...a.patch, ...b.patch].every((change) => change.kind === 'field');
  return a.label === b.label && fieldsOnly && fields.join() === fieldsOf(b.patch).join();
}

type Steps = ReturnType<typeof signal<readonly Step[]>>;

function move(from: Steps, to: Steps): Step | null {
  const step = from().at(-1);
  if (!step) return null;
  from.update((steps) => steps.slice(0, -1));
  to.update((steps) => [...steps, step]);
  return step;
}
