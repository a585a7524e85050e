import { DOCUMENT, inject, Injectable, signal } from '@angular/core';

/** Whether this computer has a network at all, as the browser sees it. */
@Injectable({ providedIn: 'root' })
export class Connection {
  private readonly window = inject(DOCUMENT).defaultView;
  private readonly up = signal(this.window?.navigator.onLine ?? true);
  readonly online = this.up.asReadonly();

  constructor() {
    this.window?.addEventListener('online', () => this.up.set(true));
    this.window?.addEventListener('offline', () => this.up.set(false));
  }
}
