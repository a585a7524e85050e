import { Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialogModule } from '@angular/material/dialog';

/** Edits the server does not have would be left behind in this browser: asks first. */
@Component({
  selector: 'sl-leave-dialog',
  imports: [MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>Some of your work is not saved</h2>
    <mat-dialog-content>
      <p>
        The last changes could not be sent to the server. Stay, and they are tried again; leave, and
        they wait in this browser until you open the layout here again.
      </p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton type="button" [mat-dialog-close]="true">Leave them here</button>
      <button matButton="filled" type="button" [mat-dialog-close]="false" cdkFocusInitial>
        Stay
      </button>
    </mat-dialog-actions>
  `,
})
export class LeaveDialog {}
