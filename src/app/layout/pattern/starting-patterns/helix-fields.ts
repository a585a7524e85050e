import { Component, input, output } from '@angular/core';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Hand, Helix } from '@shared/layout/starting-patterns/starting-pattern';
import { ChoiceBar, type Choice } from '../../../drawing/choice-bar';
import { CountField } from '../../../drawing/count-field';
import type { WordOption } from '../sentence-bar/word-choice';
import { StripeFields } from './stripe-fields';

const HAND_CHOICES: readonly Choice<Hand>[] = [
  { value: 'right', label: 'To the right' },
  { value: 'left', label: 'To the left' },
];

/** Lead and hand of a helix, and its stripes. */
@Component({
  selector: 'sl-helix-fields',
  imports: [ChoiceBar, CountField, StripeFields],
  template: `
    <sl-count-field
      label="Lead, in courses a turn"
      [value]="pattern().lead"
      [least]="bounds.lead.least"
      [most]="bounds.lead.most"
      (typing)="changed.emit({ ...pattern(), lead: $event })"
    />
    <sl-choice-bar
      label="Which way it climbs"
      [choices]="hands"
      [value]="pattern().hand"
      (chosen)="changed.emit({ ...pattern(), hand: $event })"
    />
    <sl-stripe-fields
      [stripes]="pattern().stripes"
      [woods]="woods()"
      (changed)="changed.emit({ ...pattern(), stripes: $event })"
    />
  `,
  styleUrl: './fields.scss',
})
export class HelixFields {
  readonly pattern = input.required<Helix>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<Helix>();
  protected readonly bounds = PATTERN_BOUNDS;
  protected readonly hands = HAND_CHOICES;
}
