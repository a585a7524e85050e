import { Component, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { interval, map, startWith } from 'rxjs';
import { fieldName } from './field-names';
import { LayoutStore } from './layout-store';

/** What the person must know about saving: a save that failed, and an edit the server will not take. */
@Component({
  selector: 'sl-save-trouble',
  imports: [MatButton],
  template: `
    @if (failed(); as failed) {
      <div class="strip" role="alert">
        <p>
          <b>Not saved.</b> {{ failed.sentence }} What you did is kept in this browser and tried
          again.
        </p>
        <span class="when" aria-hidden="true">{{ failed.when }}</span>
        <button matButton type="button" (click)="store.retry()">Try now</button>
      </div>
    }
    @if (refused(); as sentence) {
      <div class="strip" role="alert">
        <p><b>Taken back.</b> {{ sentence }}</p>
        <button matButton type="button" (click)="store.dismissRefusal()">Close</button>
      </div>
    }
  `,
  styles: `
    .strip {
      display: flex;
      gap: 12px;
      align-items: center;
      padding: 6px 20px;
      border-bottom: 1px solid var(--line);
      border-left: 5px solid var(--stop);
      background: var(--sheet);
    }
    p {
      flex: 1;
      margin: 0;
    }
    b {
      color: var(--stop-ink);
    }
    .when {
      color: var(--mute);
      white-space: nowrap;
    }
  `,
})
export class SaveTrouble {
  protected readonly store = inject(LayoutStore);
  private readonly now = toSignal(
    interval(1000).pipe(
      startWith(0),
      map(() => Date.now()),
    ),
    { requireSync: true },
  );

  protected readonly failed = computed(() => {
    const state = this.store.saving();
    if (state.kind !== 'failed') return null;
    const seconds = Math.ceil((state.retryAt - this.now()) / 1000);
    return { sentence: state.sentence, when: seconds > 0 ? `again in ${seconds} s` : 'trying…' };
  });

  protected readonly refused = computed(() => {
    const failure = this.store.refused();
    if (!failure) return null;
    const fields = failure.fields.map(({ field, message }) => `${fieldName(field)} ${message}.`);
    return [failure.message, ...fields].join(' ');
  });
}
