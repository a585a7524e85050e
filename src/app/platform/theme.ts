import { DOCUMENT, effect, inject, Injectable, signal } from '@angular/core';

export const THEMES = ['system', 'light', 'dark'] as const;
export type ThemeName = (typeof THEMES)[number];

const KEPT_AS = 'staveloom.theme';

/** Light, dark, or as the system says; kept in this browser. */
@Injectable({ providedIn: 'root' })
export class Theme {
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<ThemeName>(this.kept());
  readonly name = this.chosen.asReadonly();

  constructor() {
    effect(() => {
      const name = this.chosen();
      if (name === 'system') delete this.document.documentElement.dataset['theme'];
      else this.document.documentElement.dataset['theme'] = name;
    });
  }

  choose(name: ThemeName): void {
    this.chosen.set(name);
    try {
      this.document.defaultView?.localStorage.setItem(KEPT_AS, name);
    } catch {
      // A browser that keeps nothing shows the choice until the page is closed.
    }
  }

  private kept(): ThemeName {
    try {
      const kept = this.document.defaultView?.localStorage.getItem(KEPT_AS);
      return THEMES.find((name) => name === kept) ?? 'system';
    } catch {
      return 'system';
    }
  }
}
