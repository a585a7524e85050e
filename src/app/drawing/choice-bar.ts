import { Component, input, output } from '@angular/core';

export interface Choice<V extends string> {
  readonly value: V;
  readonly label: string;
}

let bars = 0;

/** A few choices side by side, one of them taken: a radio group, so the arrow keys walk it. */
@Component({
  selector: 'sl-choice-bar',
  template: `
    <fieldset [disabled]="locked() === 'locked'">
      <legend class="cdk-visually-hidden">{{ label() }}</legend>
      @for (choice of choices(); track choice.value) {
        <label>
          <input
            type="radio"
            class="cdk-visually-hidden"
            [name]="group"
            [value]="choice.value"
            [checked]="choice.value === value()"
            (change)="chosen.emit(choice.value)"
          />
          <span>{{ choice.label }}</span>
        </label>
      }
    </fieldset>
  `,
  styles: `
    :host {
      display: block;
    }
    fieldset {
      display: flex;
      margin: 0;
      padding: 0;
      border: 1px solid var(--line-strong);
      border-radius: var(--radius-full);
      overflow: hidden;
      background: var(--sheet);
    }
    label {
      position: relative;
      flex: 1;
      cursor: pointer;
    }
    span {
      display: grid;
      place-items: center;
      height: 100%;
      min-height: 34px;
      padding: 4px 14px;
      color: var(--mute);
      font-size: 14px;
      font-weight: 700;
      text-align: center;
    }
    input:checked + span {
      background: var(--pale-blue);
      color: var(--blue);
    }
    input:focus-visible + span {
      outline: 2px solid var(--blue);
      outline-offset: -3px;
      border-radius: var(--radius-full);
    }
    fieldset:disabled label {
      cursor: default;
    }
    @media (forced-colors: active) {
      input:checked + span {
        outline: 2px solid Highlight;
        outline-offset: -3px;
      }
    }
  `,
})
export class ChoiceBar<V extends string> {
  readonly label = input.required<string>();
  readonly choices = input.required<readonly Choice<V>[]>();
  readonly value = input.required<V>();
  readonly locked = input<'open' | 'locked'>('open');
  readonly chosen = output<V>();
  protected readonly group = `sl-choice-${++bars}`;
}
