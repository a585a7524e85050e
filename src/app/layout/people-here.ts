import { Component, computed, inject } from '@angular/core';
import { MatTooltip } from '@angular/material/tooltip';
import type { Present } from '@shared/api/live';
import { tileName } from '@shared/layout/cells';
import { Avatar } from '../drawing/avatar';
import { LayoutStore } from './layout-store';
import { STATIONS } from './stations';

/** Who else has the layout open, one disc a person, with where they are. */
@Component({
  selector: 'sl-people-here',
  imports: [Avatar, MatTooltip],
  template: `
    @if (people().length > 0) {
      <ul aria-label="Also here">
        @for (person of people(); track person.id) {
          <li [matTooltip]="person.words">
            <sl-avatar [name]="person.name" />
            <span class="cdk-visually-hidden">{{ person.words }}</span>
          </li>
        }
      </ul>
    }
  `,
  styles: `
    :host {
      display: contents;
    }
    ul {
      display: flex;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li + li {
      margin-left: -6px;
    }
    sl-avatar {
      border: 2px solid var(--sheet);
      box-sizing: content-box;
    }
  `,
})
export class PeopleHere {
  private readonly store = inject(LayoutStore);

  /** One entry a person, however many windows they have open. */
  protected readonly people = computed(() => {
    const byPerson = new Map<string, Present>();
    for (const present of this.store.people()) {
      const known = byPerson.get(present.person.id);
      if (!known?.tile) byPerson.set(present.person.id, present);
    }
    return [...byPerson.values()].map((present) => ({
      id: present.person.id,
      name: present.person.name,
      words: `${present.person.name} is here: ${whereWords(present)}`,
    }));
  });
}

function whereWords({ station, tile }: Present): string {
  const name = STATIONS.find(({ path }) => path === station)?.name ?? station;
  return tile ? `${name}, tile ${tileName(tile.stave, tile.course)}` : name;
}
