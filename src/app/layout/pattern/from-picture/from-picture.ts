import { Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { Announcer } from '../../../platform/announcer';
import { LayoutStore } from '../../layout-store';
import { tilesWords } from '../sentence-words';
import type { FromPictureDialog } from './from-picture-dialog';

/** The button that opens the dialog; the dialog is fetched only then. */
@Component({
  selector: 'sl-from-picture',
  imports: [MatButton],
  template: `
    <button matButton="outlined" type="button" (click)="open()">Start from a picture</button>
  `,
  styles: `
    :host,
    button {
      display: block;
      width: 100%;
    }
  `,
})
export class FromPicture {
  private readonly store = inject(LayoutStore);
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);

  protected async open(): Promise<void> {
    const dialog = await import('./from-picture-dialog').catch(() => null);
    if (!dialog) {
      this.announcer.tell(
        'This part of the page could not be loaded. Check the connection of this computer and try again.',
      );
      return;
    }
    this.dialogs
      .open<FromPictureDialog, LayoutStore, number>(dialog.FromPictureDialog, {
        data: this.store,
        width: '1060px',
        maxWidth: '96vw',
        autoFocus: 'first-tabbable',
      })
      .afterClosed()
      .subscribe((tiles) => {
        if (tiles === undefined) return;
        const sentence = `The picture is laid: ${tilesWords(tiles)} changed.`;
        this.announcer.offer(sentence, 'Undo', () => this.store.undo());
      });
  }
}
