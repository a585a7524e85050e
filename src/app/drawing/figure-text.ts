import { Component, computed, input } from '@angular/core';
import { figuresIn } from './figures';

/** A sentence with its figures set bold. */
@Component({
  selector: 'sl-figure-text',
  template: `
    @for (part of parts(); track $index) {
      @if (part.kind === 'figure') {
        <b>{{ part.text }}</b>
      } @else {
        <ng-container>{{ part.text }}</ng-container>
      }
    }
  `,
  styles: `
    b {
      font-weight: 800;
      white-space: nowrap;
    }
  `,
})
export class FigureText {
  readonly text = input.required<string>();
  protected readonly parts = computed(() => figuresIn(this.text()));
}
