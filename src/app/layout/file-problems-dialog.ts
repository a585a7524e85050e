import { Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';
import type { Problem } from '@shared/layout/schema';
import { fieldName } from './field-names';

export interface FileProblems {
  readonly fileName: string;
  readonly problems: readonly Problem[];
}

const SHOWN = 12;

/** Why a layout file was not opened, field by field. */
@Component({
  selector: 'sl-file-problems-dialog',
  imports: [MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>This file was not opened</h2>
    <mat-dialog-content>
      <p>{{ given.fileName }} cannot be opened here. Nothing was changed.</p>
      <ul>
        @for (problem of shown; track $index) {
          <li>
            <b>{{ problem.name }}</b> {{ problem.message }}.
          </li>
        }
      </ul>
      @if (more > 0) {
        <p>and {{ more }} more.</p>
      }
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton="filled" type="button" mat-dialog-close>Close</button>
    </mat-dialog-actions>
  `,
  styles: `
    ul {
      margin: 0;
      padding-left: 20px;
    }
    li {
      margin: 6px 0;
      overflow-wrap: anywhere;
    }
  `,
})
export class FileProblemsDialog {
  protected readonly given = inject<FileProblems>(MAT_DIALOG_DATA);
  protected readonly shown = this.given.problems
    .slice(0, SHOWN)
    .map(({ field, message }) => ({ name: fieldName(field), message }));
  protected readonly more = this.given.problems.length - this.shown.length;
}
