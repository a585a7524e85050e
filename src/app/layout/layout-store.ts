/**
 * The open layout. Screens read it as signals and change it with gestures; it undoes, saves and merges by
 * itself. Provided on the layout's route: it lives as long as the layout is open.
 */
import {
  computed,
  effect,
  inject,
  Injectable,
  signal,
  untracked,
  type OnDestroy,
  type Signal,
} from '@angular/core';
import type { OpenLayout, RecordedEdit } from '@shared/api/layout';
import type { VersionKept } from '@shared/api/version';
import type { Grid } from '@shared/layout/cells';
import {
  invertPatch,
  patchBetween,
  resizes,
  sameValue,
  type Change,
  type Patch,
} from '@shared/layout/patch';
import { readLayout } from '@shared/layout/read-layout';
import { restatePatch, stillMine, type Contest } from '@shared/layout/rebase';
import type { Layout, Wood } from '@shared/layout/schema';
import type { LengthUnit } from '@shared/units/length';
import { Subject, type Observable } from 'rxjs';
import { Announcer } from '../platform/announcer';
import { ApiFailure, apiFailureOf } from '../platform/api-problem';
import { SessionStore } from '../platform/session-store';
import {
  madeChanges,
  openDraft,
  withEdit,
  withGestureFinished,
  withGestureTakenBack,
  withLive,
  withMove,
  type Draft,
  type Met,
} from './draft';
import { EditHistory } from './edit-history';
import { KeptDrafts, type DraftKeeper } from './kept-drafts';
import { LayoutApi } from './layout-api';
import { LayoutSaving } from './layout-saving';
import { LiveEvents } from './live-events';
import type { SaveState } from './save-queue';
import { checksOf, soundLayoutOf } from './sound-layout';

export interface OpenedLayout {
  readonly id: string;
  readonly commission: OpenLayout['commission'];
  readonly lastVersion: OpenLayout['lastVersion'];
}

export type Opening =
  | { readonly kind: 'opening' }
  | { readonly kind: 'open' }
  | { readonly kind: 'failed'; readonly failure: ApiFailure };

export type Origin = 'mine' | 'theirs' | 'undo' | 'redo' | 'opened';

/** A change of the document on the screen, as it was just applied. */
export interface Applied {
  readonly patch: Patch;
  readonly origin: Origin;
}

/** One thing a person does, from press to release: its moves are one step to undo and one edit to save. */
export interface Gesture {
  apply(...changes: (Change | null)[]): void;
  finish(): void;
  /** Takes back everything the gesture did. */
  cancel(): void;
}

const OVERTAKEN = 'Somebody else has changed part of that since; theirs stays.';

@Injectable()
export class LayoutStore implements OnDestroy {
  private readonly api = inject(LayoutApi);
  private readonly session = inject(SessionStore);
  private readonly announcer = inject(Announcer);
  private readonly live = inject(LiveEvents);
  private readonly keptDrafts = inject(KeptDrafts);
  private readonly keeper = signal<DraftKeeper | null>(null);
  private readonly draft = signal<Draft | null>(null);
  private readonly opening = signal<Opening>({ kind: 'opening' });
  private readonly openedLayout = signal<OpenedLayout | null>(null);
  private readonly overlaid = signal<ReadonlySet<number>>(new Set());
  private readonly openContests = signal<readonly Contest[]>([]);
  private readonly underHand = signal(false);
  private readonly appliedSubject = new Subject<Applied>();
  private readonly history = new EditHistory();
  private readonly saves = new LayoutSaving(this.api, {
    open: () => this.openForSaving(),
    put: (draft) => this.draft.set(draft),
    meet: (met) => this.meet(met),
    takeBack: (draft) => this.lose(draft),
    inCompany: () => this.people().length > 0,
  });
  private commissionId = '';

  readonly opened = this.openedLayout.asReadonly();
  readonly openState = this.opening.asReadonly();
  /** The document with unconfirmed edits. Throws before the layout is open: look at `opened` first. */
  readonly layout: Signal<Layout> = computed(() => this.openDraft().local);
  readonly cells = computed(() => this.layout().cells);
  readonly woods: Signal<readonly Wood[]> = computed(() => this.layout().woods);
  readonly grid: Signal<Grid> = computed(
    () => ({ staves: this.layout().shell.staves, courses: this.layout().shell.courses }),
    { equal: (a, b) => a.staves === b.staves && a.courses === b.courses },
  );
  readonly lengthUnit: Signal<LengthUnit> = computed(() => this.layout().lengthUnit);
  /** The document for drawings and checks: sizes, joints and what else is not the pattern. */
  readonly soundLayout: Signal<Layout> = soundLayoutOf(this.layout);
  readonly checks = checksOf(this.layout, this.soundLayout);
  /** The revision the server has. */
  readonly revision = computed(() => this.openDraft().revision);
  readonly saving: Signal<SaveState> = this.saves.state;
  readonly rights = {
    editPattern: computed(() => this.session.may('edit-pattern')),
    editJoint: computed(() => this.session.may('edit-joint')),
    keepVersions: computed(() => this.session.may('keep-versions')),
    exportBundle: computed(() => this.session.may('export-bundle')),
  };
  /** True from press to release: nothing else may be done meanwhile. */
  readonly gestureOpen = this.underHand.asReadonly();
  readonly undoLabel = this.history.undoLabel;
  readonly redoLabel = this.history.redoLabel;
  readonly canUndo = computed(() => !this.underHand() && this.undoLabel() !== null);
  readonly canRedo = computed(() => !this.underHand() && this.redoLabel() !== null);
  /** Tiles where somebody else's edit met mine; mine is on top. */
  readonly overlaidByMine = this.overlaid.asReadonly();
  /** Fields both set, waiting for the person's choice. */
  readonly contests = this.openContests.asReadonly();
  /** Why the server will never take my last edit, which was taken back; null when there is no such thing. */
  readonly refused = this.saves.refused;
  /** Everybody else who has the layout open. */
  readonly people = this.live.people;
  readonly applied$: Observable<Applied> = this.appliedSubject.asObservable();

  constructor() {
    const unsent = computed(() => this.draft(), { equal: sameUnsent });
    effect(() => {
      const draft = unsent();
      const keeper = this.keeper();
      if (draft && keeper) untracked(() => keeper.keep(draft));
    });
  }

  ngOnDestroy(): void {
    this.commissionId = '';
    this.keeper()?.leave();
    this.saves.stop();
    this.appliedSubject.complete();
  }

  /** Opens the layout of a commission; `openState` says how it went. */
  async open(commissionId: string): Promise<void> {
    this.commissionId = commissionId;
    this.opening.set({ kind: 'opening' });
    try {
      const open = await this.api.open(commissionId);
      this.keeper()?.leave();
      const keeper = await this.keptDrafts.claim(this.session.person()?.id ?? '', open.id);
      // the page was left, or another layout asked for, while the answer was under way
      if (this.commissionId !== commissionId) {
        keeper.leave();
        return;
      }
      this.show(open, keeper.found);
      this.keeper.set(keeper);
    } catch (thrown) {
      this.opening.set({ kind: 'failed', failure: apiFailureOf(thrown) });
    }
  }

  /** Opens again after a failure, or tries a failed save again at once. */
  retry(): void {
    if (this.opening().kind === 'failed') void this.open(this.commissionId);
    else {
      this.saves.retry();
      this.live.retry();
    }
  }

  /** Saves everything now; resolves when it is saved or failed, `saving` says which. */
  flush(): Promise<void> {
    return this.saves.flush();
  }

  /** True while something would be lost if the page went away now. */
  unsaved(): boolean {
    return this.saves.unsaved();
  }

  begin(label: string): Gesture {
    if (this.underHand())
      throw new Error(`A gesture is still under the hand; "${label}" must wait`);
    this.underHand.set(true);
    return {
      apply: (...changes) => this.move(madeChanges(changes)),
      finish: () => this.finish(label),
      cancel: () => this.takeBack(),
    };
  }

  /** A gesture of one; does nothing when every change is null. */
  edit(label: string, ...changes: (Change | null)[]): void {
    const patch = madeChanges(changes);
    if (patch.length === 0) return;
    const gesture = this.begin(label);
    gesture.apply(...patch);
    gesture.finish();
  }

  undo(): void {
    if (!this.canUndo()) return;
    this.step(() => this.history.takeUndo(), invertPatch, 'undo');
  }

  redo(): void {
    if (!this.canRedo()) return;
    this.step(
      () => this.history.takeRedo(),
      (patch) => patch,
      'redo',
    );
  }

  /** The person has chosen about a contested field; "mine" is then set with an edit like any other. */
  settleContest(contest: Contest): void {
    this.openContests.update((contests) => contests.filter((open) => open !== contest));
  }

  /** The person has read why an edit was taken back. */
  dismissRefusal(): void {
    this.saves.dismissRefusal();
  }

  /** A version was kept of the draft as the server has it. */
  versionKept(kept: VersionKept): void {
    const { number, revision } = kept.version;
    this.openedLayout.update(
      (opened) => opened && { ...opened, lastVersion: { number, revision } },
    );
  }

  /** Sends what is unsaved in a way that outlives the page. Edits made while a save is under way stay behind. */
  saveLeaving(): void {
    this.saves.leave();
  }

  private openForSaving() {
    const opened = this.openedLayout();
    const draft = this.draft();
    return opened && draft ? { layoutId: opened.id, draft } : null;
  }

  private openDraft(): Draft {
    const draft = this.draft();
    if (!draft) throw new Error('The layout is not open yet');
    return draft;
  }

  private show(open: OpenLayout, kept: Draft | null): void {
    const { revision, id, commission, lastVersion } = open;
    const reading = readLayout(open.layout);
    if (!reading.ok) throw new ApiFailure(200, 'failed', UNREADABLE);
    // edits that never reached the server go on from where they stood; what others did since comes in live
    const unsent = kept && kept.revision <= revision ? kept : null;
    this.draft.set(unsent ?? openDraft(reading.layout, revision));
    this.openedLayout.set({ id, commission, lastVersion });
    this.history.forget();
    this.overlaid.set(new Set());
    this.opening.set({ kind: 'open' });
    this.appliedSubject.next({ patch: [], origin: 'opened' });
    if (unsent) this.saves.touch();
    this.live.watch({
      layoutId: id,
      since: () => this.openDraft().revision,
      onEdit: (edit) => this.hear(edit),
    });
  }

  private move(patch: Patch): void {
    if (patch.length === 0) return;
    this.draft.set(withMove(this.openDraft(), patch));
    this.appliedSubject.next({ patch, origin: 'mine' });
  }

  private finish(label: string): void {
    const { draft, patch } = withGestureFinished(this.openDraft());
    this.underHand.set(false);
    this.draft.set(draft);
    if (patch.length === 0) return;
    this.history.note({ label, patch }, Date.now());
    this.touched(patch);
  }

  private takeBack(): void {
    const { draft, patch } = withGestureTakenBack(this.openDraft());
    this.underHand.set(false);
    this.draft.set(draft);
    if (patch.length > 0) this.appliedSubject.next({ patch, origin: 'mine' });
  }

  /** Undoes or redoes one step; steps that others' edits left without effect are passed over. */
  private step(
    take: () => { patch: Patch } | null,
    turn: (patch: Patch) => Patch,
    origin: 'undo' | 'redo',
  ): void {
    for (let step = take(); step; step = take()) {
      const turned = turn(step.patch);
      const mine = stillMine(this.layout(), turned);
      if (!sameValue(mine, turned)) this.announcer.tell(OVERTAKEN);
      const patch = restatePatch(this.layout(), mine);
      if (patch.length === 0) continue;
      this.draft.set(withEdit(this.openDraft(), patch));
      this.appliedSubject.next({ patch, origin });
      this.touched(patch);
      return;
    }
  }

  private touched(patch: Patch): void {
    this.forgetOverlaid(patch);
    this.saves.touch();
  }

  /** A tile laid again is mine beyond doubt; on another grid the positions mean nothing. */
  private forgetOverlaid(patch: Patch): void {
    if (this.overlaid().size === 0) return;
    const laid = new Set(
      patch.flatMap((change) => (change.kind === 'cells' ? change.positions : [])),
    );
    this.overlaid.update((overlaid) =>
      resizes(patch) ? new Set() : new Set([...overlaid].filter((position) => !laid.has(position))),
    );
  }

  private lose(draft: Draft): void {
    const before = this.layout();
    this.draft.set(draft);
    this.appliedSubject.next({ patch: patchBetween(before, draft.local), origin: 'theirs' });
  }

  private hear(edit: RecordedEdit): void {
    const met = withLive(this.openDraft(), edit);
    if (met) this.meet(met);
  }

  private meet(met: Met): void {
    const before = this.layout();
    this.draft.set(met.draft);
    if (met.theirs.length === 0) return;
    if (resizes(met.theirs)) {
      this.history.forget();
      this.overlaid.set(new Set(met.overlaid));
    } else if (met.overlaid.length > 0) {
      this.overlaid.update((overlaid) => new Set([...overlaid, ...met.overlaid]));
    }
    this.openContests.update((contests) => [...contests, ...met.contests]);
    const patch = patchBetween(before, met.draft.local);
    if (patch.length > 0) this.appliedSubject.next({ patch, origin: 'theirs' });
  }
}

const UNREADABLE =
  'The server sent a layout that this page cannot read. Load the page again; if it stays, tell whoever runs it.';

/** True when nothing changed that would have to be kept: moves of a gesture are not kept. */
function sameUnsent(a: Draft | null, b: Draft | null): boolean {
  return a?.revision === b?.revision && a?.inFlight === b?.inFlight && a?.waiting === b?.waiting;
}
