import { Component, input, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Checker } from '@shared/layout/starting-patterns/starting-pattern';
import { CountField } from '../../../drawing/count-field';
import { Icon } from '../../../drawing/icon';
import { WordChoice, type WordOption } from '../sentence-bar/word-choice';

/** Size of one field of a checker, and its woods in turn. */
@Component({
  selector: 'sl-checker-fields',
  imports: [CountField, Icon, MatButton, MatIconButton, WordChoice],
  template: `
    <p class="hint">Size of one field:</p>
    <div class="pair">
      <sl-count-field
        label="Staves wide"
        [value]="pattern().staves"
        [least]="bounds.staves.least"
        [most]="bounds.staves.most"
        (typing)="changed.emit({ ...pattern(), staves: $event })"
      />
      <sl-count-field
        label="Courses high"
        [value]="pattern().courses"
        [least]="bounds.courses.least"
        [most]="bounds.courses.most"
        (typing)="changed.emit({ ...pattern(), courses: $event })"
      />
    </div>
    <p class="hint">Woods, in turn:</p>
    @for (wood of pattern().woods; track $index) {
      <div class="wood">
        <sl-word-choice
          [about]="'Wood ' + ($index + 1)"
          [options]="woods()"
          [value]="wood"
          (valueChange)="set($index, $event)"
        />
        @if (pattern().woods.length > bounds.woods.least) {
          <button
            matIconButton
            type="button"
            [attr.aria-label]="'Take wood ' + ($index + 1) + ' out'"
            (click)="remove($index)"
          >
            <sl-icon name="minus" />
          </button>
        }
      </div>
    }
    <button
      matButton
      type="button"
      class="add"
      [disabled]="pattern().woods.length >= bounds.woods.most"
      (click)="add()"
    >
      <sl-icon matButtonIcon name="add" /> Add a wood in turn
    </button>
  `,
  styleUrl: './fields.scss',
})
export class CheckerFields {
  readonly pattern = input.required<Checker>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<Checker>();
  protected readonly bounds = PATTERN_BOUNDS;

  protected set(index: number, wood: number): void {
    this.emit(this.pattern().woods.map((old, i) => (i === index ? wood : old)));
  }

  protected remove(index: number): void {
    this.emit(this.pattern().woods.filter((_, i) => i !== index));
  }

  protected add(): void {
    const { woods } = this.pattern();
    this.emit([...woods, ((woods.at(-1) ?? 0) + 1) % this.woods().length]);
  }

  private emit(woods: readonly number[]): void {
    this.changed.emit({ ...this.pattern(), woods });
  }
}
