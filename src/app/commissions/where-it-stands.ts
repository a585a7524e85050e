import { Component, computed, input } from '@angular/core';
import { STAGES, type Stage } from '@shared/api/commission';
import { STAGE_WORDS } from './commission-words';

/** The stage in a word and as steps of six, the done ones filled. */
@Component({
  selector: 'sl-where-it-stands',
  template: `
    <span class="word"
      >{{ word()
      }}<span class="cdk-visually-hidden">, step {{ step() }} of {{ steps.length }}</span></span
    >
    <span class="steps" aria-hidden="true">
      @for (stage of steps; track stage) {
        <i [class.done]="$index < step()"></i>
      }
    </span>
  `,
  styles: `
    :host {
      display: grid;
      gap: 5px;
      justify-items: start;
    }
    .steps {
      display: flex;
      gap: 4px;
    }
    i {
      width: 22px;
      height: 6px;
      border-radius: 3px;
      background: var(--well);
    }
    .done {
      background: var(--blue);
    }
    @media (forced-colors: active) {
      .done {
        background: CanvasText;
        forced-color-adjust: none;
      }
    }
  `,
})
export class WhereItStands {
  readonly stage = input.required<Stage>();
  protected readonly steps = STAGES;
  protected readonly word = computed(() => STAGE_WORDS[this.stage()]);
  protected readonly step = computed(() => STAGES.indexOf(this.stage()) + 1);
}
