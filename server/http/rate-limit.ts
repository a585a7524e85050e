import type { Database } from '@drizzle/database';
import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { ApiError } from './errors';
import { rateLimitStore } from './rate-limit-store';

const WINDOW_MINUTES = 15;

/** Failed sign-ins taken from one place within the window: for one e-mail address, and for all together. */
export const SIGN_IN_ATTEMPTS = { oneAddress: 10, together: 60 } as const;

/** Only failures count; whoever signs in correctly is never slowed down. */
export function signInLimits(database: Database): RequestHandler[] {
  const place = (request: Request) => ipKeyGenerator(request.ip ?? '');
  return [
    limit(database, 'sign-in', SIGN_IN_ATTEMPTS.together, place),
    limit(
      database,
      'sign-in one address',
      SIGN_IN_ATTEMPTS.oneAddress,
      (request) => `${place(request)} ${emailIn(request.body)}`,
    ),
  ];
}

function limit(
  database: Database,
  prefix: string,
  attempts: number,
  keyGenerator: (request: Request) => string,
): RequestHandler {
  const windowMs = WINDOW_MINUTES * 60_000;
  return rateLimit({
    windowMs,
    limit: attempts,
    keyGenerator,
    store: rateLimitStore(database, prefix, windowMs),
    skipSuccessfulRequests: true,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, _response, next) => {
      next(
        new ApiError(
          'too-many-requests',
          `Too many attempts to sign in. Wait up to ${WINDOW_MINUTES} minutes and try again.`,
        ),
      );
    },
  });
}

/** The body is not checked yet: only text counts, without the one character PostgreSQL keeps no text with. */
function emailIn(body: unknown): string {
  const email = body !== null && typeof body === 'object' && 'email' in body ? body.email : '';
  return typeof email === 'string' ? email.toLowerCase().slice(0, 254).replaceAll('\0', '') : '';
}
