import { Component, computed, effect, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatMenuModule } from '@angular/material/menu';
import { ActivatedRoute, Router } from '@angular/router';
import type { Commission } from '@shared/api/commission';
import { EmptyPlace } from '../drawing/empty-place';
import { Icon } from '../drawing/icon';
import { Trouble } from '../drawing/trouble';
import { SessionStore } from '../platform/session-store';
import { CommissionTable } from './commission-table';
import { FILTERS, filterNamed, isFound, sorted, SORT_WORDS, type Sort } from './commission-view';
import { CommissionsStore } from './commissions-store';

const SORTS: readonly Sort[] = [
  { key: 'due', direction: 'ascending' },
  { key: 'title', direction: 'ascending' },
  { key: 'client', direction: 'ascending' },
  { key: 'stage', direction: 'ascending' },
  { key: 'version', direction: 'descending' },
];

/** The workshop's commissions: search, filter, sort, start a new one. */
@Component({
  selector: 'sl-commissions-page',
  imports: [CommissionTable, EmptyPlace, Icon, MatButton, MatMenuModule, Trouble],
  providers: [CommissionsStore],
  templateUrl: './commissions-page.html',
  styleUrl: './commissions-page.scss',
})
export class CommissionsPage {
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly dialog = inject(MatDialog);
  protected readonly store = inject(CommissionsStore);
  protected readonly session = inject(SessionStore);

  protected readonly sorts = SORTS.map((sort) => ({ sort, words: SORT_WORDS[sort.key] }));
  protected readonly search = signal(this.route.snapshot.queryParamMap.get('search') ?? '');
  protected readonly filter = signal(filterNamed(this.route.snapshot.queryParamMap.get('show')));
  protected readonly sort = signal<Sort>({ key: 'due', direction: 'ascending' });
  protected readonly sortWords = computed(() => {
    const { key, direction } = this.sort();
    const reversed = SORTS.find((sort) => sort.key === key)?.direction !== direction;
    return `sorted by ${SORT_WORDS[key]}${reversed ? ', reversed' : ''}`;
  });

  protected readonly troubleText = computed(() => {
    const state = this.store.state();
    return state.kind === 'failed' ? state.failure.message : '';
  });

  private readonly found = computed(() =>
    this.store.commissions().filter((commission) => isFound(commission, this.search())),
  );
  protected readonly chips = computed(() =>
    FILTERS.map((filter) => ({ filter, count: this.found().filter(filter.holds).length })),
  );
  protected readonly shown = computed(() =>
    sorted(this.found().filter(this.filter().holds), this.sort()),
  );
  protected readonly countWords = computed(() => {
    const count = this.shown().length;
    return `${count} ${count === 1 ? 'commission' : 'commissions'} shown`;
  });

  constructor() {
    void this.store.load();
    // The address remembers the view, so that coming back from a layout finds it again.
    effect(() => {
      const queryParams = {
        search: this.search() || null,
        show: this.filter() === FILTERS[0] ? null : this.filter().key,
      };
      void this.router.navigate([], {
        relativeTo: this.route,
        queryParams,
        queryParamsHandling: 'merge',
        replaceUrl: true,
      });
    });
  }

  protected showAllOpen(): void {
    this.search.set('');
    this.filter.set(FILTERS[0]);
  }

  protected async startNew(): Promise<void> {
    const { NewCommissionDialog } = await import('./new-commission-dialog');
    this.dialog
      .open<unknown, (typeof this.store)['create'], Commission>(NewCommissionDialog, {
        width: '580px',
        data: (commission) => this.store.create(commission),
      })
      .afterClosed()
      .subscribe((made) => {
        if (made) void this.router.navigate(['/commissions', made.id, 'layout']);
      });
  }
}
