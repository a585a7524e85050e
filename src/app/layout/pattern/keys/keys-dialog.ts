import { Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialogModule } from '@angular/material/dialog';

interface KeyLine {
  readonly keys: readonly string[];
  readonly does: string;
}

const LINES: readonly KeyLine[] = [
  { keys: ['Arrows'], does: 'walk from tile to tile, round the seam' },
  { keys: ['Space'], does: 'does what the sentence says on the tile' },
  { keys: ['P'], does: 'marks the corner of a patch; arrows draw it out, Space takes it' },
  { keys: ['Ctrl C'], does: 'copies the patch, or the tile you stand on' },
  { keys: ['Ctrl V'], does: 'lays the copied patch to the right and up from the tile' },
  { keys: ['1–9', '0'], does: 'take a wood into the hand' },
  { keys: ['[', ']'], does: 'turn the whole pattern to the left or right by staves' },
  { keys: ['Esc'], does: 'takes back the stroke under the hand, or leaves the tiles' },
  { keys: ['Ctrl Z'], does: 'takes back the last step' },
  { keys: ['Ctrl Shift Z'], does: 'does it again' },
  { keys: ['Shift + arrows'], does: 'move the view' },
  { keys: ['+', '−'], does: 'come nearer, go further off' },
  { keys: ['Home'], does: 'shows the whole shell' },
  { keys: ['Space + drag'], does: 'turns the shell' },
  { keys: ['?'], does: 'shows this list' },
];

/** Every key of the Pattern station. */
@Component({
  selector: 'sl-keys-dialog',
  imports: [MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>Keys on the pattern</h2>
    <mat-dialog-content tabindex="0" role="region" aria-label="List of keys">
      <p>On a Mac, Command stands for Ctrl.</p>
      <dl>
        @for (line of lines; track line.does) {
          <div>
            <dt>
              @for (key of line.keys; track key) {
                <kbd>{{ key }}</kbd>
              }
            </dt>
            <dd>{{ line.does }}</dd>
          </div>
        }
      </dl>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton="filled" type="button" mat-dialog-close>Close</button>
    </mat-dialog-actions>
  `,
  styles: `
    dl {
      margin: 0;
    }
    div {
      display: grid;
      grid-template-columns: 150px 1fr;
      gap: 12px;
      padding: 6px 0;
      border-top: 1px solid var(--line);
    }
    dt {
      display: flex;
      gap: 6px;
    }
    dd {
      margin: 0;
    }
    kbd {
      height: fit-content;
      padding: 1px 8px;
      border: 1px solid var(--line);
      border-radius: 6px;
      background: var(--paper);
      font: inherit;
      font-weight: 700;
      white-space: nowrap;
    }
  `,
})
export class KeysDialog {
  protected readonly lines = LINES;
}
