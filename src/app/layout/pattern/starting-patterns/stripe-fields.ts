import { Component, input, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { PATTERN_BOUNDS } from '@shared/layout/starting-patterns/bounds';
import type { Stripe } from '@shared/layout/starting-patterns/starting-pattern';
import { CountField } from '../../../drawing/count-field';
import { Icon } from '../../../drawing/icon';
import { WordChoice, type WordOption } from '../sentence-bar/word-choice';

/** The stripes of a pattern from the bottom up: a wood and a width each, added and taken out. */
@Component({
  selector: 'sl-stripe-fields',
  imports: [CountField, Icon, MatButton, MatIconButton, WordChoice],
  template: `
    <p class="hint">Stripes, from the bottom up:</p>
    @for (stripe of stripes(); track $index) {
      <div class="row">
        <sl-word-choice
          [about]="'Wood of stripe ' + ($index + 1)"
          [options]="woods()"
          [value]="stripe.wood"
          (valueChange)="set($index, { wood: $event, width: stripe.width })"
        />
        <sl-count-field
          [label]="'Courses of ' + ($index + 1)"
          [value]="stripe.width"
          [least]="bounds.stripe.least"
          [most]="bounds.stripe.most"
          (typing)="set($index, { wood: stripe.wood, width: $event })"
        />
        <button
          matIconButton
          type="button"
          [disabled]="stripes().length <= bounds.stripes.least"
          [attr.aria-label]="'Take stripe ' + ($index + 1) + ' out'"
          (click)="remove($index)"
        >
          <sl-icon name="minus" />
        </button>
      </div>
    }
    <button
      matButton
      type="button"
      class="add"
      [disabled]="stripes().length >= bounds.stripes.most"
      (click)="add()"
    >
      <sl-icon matButtonIcon name="add" /> Add a stripe
    </button>
  `,
  styleUrl: './fields.scss',
})
export class StripeFields {
  readonly stripes = input.required<readonly Stripe[]>();
  readonly woods = input.required<readonly WordOption<number>[]>();
  readonly changed = output<readonly Stripe[]>();
  protected readonly bounds = PATTERN_BOUNDS;

  protected set(index: number, stripe: Stripe): void {
    this.changed.emit(this.stripes().map((old, i) => (i === index ? stripe : old)));
  }

  protected remove(index: number): void {
    this.changed.emit(this.stripes().filter((_, i) => i !== index));
  }

  /** The new stripe is in the wood after the last one's, so that it shows. */
  protected add(): void {
    const last = this.stripes().at(-1)?.wood ?? 0;
    const wood = (last + 1) % this.woods().length;
    this.changed.emit([...this.stripes(), { wood, width: 1 }]);
  }
}
