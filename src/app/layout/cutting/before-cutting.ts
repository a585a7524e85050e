import { Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { FigureText } from '../../drawing/figure-text';
import { Icon } from '../../drawing/icon';
import { Lamp } from '../../drawing/lamp';
import { LayoutStore } from '../layout-store';
import { STATIONS } from '../stations';
import { worstFirst } from './worst-first';

/** Every check of the draft with its lamp, worst first; a check opens on its reason and its remedy. */
@Component({
  selector: 'sl-before-cutting',
  imports: [FigureText, Icon, Lamp, RouterLink],
  template: `
    <section aria-labelledby="sl-before-cutting">
      <h2 id="sl-before-cutting">Before it can be cut</h2>
      <p class="mute">{{ verdict() }}</p>
      @for (check of checks(); track check.key) {
        <details>
          <summary>
            <sl-lamp [state]="check.result" />
            <span><sl-figure-text [text]="check.finding" /></span>
            <sl-icon name="down" />
          </summary>
          <div class="more">
            <p>
              <b>{{ check.title }}.</b> {{ check.reason }}
            </p>
            @if (check.remedy !== '') {
              <p><sl-figure-text [text]="check.remedy" /></p>
              <a [routerLink]="['..', check.station]">
                Mend it at the {{ check.stationName }} station
              </a>
            }
          </div>
        </details>
      }
    </section>
  `,
  styleUrl: './before-cutting.scss',
})
export class BeforeCutting {
  private readonly store = inject(LayoutStore);
  protected readonly checks = computed(() =>
    worstFirst(this.store.checks()).map((check) => ({
      ...check,
      stationName: STATIONS.find(({ path }) => path === check.station)?.name,
    })),
  );
  protected readonly verdict = computed(() => {
    const stops = this.checks().filter((check) => check.result === 'stop').length;
    const cautions = this.checks().filter((check) => check.result === 'caution').length;
    if (stops > 0) return `${stops} of the draft’s checks ${stops === 1 ? 'says' : 'say'} stop.`;
    if (cautions > 0) return `The draft can be cut; ${cautions} of its checks call for caution.`;
    return 'The draft can be cut: every check is clear.';
  });
}
