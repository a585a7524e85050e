import { Component, computed, inject, input } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { worstOf } from '@shared/checks/check';
import { Lamp } from '../drawing/lamp';
import { LayoutStore } from './layout-store';
import { checksOf, STATIONS } from './stations';

/** The stations in the order of the work, each with a lamp that shows its worst check. */
@Component({
  selector: 'sl-stations-bar',
  imports: [Lamp, RouterLink, RouterLinkActive],
  template: `
    <nav aria-label="Stations">
      @for (station of stations(); track station.path) {
        <a
          #link
          [routerLink]="[base(), station.path]"
          routerLinkActive="here"
          ariaCurrentWhenActive="page"
          (isActiveChange)="$event ? reveal(link) : null"
        >
          @if (station.state) {
            <sl-lamp [state]="station.state" />
          }
          {{ station.name }}
        </a>
      }
    </nav>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    nav {
      display: flex;
      overflow-x: auto;
      scrollbar-width: none;
    }
    a {
      display: flex;
      flex: none;
      gap: 9px;
      align-items: center;
      min-height: 50px;
      padding: 2px 18px 0;
      border-bottom: 3px solid transparent;
      color: var(--mute);
      font-weight: 700;
      text-decoration: none;
    }
    a:hover {
      color: var(--ink);
    }
    .here {
      border-bottom-color: var(--blue);
      color: var(--ink);
    }
    a:focus-visible {
      outline-offset: -4px;
      border-radius: var(--radius);
    }
    @media (max-width: 599px) {
      a {
        gap: 6px;
        padding: 2px 10px 0;
      }
      /* The stations that do not fit fade out, so that one sees there are more. */
      nav {
        mask-image: linear-gradient(to right, #000 calc(100% - 36px), transparent);
      }
      nav::after {
        flex: 0 0 36px;
        content: '';
      }
    }
  `,
})
export class StationsBar {
  private readonly store = inject(LayoutStore);
  /** Address of the layout; the stations lie under it. */
  readonly base = input.required<string>();

  protected readonly stations = computed(() => {
    const checks = this.store.checks();
    return STATIONS.map((station) => ({
      ...station,
      state: station.lamp === null ? null : worstOf(checksOf(station, checks)),
    }));
  });

  /** On a narrow screen the stations scroll sideways: the one that is open comes into view. */
  protected reveal(link: HTMLElement): void {
    link.scrollIntoView({ block: 'nearest', inline: 'center' });
  }
}
