import { Component, computed, input } from '@angular/core';
import type { CheckResult } from '@shared/checks/check';

/** What a lamp can show; "unlit" where nothing has been checked yet. */
export type LampState = CheckResult['result'] | 'unlit';

const WORDS: Record<LampState, string> = {
  clear: 'clear',
  caution: 'caution',
  stop: 'stop',
  unlit: 'not checked yet',
};

/**
 * A lamp for a check or a station. The result is told by shape (round, triangle, square) and by a word
 * as well as by colour; the word is spoken only, or shown with `words="shown"`.
 */
@Component({
  selector: 'sl-lamp',
  host: { '[attr.data-state]': 'state()' },
  template: `
    <svg viewBox="0 0 12 12" aria-hidden="true" focusable="false">
      @switch (state()) {
        @case ('clear') {
          <circle cx="6" cy="6" r="5" />
        }
        @case ('caution') {
          <path d="M6 1.6 10.9 10.2H1.1Z" stroke-width="1.4" stroke-linejoin="round" />
        }
        @case ('stop') {
          <rect x="1.2" y="1.2" width="9.6" height="9.6" rx="1.6" />
        }
        @default {
          <circle class="hollow" cx="6" cy="6" r="4.2" stroke-width="1.6" />
        }
      }
    </svg>
    <span [class.cdk-visually-hidden]="words() === 'spoken'">{{ word() }}</span>
  `,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 6px;
      color: var(--mute);
      font-weight: 700;
    }
    svg {
      flex: none;
      width: 12px;
      height: 12px;
      fill: var(--lamp);
      stroke: var(--lamp);
      stroke-width: 0;
    }
    .hollow {
      fill: none;
      stroke: var(--line-strong);
    }
    :host([data-state='clear']) {
      --lamp: var(--clear);
      color: var(--clear-ink);
    }
    :host([data-state='caution']) {
      --lamp: var(--caution);
      color: var(--caution-ink);
    }
    :host([data-state='stop']) {
      --lamp: var(--stop);
      color: var(--stop-ink);
    }
  `,
})
export class Lamp {
  readonly state = input.required<LampState>();
  readonly words = input<'spoken' | 'shown'>('spoken');
  protected readonly word = computed(() => WORDS[this.state()]);
}
