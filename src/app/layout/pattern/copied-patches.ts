/** The patch copied last, kept in this browser so that it can be laid in another layout or tomorrow. */
import { DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { printCopiedPatch, readCopiedPatch, type CopiedPatch } from '@shared/layout/copied-patch';

const KEY = 'staveloom.copied-patch';

@Injectable({ providedIn: 'root' })
export class CopiedPatches {
  private readonly window = inject(DOCUMENT).defaultView;
  private readonly kept = signal<CopiedPatch | null>(this.read());

  /** The patch copied last, in whichever layout or window, or null. */
  readonly patch = this.kept.asReadonly();

  constructor() {
    this.window?.addEventListener('storage', ({ key }) => {
      if (key === KEY) this.kept.set(this.read());
    });
  }

  keep(patch: CopiedPatch): void {
    this.kept.set(patch);
    try {
      this.window?.localStorage.setItem(KEY, printCopiedPatch(patch));
    } catch {
      // a browser that keeps nothing still lays it as long as the page is open
    }
  }

  private read(): CopiedPatch | null {
    try {
      return readCopiedPatch(this.window?.localStorage.getItem(KEY) ?? '');
    } catch {
      return null;
    }
  }
}
