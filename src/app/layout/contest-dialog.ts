import { Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';
import type { Grid } from '@shared/layout/cells';
import type { Contest } from '@shared/layout/rebase';
import type { LengthUnit } from '@shared/units/length';
import { fieldName, fieldValue } from './field-names';

export interface ContestQuestion {
  readonly contest: Contest;
  readonly lengthUnit: LengthUnit;
}

export type ContestAnswer = 'mine' | 'theirs';

/** Two people set the same field: asks whose value stays. */
@Component({
  selector: 'sl-contest-dialog',
  imports: [MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>Two people changed this at once</h2>
    <mat-dialog-content>
      <p>{{ words().name }} was set by you and by somebody else. Which value stays?</p>
      <dl>
        <dt>Yours</dt>
        <dd>{{ words().mine }}</dd>
        <dt>Theirs</dt>
        <dd>{{ words().theirs }}</dd>
      </dl>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton="outlined" type="button" mat-dialog-close="theirs">Keep theirs</button>
      <button matButton="filled" type="button" mat-dialog-close="mine">Keep mine</button>
    </mat-dialog-actions>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: auto 1fr;
      gap: 6px 16px;
      margin: 0;
    }
    dt {
      color: var(--mute);
    }
    dd {
      margin: 0;
      font-weight: 700;
    }
  `,
})
export class ContestDialog {
  private readonly question = inject<ContestQuestion>(MAT_DIALOG_DATA);

  protected readonly words = computed(() => {
    const { contest, lengthUnit } = this.question;
    if (contest.kind === 'grid') {
      const size = ({ staves, courses }: Grid) => `${staves} staves, ${courses} courses`;
      return {
        name: 'The size of the shell',
        mine: size(contest.mine),
        theirs: size(contest.theirs),
      };
    }
    const { path, before, after } = contest.mine;
    return {
      name: fieldName(path),
      mine: fieldValue(path, after, lengthUnit),
      theirs: fieldValue(path, before, lengthUnit),
    };
  });
}
