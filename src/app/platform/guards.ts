import { inject } from '@angular/core';
import { RedirectCommand, Router, type CanActivateFn } from '@angular/router';
import type { Right } from '@shared/api/rights';
import { SessionStore } from './session-store';

/** Leads to the sign-in page, remembering the address that was asked for. */
export const mustBeSignedIn: CanActivateFn = async (_route, state) => {
  const session = inject(SessionStore);
  const router = inject(Router);
  const person = await personOrNull(session);
  if (person !== null) return true;
  const queryParams = state.url === '/' ? {} : { next: state.url };
  return new RedirectCommand(router.createUrlTree(['/sign-in'], { queryParams }));
};

/** Someone who is signed in already has no business on the sign-in page. */
export const mustBeSignedOut: CanActivateFn = async () => {
  const session = inject(SessionStore);
  const router = inject(Router);
  const person = await personOrNull(session);
  return person === null ? true : new RedirectCommand(router.parseUrl('/'));
};

/** Lets through who has the right; everyone else gets the plain welcome page. */
export function mustHaveRight(right: Right): CanActivateFn {
  return async () => {
    const session = inject(SessionStore);
    const router = inject(Router);
    await personOrNull(session);
    return session.may(right) ? true : new RedirectCommand(router.parseUrl('/welcome'));
  };
}

/** With the server away nobody counts as signed in; the sign-in page then says what is wrong. */
async function personOrNull(session: SessionStore) {
  try {
    return await session.load();
  } catch {
    return null;
  }
}
