import { Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatMenuModule } from '@angular/material/menu';
import { fieldChange } from '@shared/layout/patch';
import { LAYOUT_TEXT_MOST } from '@shared/layout/read-layout';
import { Icon } from '../drawing/icon';
import { Announcer } from '../platform/announcer';
import { FileProblemsDialog, type FileProblems } from './file-problems-dialog';
import { LayoutStore } from './layout-store';
import { openLayoutText } from './open-layout-text';

/** What can be done with the whole layout from any station: undo, redo, unit, layout file in and out. */
@Component({
  selector: 'sl-layout-tools',
  imports: [Icon, MatButton, MatMenuModule],
  template: `
    <button
      matButton
      type="button"
      class="wide"
      [disabled]="!store.canUndo()"
      [title]="undo() + ' (Ctrl Z)'"
      (click)="store.undo()"
    >
      <sl-icon matButtonIcon name="undo" /> Undo
    </button>
    <button
      matButton
      type="button"
      class="wide"
      [disabled]="!store.canRedo()"
      [title]="redo() + ' (Ctrl Shift Z)'"
      (click)="store.redo()"
    >
      <sl-icon matButtonIcon name="redo" /> Redo
    </button>
    <button matButton type="button" [matMenuTriggerFor]="menu">
      <sl-icon matButtonIcon name="file" /> <span class="word">Layout</span>
    </button>
    <mat-menu #menu="matMenu">
      <button mat-menu-item [disabled]="!store.canUndo()" (click)="store.undo()">
        {{ undo() }}
      </button>
      <button mat-menu-item [disabled]="!store.canRedo()" (click)="store.redo()">
        {{ redo() }}
      </button>
      <button mat-menu-item (click)="switchUnit()">
        {{ store.lengthUnit() === 'mm' ? 'Show inches' : 'Show millimetres' }}
      </button>
      <button mat-menu-item (click)="download()">Download the layout file</button>
      <button mat-menu-item (click)="picker.click()">Open a layout file here…</button>
    </mat-menu>
    <input
      #picker
      type="file"
      accept=".json,application/json"
      hidden
      aria-label="Layout file to open"
      (change)="open(picker)"
    />
  `,
  styles: `
    :host {
      display: flex;
      flex: none;
      align-items: center;
    }
    sl-icon {
      margin-right: 6px;
    }
    @media (max-width: 899px) {
      .wide {
        display: none;
      }
    }
  `,
})
export class LayoutTools {
  protected readonly store = inject(LayoutStore);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);

  protected readonly undo = computed(() => named('Undo', this.store.undoLabel()));
  protected readonly redo = computed(() => named('Redo', this.store.redoLabel()));

  protected switchUnit(): void {
    const unit = this.store.lengthUnit() === 'mm' ? 'in' : 'mm';
    this.store.edit('Change the unit', fieldChange(this.store.layout(), 'lengthUnit', unit));
  }

  /** Downloads what is on the page: it is saved first, since the server prints the file. */
  protected async download(): Promise<void> {
    await this.store.flush();
    const opened = this.store.opened();
    if (this.store.saving().kind !== 'saved' || !opened) {
      this.announcer.tell('The draft is not saved yet, so its file is not ready. Try again soon.');
      return;
    }
    const link = document.createElement('a');
    link.href = `/api/layouts/${opened.id}/file`;
    link.download = '';
    link.click();
  }

  protected async open(picker: HTMLInputElement): Promise<void> {
    const file = picker.files?.[0];
    if (!file) return;
    // One character more than is read, so that a file that is too long is called so.
    const text = await file.slice(0, LAYOUT_TEXT_MOST * 4 + 4).text();
    picker.value = '';
    const opening = openLayoutText(text, this.store.layout(), {
      editJoint: this.store.rights.editJoint(),
      editPattern: this.store.rights.editPattern(),
    });
    if (opening.kind === 'problems') {
      const data: FileProblems = { fileName: file.name, problems: opening.problems };
      this.dialogs.open(FileProblemsDialog, { data });
    } else if (opening.kind === 'same') {
      this.announcer.tell('The file holds the layout that is open already.');
    } else {
      this.store.edit(`Open ${file.name}`, ...opening.patch);
      this.announcer.offer(`${file.name} is open in this layout.`, 'Undo', () => this.store.undo());
    }
  }
}

function named(step: string, label: string | null): string {
  if (label === null) return `${step}: nothing to ${step.toLowerCase()}`;
  return `${step}: ${label.charAt(0).toLowerCase()}${label.slice(1)}`;
}
