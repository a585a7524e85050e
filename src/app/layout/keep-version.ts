import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { Announcer } from '../platform/announcer';
import { KeepVersionDialog } from './keep-version-dialog';
import type { LayoutStore } from './layout-store';

/** Keeps the draft as a version, wherever on the open layout somebody asks for it. */
@Injectable({ providedIn: 'root' })
export class KeepVersion {
  private readonly dialogs = inject(MatDialog);
  private readonly announcer = inject(Announcer);

  /** Asks for a note and keeps the version; the number it got, or null when it was not kept. */
  async ask(store: LayoutStore): Promise<number | null> {
    const dialog = this.dialogs.open<KeepVersionDialog, LayoutStore, number>(KeepVersionDialog, {
      data: store,
      width: '520px',
    });
    const number = await firstValueFrom(dialog.afterClosed());
    if (number === undefined) return null;
    this.announcer.tell(`Version ${number} is kept.`);
    return number;
  }
}
