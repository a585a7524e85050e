import { Component, inject } from '@angular/core';
import { EmptyPlace } from '../drawing/empty-place';
import { SessionStore } from '../platform/session-store';

/** What a client sees after signing in: the shell made for them comes to them by link. */
@Component({
  selector: 'sl-client-welcome',
  imports: [EmptyPlace],
  template: `
    <sl-empty-place
      [level]="1"
      [heading]="'Welcome, ' + (session.person()?.name ?? '')"
      [text]="
        (session.person()?.workshop?.name ?? 'The workshop') +
        ' sends you a link by e-mail when a shell is ready for you to look at. There is nothing to do here until then.'
      "
    />
  `,
})
export class ClientWelcome {
  protected readonly session = inject(SessionStore);
}
