import { Component, computed, input } from '@angular/core';
import { RESULTS, type CheckResult } from '@shared/checks/check';
import { FigureText } from '../../../drawing/figure-text';
import { Lamp } from '../../../drawing/lamp';

/** What the checks found, worst first, with what to change where something should be. */
@Component({
  selector: 'sl-check-list',
  imports: [FigureText, Lamp],
  template: `
    <ul>
      @for (check of worstFirst(); track check.key) {
        <li>
          <sl-lamp [state]="check.result" />
          <div>
            <sl-figure-text [text]="check.finding" />
            @if (check.result !== 'clear' && check.remedy) {
              <p><sl-figure-text [text]="check.remedy" /></p>
            }
          </div>
        </li>
      }
    </ul>
  `,
  styles: `
    ul {
      display: grid;
      gap: 11px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: grid;
      grid-template-columns: 12px 1fr;
      gap: 8px;
      font-size: 14.5px;
      line-height: 1.4;
    }
    sl-lamp {
      align-self: start;
      height: 1.4em;
    }
    p {
      margin: 4px 0 0;
      color: var(--mute);
      font-weight: 600;
    }
  `,
})
export class CheckList {
  readonly checks = input.required<readonly CheckResult[]>();
  protected readonly worstFirst = computed(() =>
    [...this.checks()].sort((a, b) => RESULTS.indexOf(b.result) - RESULTS.indexOf(a.result)),
  );
}
