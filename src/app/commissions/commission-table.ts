import { Component, inject, input, output } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';
import { STAGES, type Commission } from '@shared/api/commission';
import { Icon } from '../drawing/icon';
import { ShellThumbnail } from '../drawing/shell-thumbnail';
import { SessionStore } from '../platform/session-store';
import { CommissionActions } from './commission-actions';
import type { Sort, SortKey } from './commission-view';
import { dueWords, lateWords, shellWords, STAGE_WORDS, versionWords } from './commission-words';
import { WhereItStands } from './where-it-stands';

const COLUMNS: readonly { readonly key: SortKey; readonly label: string }[] = [
  { key: 'title', label: 'Commission' },
  { key: 'client', label: 'Client' },
  { key: 'due', label: 'Due' },
  { key: 'stage', label: 'Where it stands' },
  { key: 'version', label: 'Last version' },
];

/** The table a workshop lives in; on a phone every row becomes a card. */
@Component({
  selector: 'sl-commission-table',
  imports: [Icon, MatMenuModule, RouterLink, ShellThumbnail, WhereItStands],
  providers: [CommissionActions],
  templateUrl: './commission-table.html',
  styleUrl: './commission-table.scss',
})
export class CommissionTable {
  readonly commissions = input.required<readonly Commission[]>();
  readonly sort = input.required<Sort>();
  readonly sorted = output<Sort>();

  protected readonly actions = inject(CommissionActions);
  protected readonly session = inject(SessionStore);
  protected readonly columns = COLUMNS;
  protected readonly stages = STAGES.map((stage) => ({ stage, words: STAGE_WORDS[stage] }));
  protected readonly now = new Date();
  protected readonly shellWords = shellWords;
  protected readonly dueWords = dueWords;
  protected readonly lateWords = lateWords;
  protected readonly versionWords = versionWords;

  /** A second press on the same column turns its order round. */
  protected sortBy(key: SortKey): void {
    const { key: before, direction } = this.sort();
    const turned = before === key && direction === 'ascending';
    this.sorted.emit({ key, direction: turned ? 'descending' : 'ascending' });
  }

  /** For the menu, whose template does not know what it is opened for. */
  protected asCommission(value: unknown): Commission {
    return value as Commission;
  }
}
