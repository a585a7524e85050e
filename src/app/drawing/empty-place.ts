import { Component, input } from '@angular/core';
import { ShellMark } from './shell-mark';

/**
 * A place with nothing in it yet: says what goes there; the first step is put between the tags.
 *
 *     <sl-empty-place heading="…" text="…"><button matButton="filled">…</button></sl-empty-place>
 */
@Component({
  selector: 'sl-empty-place',
  imports: [ShellMark],
  template: `
    <sl-shell-mark class="ring" tone="faint" />
    @if (level() === 1) {
      <h1>{{ heading() }}</h1>
    } @else {
      <h2>{{ heading() }}</h2>
    }
    <p>{{ text() }}</p>
    <div class="steps"><ng-content /></div>
  `,
  styles: `
    :host {
      display: grid;
      justify-items: center;
      gap: 12px;
      padding: 56px 24px;
      text-align: center;
    }
    .ring {
      width: 96px;
      height: 96px;
    }
    h1,
    h2 {
      margin: 8px 0 0;
      font-size: 20px;
      font-weight: 800;
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
    .steps:empty {
      display: none;
    }
  `,
})
export class EmptyPlace {
  readonly heading = input.required<string>();
  /** 1 where this is the whole page. */
  readonly level = input<1 | 2>(2);
  readonly text = input.required<string>();
}
