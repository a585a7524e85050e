import { Component, computed, input } from '@angular/core';

// Every ground carries white initials at 4.5:1 or better.
const GROUNDS = ['#7a5a9e', '#0a6b73', '#2a4b78', '#8a5200', '#8c3b4a', '#3f6b45'] as const;

/** A letter with the marks that belong to it. */
const FIRST_LETTER = /^\P{M}\p{M}*/u;

/** First letters of the first and the last word of a name. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/u);
  const letters = words.map((word) => FIRST_LETTER.exec(word)?.[0] ?? '');
  const last = letters.length > 1 ? (letters.at(-1) ?? '') : '';
  return ((letters[0] ?? '') + last).toUpperCase();
}

/** The colour a person has everywhere. */
export function groundOf(name: string): string {
  let sum = 0;
  for (const letter of name) sum = (sum * 31 + (letter.codePointAt(0) ?? 0)) % 9973;
  return GROUNDS[sum % GROUNDS.length] ?? GROUNDS[0];
}

/** A person as a disc with initials, always in the same colour. */
@Component({
  selector: 'sl-avatar',
  host: { '[style.background]': 'ground()', 'aria-hidden': 'true' },
  template: '{{ initials() }}',
  styles: `
    :host {
      display: inline-grid;
      place-items: center;
      width: 28px;
      height: 28px;
      border-radius: 50%;
      color: #ffffff;
      font-size: 11px;
      font-weight: 800;
      line-height: 1;
    }
  `,
})
export class Avatar {
  readonly name = input.required<string>();
  protected readonly initials = computed(() => initialsOf(this.name()));
  protected readonly ground = computed(() => groundOf(this.name()));
}
