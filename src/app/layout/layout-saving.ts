/**
 * How the open draft reaches the server: one save at a time through the queue, answers given back to the
 * draft. A conflict brings others' edits in and is sent again; an edit the server will never take is taken
 * back and told.
 */
import { signal } from '@angular/core';
import { conflictSchema, type Edit, type EditSaved } from '@shared/api/layout';
import { wirePatchOf } from '@shared/api/wire-patch';
import { apiFailureOf, type ApiFailure } from '../platform/api-problem';
import {
  isSaved,
  withAnswer,
  withSave,
  withSaveTakenBack,
  withTheirs,
  type Draft,
  type Met,
  type Save,
} from './draft';
import type { LayoutApi, SaveWay } from './layout-api';
import { SaveQueue, type Attempt } from './save-queue';

/** The open layout as saving sees it. */
export interface SavedDesk {
  /** Null before the layout is open. */
  open(): { readonly layoutId: string; readonly draft: Draft } | null;
  put(draft: Draft): void;
  /** Others' edits came in with an answer. */
  meet(met: Met): void;
  /** The last save was taken back for good. */
  takeBack(draft: Draft): void;
  /** True while somebody else has the layout open: they see what is saved. */
  inCompany(): boolean;
}

/** Pause after the last touch, ms; in company a tile is to show on the other screens within a second. */
const PAUSE_ALONE = 1_000;
const PAUSE_IN_COMPANY = 300;

export class LayoutSaving {
  private readonly refusedEdit = signal<ApiFailure | null>(null);
  private readonly queue = new SaveQueue({
    unsaved: () => this.unsaved(),
    attempt: () => this.attempt('staying'),
    pause: () => (this.desk.inCompany() ? PAUSE_IN_COMPANY : PAUSE_ALONE),
  });

  readonly state = this.queue.state;
  /** Why the server will never take the last edit, which was taken back; null when there is no such thing. */
  readonly refused = this.refusedEdit.asReadonly();

  constructor(
    private readonly api: LayoutApi,
    private readonly desk: SavedDesk,
  ) {}

  unsaved(): boolean {
    const open = this.desk.open();
    return open !== null && !isSaved(open.draft);
  }

  touch(): void {
    this.queue.touch();
  }

  flush(): Promise<void> {
    return this.queue.flush();
  }

  retry(): void {
    this.queue.retry();
  }

  stop(): void {
    this.queue.stop();
  }

  dismissRefusal(): void {
    this.refusedEdit.set(null);
  }

  /** Sends what is unsaved in a way that outlives the page. Edits made while a save is under way stay behind. */
  leave(): void {
    if (this.unsaved()) void this.attempt('leaving');
  }

  private async attempt(way: SaveWay): Promise<Attempt> {
    const open = this.desk.open();
    if (!open) return { kind: 'done' };
    const draft = withSave(open.draft, crypto.randomUUID());
    this.desk.put(draft);
    const save = draft.inFlight;
    if (!save) return { kind: 'not-yet' };
    try {
      const saved = await this.api.save(open.layoutId, wireEdit(save), way);
      const now = this.draftWith(save);
      if (now) this.desk.meet(withAnswer(now, saved));
      return { kind: 'done' };
    } catch (thrown) {
      return this.digest(save, apiFailureOf(thrown));
    }
  }

  private digest(save: Save, failure: ApiFailure): Attempt {
    const draft = this.draftWith(save);
    if (!draft) return { kind: 'done' };
    const conflict = conflictOf(failure);
    if (conflict) {
      this.desk.meet(withTheirs(draft, conflict));
      return { kind: 'again' };
    }
    if (!FINAL_CODES.has(failure.code)) return { kind: 'failed', sentence: failure.message };
    this.refusedEdit.set(failure);
    this.desk.takeBack(withSaveTakenBack(draft));
    return { kind: 'again' };
  }

  /** The draft while this save is still under way; it may have come in live before its answer. */
  private draftWith(save: Save): Draft | null {
    const draft = this.desk.open()?.draft ?? null;
    return draft?.inFlight?.key === save.key ? draft : null;
  }
}

/** Answers that will not change by asking again: the edit has to go. */
const FINAL_CODES: ReadonlySet<string> = new Set([
  'bad-input',
  'not-allowed',
  'not-found',
  'too-large',
]);

function wireEdit(save: Save): Edit {
  const { baseRevision, key, patch } = save;
  return { baseRevision, idempotencyKey: key, patch: wirePatchOf(patch) };
}

/** The conflict a 409 carries, or null when the failure is something else. */
function conflictOf(failure: ApiFailure): EditSaved | null {
  if (failure.code !== 'conflict') return null;
  const body = failure.body as { conflict?: unknown } | null;
  const parsed = conflictSchema.safeParse(body?.conflict);
  return parsed.success ? parsed.data : null;
}
