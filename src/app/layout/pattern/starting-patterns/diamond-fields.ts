import { Component, input, output } from '@angular/core';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Diamonds } from '@shared/layout/starting-patterns/starting-pattern';
import { ChoiceBar, type Choice } from '../../../drawing/choice-bar';
import { CountField } from '../../../drawing/count-field';
import { WordChoice, type WordOption } from '../sentence-bar/word-choice';

const DRAWN: readonly Choice<Diamonds['drawn']>[] = [
  { value: 'filled', label: 'Filled' },
  { value: 'outline', label: 'Outline' },
];

/** Size and woods of diamonds. */
@Component({
  selector: 'sl-diamond-fields',
  imports: [ChoiceBar, CountField, WordChoice],
  template: `
    <p class="hint">Size of one diamond:</p>
    <div class="pair">
      <sl-count-field
        label="Staves wide"
        [value]="pattern().staves"
        [least]="bounds.slope.least"
        [most]="bounds.slope.most"
        (typing)="changed.emit({ ...pattern(), staves: $event })"
      />
      <sl-count-field
        label="Courses high"
        [value]="pattern().courses"
        [least]="bounds.diamondCourses.least"
        [most]="bounds.diamondCourses.most"
        (typing)="changed.emit({ ...pattern(), courses: $event })"
      />
    </div>
    <sl-choice-bar
      label="How they are drawn"
      [choices]="drawn"
      [value]="pattern().drawn"
      (chosen)="changed.emit({ ...pattern(), drawn: $event })"
    />
    <div class="wood">
      Diamonds in
      <sl-word-choice
        about="Wood of the diamonds"
        [options]="woods()"
        [value]="pattern().diamond"
        (valueChange)="changed.emit({ ...pattern(), diamond: $event })"
      />
    </div>
    <div class="wood">
      on
      <sl-word-choice
        about="Wood of the ground"
        [options]="woods()"
        [value]="pattern().ground"
        (valueChange)="changed.emit({ ...pattern(), ground: $event })"
      />
    </div>
  `,
  styleUrl: './fields.scss',
})
export class DiamondFields {
  readonly pattern = input.required<Diamonds>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<Diamonds>();
  protected readonly bounds = PATTERN_BOUNDS;
  protected readonly drawn = DRAWN;
}
