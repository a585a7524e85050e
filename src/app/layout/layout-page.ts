import { Component, computed, effect, inject, input, untracked } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { NavigationEnd, Router, RouterOutlet } from '@angular/router';
import { fieldChange } from '@shared/layout/patch';
import type { Contest } from '@shared/layout/rebase';
import { resizeChange } from '@shared/layout/carry';
import { filter, firstValueFrom, map, startWith } from 'rxjs';
import { Trouble } from '../drawing/trouble';
import { BarActions } from '../platform/bar-actions';
import { BarSlot } from '../platform/bar-slot';
import { askCarry } from './ask-carry';
import { SessionStore } from '../platform/session-store';
import { ContestDialog, type ContestAnswer, type ContestQuestion } from './contest-dialog';
import { KeepVersion } from './keep-version';
import { LayoutStore } from './layout-store';
import { LayoutTools } from './layout-tools';
import { LiveEvents } from './live-events';
import { LeaveDialog } from './leave-dialog';
import { PeopleHere } from './people-here';
import { SavePill } from './save-pill';
import { SaveTrouble } from './save-trouble';
import { STATIONS } from './stations';
import { StationsBar } from './stations-bar';

/** The open layout: its bar, its stations, and everything about saving that a person must see. */
@Component({
  selector: 'sl-layout-page',
  imports: [
    BarActions,
    LayoutTools,
    MatButton,
    PeopleHere,
    RouterOutlet,
    SavePill,
    SaveTrouble,
    StationsBar,
    Trouble,
  ],
  providers: [LiveEvents, LayoutStore],
  templateUrl: './layout-page.html',
  styleUrl: './layout-page.scss',
  host: {
    '(document:keydown)': 'press($event)',
    '(window:online)': 'store.retry()',
    '(window:beforeunload)': 'warn($event)',
    '(window:pagehide)': 'store.saveLeaving()',
  },
})
export class LayoutPage {
  protected readonly store = inject(LayoutStore);
  private readonly dialogs = inject(MatDialog);
  private readonly keeping = inject(KeepVersion);
  private readonly slot = inject(BarSlot);
  private readonly session = inject(SessionStore);
  private readonly live = inject(LiveEvents);
  private asking = false;
  private readonly path = toSignal(
    inject(Router).events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map((event) => event.urlAfterRedirects),
      startWith(inject(Router).url),
    ),
    { requireSync: true },
  );

  readonly commissionId = input.required<string>();
  protected readonly base = computed(() => `/commissions/${this.commissionId()}/layout`);
  protected readonly failure = computed(() => {
    const state = this.store.openState();
    return state.kind === 'failed' ? state.failure : null;
  });
  protected readonly keepAs = computed(() => (this.store.opened()?.lastVersion?.number ?? 0) + 1);

  constructor() {
    effect(() => {
      const id = this.commissionId();
      untracked(() => void this.store.open(id));
    });
    effect((onCleanup) => {
      this.slot.crumb.set(this.store.opened()?.commission.title ?? null);
      onCleanup(() => this.slot.crumb.set(null));
    });
    effect(() => {
      const station = STATIONS.find(({ path }) => this.path().includes(`/layout/${path}`));
      if (station && this.store.opened()) {
        untracked(() => this.live.moveTo({ station: station.path, tile: null }));
      }
    });
    effect(() => {
      const contest = this.store.contests()[0];
      if (contest) untracked(() => void this.ask(contest));
    });
  }

  /** Before the page is left: everything saved, or the person says that it may be lost. */
  async mayLeave(): Promise<boolean> {
    // The session has ended: nothing can be saved before signing in, and the draft is kept in this browser.
    if (this.session.person() === null || !this.store.unsaved()) return true;
    await this.store.flush();
    if (!this.store.unsaved()) return true;
    const asked = this.dialogs.open<LeaveDialog, undefined, boolean>(LeaveDialog);
    return (await firstValueFrom(asked.afterClosed())) === true;
  }

  protected keep(): void {
    void this.keeping.ask(this.store);
  }

  protected warn(event: BeforeUnloadEvent): void {
    if (this.store.unsaved() || this.store.contests().length > 0) event.preventDefault();
  }

  /** Ctrl Z and Ctrl Shift Z (or Ctrl Y), except where a text field has its own. */
  protected press(event: KeyboardEvent): void {
    if (!(event.ctrlKey || event.metaKey) || event.altKey || isTyping(event.target)) return;
    const key = event.key.toLowerCase();
    if (key !== 'z' && key !== 'y') return;
    event.preventDefault();
    if (key === 'y' || event.shiftKey) this.store.redo();
    else this.store.undo();
  }

  private async ask(contest: Contest): Promise<void> {
    if (this.asking) return;
    this.asking = true;
    const data: ContestQuestion = { contest, lengthUnit: this.store.lengthUnit() };
    const options = { data, disableClose: true };
    const asked = this.dialogs.open<ContestDialog, ContestQuestion, ContestAnswer>(
      ContestDialog,
      options,
    );
    const answer = await firstValueFrom(asked.afterClosed());
    if (answer === 'mine') await this.keepMine(contest);
    this.asking = false;
    this.store.settleContest(contest);
  }

  private async keepMine(contest: Contest): Promise<void> {
    if (contest.kind === 'grid') {
      const carry = await askCarry(this.dialogs, this.store.layout(), contest.mine);
      if (carry === null) return;
      this.store.edit('Resize the shell', resizeChange(this.store.layout(), contest.mine, carry));
    } else {
      const { path, after } = contest.mine;
      this.store.edit('Keep my value', fieldChange(this.store.layout(), path, after));
    }
  }
}

function isTyping(target: EventTarget | null): boolean {
  if (target instanceof HTMLTextAreaElement) return true;
  return (
    target instanceof HTMLInputElement && !['radio', 'checkbox', 'range'].includes(target.type)
  );
}
