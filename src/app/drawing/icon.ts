import { Component, computed, input } from '@angular/core';
import { ICONS, type IconName } from './icons';

/** A small picture beside a word; never read aloud, because the word says it. */
@Component({
  selector: 'sl-icon',
  template: `
    <svg viewBox="0 0 24 24" aria-hidden="true" focusable="false"><path [attr.d]="path()" /></svg>
  `,
  styles: `
    :host {
      display: inline-block;
      flex: none;
      width: 20px;
      height: 20px;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
      fill: none;
      stroke: currentColor;
      stroke-width: 1.8;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
})
export class Icon {
  readonly name = input.required<IconName>();
  protected readonly path = computed(() => ICONS[this.name()]);
}
