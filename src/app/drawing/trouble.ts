import { Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';

/** A place that could not be filled: says what happened in a sentence and offers to try again. */
@Component({
  selector: 'sl-trouble',
  imports: [MatButton],
  host: { role: 'alert' },
  template: `
    <svg viewBox="0 0 96 96" aria-hidden="true" focusable="false">
      <path class="ring" d="M48 12a36 36 0 1 1-31 17.7" />
      <path class="ring" d="M48 28a20 20 0 1 1-17.2 9.8" />
      <path class="gap" d="M17 29.7 30.8 37.8M48 12v16" />
    </svg>
    <h2>{{ heading() }}</h2>
    <p>{{ text() }}</p>
    <div class="steps">
      <button matButton="filled" type="button" (click)="again.emit()">Try again</button>
      <ng-content />
    </div>
  `,
  styles: `
    :host {
      display: grid;
      justify-items: center;
      gap: 12px;
      padding: 56px 24px;
      text-align: center;
    }
    svg {
      width: 96px;
      height: 96px;
      fill: none;
      stroke-width: 3;
      stroke-linecap: round;
    }
    .ring {
      stroke: var(--line-strong);
    }
    .gap {
      stroke: var(--blue);
      stroke-dasharray: 2 6;
    }
    h2 {
      margin: 8px 0 0;
      font-size: 20px;
    }
    p {
      margin: 0;
      max-width: 46ch;
      color: var(--mute);
      line-height: 1.5;
    }
    .steps {
      display: flex;
      flex-wrap: wrap;
      justify-content: center;
      gap: 12px;
      margin-top: 8px;
    }
  `,
})
export class Trouble {
  readonly heading = input.required<string>();
  readonly text = input.required<string>();
  readonly again = output();
}
