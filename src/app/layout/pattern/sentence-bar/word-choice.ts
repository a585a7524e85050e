import { Component, computed, input, output } from '@angular/core';
import { MatMenuModule } from '@angular/material/menu';
import { Icon } from '../../../drawing/icon';
import { WoodStrip } from '../wood-tray/wood-strip';
import type { WoodFigure } from '../grain/wood-figure';

export interface WordOption<V> {
  readonly value: V;
  readonly words: string;
  /** Shown as a small piece of itself before the words. */
  readonly wood?: { readonly colour: string; readonly figure: WoodFigure };
}

/** One blue word of the sentence: opens its choices, says what it is about, and tells which was taken. */
@Component({
  selector: 'sl-word-choice',
  imports: [Icon, MatMenuModule, WoodStrip],
  template: `
    <button
      type="button"
      class="word"
      [matMenuTriggerFor]="menu"
      [attr.aria-label]="about() + ': ' + (chosen()?.words ?? '')"
    >
      @if (chosen()?.wood; as wood) {
        <sl-wood-strip class="chip" [colour]="wood.colour" [figure]="wood.figure" />
      }
      {{ chosen()?.words }}
      <sl-icon name="down" />
    </button>
    <mat-menu #menu="matMenu" class="sl-word-menu">
      @for (option of options(); track option.value) {
        <button
          mat-menu-item
          type="button"
          role="menuitemradio"
          [attr.aria-checked]="option.value === value()"
          (click)="valueChange.emit(option.value)"
        >
          <span class="line">
            <span class="tick">
              @if (option.value === value()) {
                <sl-icon name="check" />
              }
            </span>
            @if (option.wood; as wood) {
              <sl-wood-strip class="chip" [colour]="wood.colour" [figure]="wood.figure" />
            }
            {{ option.words }}
          </span>
        </button>
      }
    </mat-menu>
  `,
  styleUrl: './word-choice.scss',
})
export class WordChoice<V extends string | number> {
  /** What the word is about, for who cannot see the sentence: "Wood", "Repeated". */
  readonly about = input.required<string>();
  readonly options = input.required<readonly WordOption<V>[]>();
  readonly value = input.required<V>();
  readonly valueChange = output<V>();
  protected readonly chosen = computed(() =>
    this.options().find((option) => option.value === this.value()),
  );
}
