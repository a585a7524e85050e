import { Component, computed, input } from '@angular/core';

const SHOWN = 8;

/** What is wrong with a document or a request, field by field, in sentences. */
@Component({
  selector: 'sl-problem-list',
  host: { role: 'alert' },
  template: `
    <p>{{ heading() }}</p>
    @if (problems().length > 0) {
      <ul>
        @for (problem of shown(); track $index) {
          <li>
            @if (problem.field !== 'file') {
              <b>{{ problem.field }}</b>
            }
            {{ problem.message }}
          </li>
        }
      </ul>
      @if (rest() > 0) {
        <p>And {{ rest() }} more.</p>
      }
    }
  `,
  styles: `
    :host {
      display: block;
      padding: 12px 14px;
      border-left: 4px solid var(--stop);
      border-radius: var(--radius);
      background: var(--paper);
      line-height: 1.45;
    }
    p {
      margin: 0;
      font-weight: 700;
    }
    ul {
      margin: 6px 0 0;
      padding-left: 20px;
    }
    li {
      overflow-wrap: anywhere;
    }
  `,
})
export class ProblemList {
  readonly heading = input.required<string>();
  readonly problems = input<readonly { readonly field: string; readonly message: string }[]>([]);
  protected readonly shown = computed(() => this.problems().slice(0, SHOWN));
  protected readonly rest = computed(() => this.problems().length - this.shown().length);
}
