/**
 * Protection against requests that another site makes a browser send. A token lies in a cookie that our own
 * page can read; the page sends it back in a header, which another site cannot. The token is signed and
 * bound to the session (before sign-in: to being signed out), so a token planted from elsewhere, or one left
 * over from an earlier session, is refused. Angular's HttpClient knows both names.
 */
import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import type { Request, Response } from 'express';
import { ApiError } from './errors';

export const CSRF_COOKIE = 'XSRF-TOKEN';
export const CSRF_HEADER = 'x-xsrf-token';

/** Gives out tokens and checks them. */
export interface CsrfGuard {
  /** Sets the cookie unless the browser already holds a good one for this session. */
  readonly hand: (request: Request, response: Response) => void;
  /** Throws `forged-request` unless cookie and header hold the same good token. */
  readonly demand: (request: Request) => void;
}

/** A guard whose tokens are signed with this secret, so that every server process takes them. */
export function createCsrfGuard(secret: string): CsrfGuard {
  const signature = (nonce: string, sessionId: string) =>
    createHmac('sha256', secret).update(`csrf ${nonce} ${sessionId}`).digest('base64url');

  const isGood = (token: string | undefined, request: Request): boolean => {
    const [nonce, signed] = token?.split('.') ?? [];
    if (!nonce || !signed) return false;
    return equalText(signed, signature(nonce, sessionIdOf(request)));
  };

  return {
    hand: (request, response) => {
      if (isGood(cookieOf(request, CSRF_COOKIE), request)) return;
      const nonce = randomBytes(18).toString('base64url');
      response.cookie(CSRF_COOKIE, `${nonce}.${signature(nonce, sessionIdOf(request))}`, {
        sameSite: 'lax',
        secure: request.secure,
        path: '/',
      });
    },
    demand: (request) => {
      const inHeader = request.get(CSRF_HEADER);
      const inCookie = cookieOf(request, CSRF_COOKIE);
      if (inHeader && inCookie && equalText(inHeader, inCookie) && isGood(inHeader, request))
        return;
      throw new ApiError(
        'forged-request',
        'This request did not come with the page’s token. Load the page again and repeat it.',
      );
    },
  };
}

/** Sessions that were never saved count as none: their id changes with every request. */
function sessionIdOf(request: Request): string {
  return request.user ? request.sessionID : 'signed out';
}

function cookieOf(request: Request, name: string): string | undefined {
  const pair = request.headers.cookie?.split(/; */).find((text) => text.startsWith(`${name}=`));
  return pair?.slice(name.length + 1);
}

function equalText(a: string, b: string): boolean {
  const [bytesA, bytesB] = [Buffer.from(a), Buffer.from(b)];
  return bytesA.length === bytesB.length && timingSafeEqual(bytesA, bytesB);
}
