import { Component, input } from '@angular/core';
import type { CheckOutcome, CheckResult } from '@shared/checks/check';
import { FigureText } from '../drawing/figure-text';
import { Lamp } from '../drawing/lamp';

/** One thing found, with its lamp; the remedy is empty where there is nothing to mend. */
export interface Finding {
  readonly state: CheckOutcome;
  readonly text: string;
  readonly remedy?: string;
  readonly reason?: string;
}

/** A check as a finding. */
export function findingOf(check: CheckResult): Finding {
  const { result, finding, remedy, reason } = check;
  return { state: result, text: finding, remedy, reason };
}

/** What was found, one sentence a lamp, with what to change where something should be. */
@Component({
  selector: 'sl-findings',
  imports: [FigureText, Lamp],
  template: `
    <ul>
      @for (finding of findings(); track $index) {
        <li>
          <sl-lamp [state]="finding.state" />
          <div>
            <sl-figure-text [text]="finding.text" />
            @if (finding.state !== 'clear' && finding.remedy) {
              <p class="remedy"><sl-figure-text [text]="finding.remedy" /></p>
              <p class="reason">{{ finding.reason }}</p>
            }
          </div>
        </li>
      }
    </ul>
  `,
  styles: `
    ul {
      display: grid;
      gap: 16px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: grid;
      grid-template-columns: 16px 1fr;
      gap: 6px;
      line-height: 1.4;
    }
    sl-lamp {
      align-self: start;
      height: 1.4em;
    }
    p {
      margin: 6px 0 0;
    }
    .remedy {
      padding: 8px 12px;
      border-radius: var(--radius);
      background: var(--pale-blue);
    }
    .reason {
      color: var(--mute);
      font-size: 14px;
    }
  `,
})
export class Findings {
  readonly findings = input.required<readonly Finding[]>();
}
