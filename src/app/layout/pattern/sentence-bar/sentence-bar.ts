import { Component, computed, inject } from '@angular/core';
import { EXTENTS } from '@shared/layout/extent';
import { MIRRORS } from '@shared/layout/repeats';
import { LayoutStore } from '../../layout-store';
import { figuresOf } from '../grain/wood-figure';
import { PatternTool } from '../pattern-tool';
import {
  EXTENT_WORDS,
  inSentence,
  MIRROR_WORDS,
  stepWords,
  STEPS,
  timesWords,
} from '../sentence-words';
import { WordChoice, type WordOption } from './word-choice';

/** Says in plain words what the next touch will do; every blue word opens its choices. */
@Component({
  selector: 'sl-sentence-bar',
  imports: [WordChoice],
  template: `
    <div class="sentence" role="group" aria-label="What the next touch does">
      <span>Lay</span>
      <sl-word-choice
        about="Wood"
        [options]="woods()"
        [value]="tool.wood()"
        (valueChange)="tool.wood.set($event)"
      />
      <span>on</span>
      <sl-word-choice
        about="Where"
        [options]="extents"
        [value]="tool.extent()"
        (valueChange)="tool.extent.set($event)"
      />
      <span class="goes-on">{{ tool.times() > 1 ? ', repeated' : ',' }}</span>
      <sl-word-choice
        about="Repeated"
        [options]="times()"
        [value]="tool.times()"
        (valueChange)="tool.repeat($event)"
      />
      @if (tool.times() > 1) {
        <span class="goes-on">, each step</span>
        <sl-word-choice
          about="Each step"
          [options]="steps"
          [value]="tool.step()"
          (valueChange)="tool.step.set($event)"
        />
      }
      <span class="goes-on">,</span>
      <sl-word-choice
        about="Mirrored"
        [options]="mirrors"
        [value]="tool.mirror()"
        (valueChange)="tool.mirror.set($event)"
      />
    </div>
    <span class="hint">Ctrl Z takes it back</span>
  `,
  styleUrl: './sentence-bar.scss',
})
export class SentenceBar {
  private readonly store = inject(LayoutStore);
  protected readonly tool = inject(PatternTool);

  protected readonly woods = computed<WordOption<number>[]>(() => {
    const figures = figuresOf(this.store.woods());
    return this.store.woods().map(({ name, colour }, value) => {
      const figure = figures[value];
      return { value, words: inSentence(name), ...(figure && { wood: { colour, figure } }) };
    });
  });
  protected readonly times = computed(() =>
    this.tool.timesOffered().map((value) => ({ value, words: timesWords(value) })),
  );
  protected readonly extents = EXTENTS.map((value) => ({ value, words: EXTENT_WORDS[value] }));
  protected readonly steps = STEPS.map((value) => ({ value, words: stepWords(value) }));
  protected readonly mirrors = MIRRORS.map((value) => ({ value, words: MIRROR_WORDS[value] }));
}
