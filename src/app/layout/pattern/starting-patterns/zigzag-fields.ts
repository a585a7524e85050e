import { Component, input, output } from '@angular/core';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Zigzag } from '@shared/layout/starting-patterns/starting-pattern';
import { CountField } from '../../../drawing/count-field';
import type { WordOption } from '../sentence-bar/word-choice';
import { StripeFields } from './stripe-fields';

/** Crests of a zigzag, and its stripes. */
@Component({
  selector: 'sl-zigzag-fields',
  imports: [CountField, StripeFields],
  template: `
    <div class="pair">
      <sl-count-field
        label="Staves, crest to crest"
        [value]="pattern().staves"
        [least]="bounds.slope.least"
        [most]="bounds.slope.most"
        (typing)="changed.emit({ ...pattern(), staves: $event })"
      />
      <sl-count-field
        label="Rise, in courses"
        [value]="pattern().rise"
        [least]="bounds.rise.least"
        [most]="bounds.rise.most"
        (typing)="changed.emit({ ...pattern(), rise: $event })"
      />
    </div>
    <sl-stripe-fields
      [stripes]="pattern().stripes"
      [woods]="woods()"
      (changed)="changed.emit({ ...pattern(), stripes: $event })"
    />
  `,
  styleUrl: './fields.scss',
})
export class ZigzagFields {
  readonly pattern = input.required<Zigzag>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<Zigzag>();
  protected readonly bounds = PATTERN_BOUNDS;
}
