import { Component, computed, inject } from '@angular/core';
import { LayoutStore } from './layout-store';
import type { SaveState } from './save-queue';

const WORDS: Record<SaveState['kind'], string> = {
  saved: 'all saved',
  waiting: 'not saved yet',
  saving: 'saving…',
  failed: 'not saved',
};

/** Where the draft stands: which version it goes on from, and whether the server has everything. */
@Component({
  selector: 'sl-save-pill',
  host: { '[attr.data-state]': 'state().kind' },
  template: `
    <span class="base">{{ base() }} ·</span>
    <span class="word" role="status">{{ word() }}</span>
  `,
  styles: `
    :host {
      display: flex;
      gap: 5px;
      padding: 4px 14px;
      border: 1px solid var(--line);
      border-radius: var(--radius-full);
      background: var(--sheet);
      font-size: 14px;
      font-weight: 600;
      white-space: nowrap;
    }
    .word {
      min-width: 60px;
    }
    :host([data-state='failed']) {
      border-color: var(--stop);
      color: var(--stop-ink);
    }
    @media (max-width: 1023px) {
      .base {
        display: none;
      }
    }
    @media (max-width: 599px) {
      :host {
        padding: 4px 10px;
        font-size: 13px;
      }
      .word {
        min-width: 0;
      }
    }
  `,
})
export class SavePill {
  private readonly store = inject(LayoutStore);
  protected readonly state = this.store.saving;
  protected readonly word = computed(() => WORDS[this.state().kind]);
  protected readonly base = computed(() => {
    const version = this.store.opened()?.lastVersion;
    return version ? `Draft on version ${version.number}` : 'Draft, no version yet';
  });
}
