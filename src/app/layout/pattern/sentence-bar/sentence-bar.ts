import { NgTemplateOutlet } from '@angular/common';
import { Component, computed, inject } from '@angular/core';
import { EXTENTS } from '@shared/layout/extent';
import { AT_THE_END, MIRRORS } from '@shared/layout/repeats';
import { LayoutStore } from '../../layout-store';
import { PatternTool } from '../pattern-tool';
import {
  atTheEndWords,
  COPY_EXTENTS,
  COPY_WORDS,
  EXTENT_WORDS,
  MIRROR_WORDS,
  sizeWords,
  stepWords,
  STEPS,
  timesWords,
  VERB_WORDS,
  VERBS,
} from '../sentence-words';
import { woodOptions } from './wood-options';
import { WordChoice } from './word-choice';

/** Says in plain words what the next touch will do; every blue word opens its choices. */
@Component({
  selector: 'sl-sentence-bar',
  imports: [NgTemplateOutlet, WordChoice],
  template: `
    <div class="sentence" role="group" aria-label="What the next touch does">
      <sl-word-choice
        about="What to do"
        [options]="verbs()"
        [value]="tool.verb()"
        (valueChange)="tool.take($event)"
      />
      @switch (tool.verb()) {
        @case ('lay') {
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
          <ng-container [ngTemplateOutlet]="again" />
        }
        @case ('copy') {
          <sl-word-choice
            about="What to copy"
            [options]="copyExtents"
            [value]="tool.copyExtent()"
            (valueChange)="tool.copyExtent.set($event)"
          />
          <span class="goes-on">, to lay it again here or in another layout</span>
        }
        @case ('lay-copy') {
          <span>of {{ copySize() }}</span>
          <ng-container [ngTemplateOutlet]="again" />
        }
      }
    </div>
    <span class="hint">{{
      tool.verb() === 'copy' ? 'Nothing is changed' : 'Ctrl Z takes it back'
    }}</span>
    <ng-template #again>
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
        @if (tool.step() !== 0) {
          <span class="goes-on">,</span>
          <sl-word-choice
            about="At the end of the shell"
            [options]="atTheEnd()"
            [value]="tool.atTheEnd()"
            (valueChange)="tool.atTheEnd.set($event)"
          />
        }
      }
      <span class="goes-on">,</span>
      <sl-word-choice
        about="Mirrored"
        [options]="mirrors"
        [value]="tool.mirror()"
        (valueChange)="tool.mirror.set($event)"
      />
    </ng-template>
  `,
  styleUrl: './sentence-bar.scss',
})
export class SentenceBar {
  private readonly store = inject(LayoutStore);
  protected readonly tool = inject(PatternTool);

  protected readonly woods = computed(() => woodOptions(this.store.woods()));
  protected readonly times = computed(() =>
    this.tool.timesOffered().map((value) => ({ value, words: timesWords(value) })),
  );
  protected readonly verbs = computed(() =>
    VERBS.filter((value) => value !== 'lay-copy' || this.tool.copied() !== null).map((value) => ({
      value,
      words: VERB_WORDS[value],
    })),
  );
  protected readonly copySize = computed(() => {
    const copied = this.tool.copied();
    return copied ? sizeWords(copied) : '';
  });
  protected readonly copyExtents = COPY_EXTENTS.map((value) => ({
    value,
    words: COPY_WORDS[value],
  }));
  protected readonly atTheEnd = computed(() =>
    AT_THE_END.map((value) => ({ value, words: atTheEndWords(value, this.tool.step()) })),
  );
  protected readonly extents = EXTENTS.map((value) => ({ value, words: EXTENT_WORDS[value] }));
  protected readonly steps = STEPS.map((value) => ({ value, words: stepWords(value) }));
  protected readonly mirrors = MIRRORS.map((value) => ({ value, words: MIRROR_WORDS[value] }));
}
