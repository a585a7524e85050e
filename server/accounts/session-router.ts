import type { RequestHandler } from 'express';
import { API_ROUTES } from '../api-routes';
import { ApiError } from '../http/errors';
import type { RouteMount } from '../http/route';
import { SESSION_COOKIE } from '../http/session';
import { authenticate, beginSession, endSession, type SignInPassport } from './sign-in';

/** Who is signed in, signing in and signing out. */
export function mountSession(
  mount: RouteMount,
  passport: SignInPassport,
  signInLimits: readonly RequestHandler[],
): void {
  mount(API_ROUTES.whoIsSignedIn, ({ person }) => ({ person }));

  mount(
    API_ROUTES.signIn,
    async ({ request }) => {
      const person = await authenticate(passport, request);
      if (!person) {
        throw new ApiError('wrong-credentials', 'E-mail and password do not belong together.');
      }
      await beginSession(request, person);
      return { person };
    },
    { afterBody: signInLimits },
  );

  mount(API_ROUTES.signOut, async ({ request }) => {
    await endSession(request);
    request.res?.clearCookie(SESSION_COOKIE);
    return undefined;
  });
}
