import { Injectable, signal, type TemplateRef } from '@angular/core';

/** What a page puts into the app bar: where it is, and its own actions at the right. */
@Injectable({ providedIn: 'root' })
export class BarSlot {
  /** Shown after "Commissions /", for instance the commission's title; null for none. */
  readonly crumb = signal<string | null>(null);
  /** A template shown before the account menu; null for none. */
  readonly actions = signal<TemplateRef<unknown> | null>(null);
}
