/**
 * One family of errors. What a route refuses on purpose is an `ApiError`; everything else that is thrown is
 * either a body that could not be read, a database that is away, or our fault, which answers neutrally and
 * is logged with its request id. The text of a database's error never reaches the client.
 */
import type { ApiProblem, ApiProblemCode } from '@shared/api/problem';
import type { Problem } from '@shared/layout/schema';
import type { ErrorRequestHandler, RequestHandler, Response } from 'express';
import { databaseIsAway } from './database-away';

const STATUS: Record<ApiProblemCode, number> = {
  'bad-input': 400,
  'not-signed-in': 401,
  'wrong-credentials': 401,
  'not-allowed': 403,
  'forged-request': 403,
  'not-found': 404,
  conflict: 409,
  stopped: 409,
  'too-large': 413,
  'too-many-requests': 429,
  failed: 500,
  unavailable: 503,
};

/** The HTTP status a problem answers with. */
export function statusOf(code: ApiProblemCode): number {
  return STATUS[code];
}

/** A refusal with its reason. `extra` joins the answer's body, e.g. the conflict of an edit. */
export class ApiError extends Error {
  constructor(
    readonly code: ApiProblemCode,
    message: string,
    readonly fields?: readonly Problem[],
    readonly extra: Readonly<Record<string, unknown>> = {},
  ) {
    super(message);
  }
}

/** Refuses what is not there, or not for this person to know of. */
export const notFound = (what: string) => new ApiError('not-found', `There is no such ${what}.`);

/** Refuses input field by field, with the first as its sentence. */
export const badInput = (fields: readonly Problem[]) =>
  new ApiError('bad-input', sentenceOf(fields), fields);

/** A refusal that brings more than its sentence: the conflict of an edit, the checks that stop a bundle. */
export const refusalWith = (
  code: ApiProblemCode,
  message: string,
  extra: Readonly<Record<string, unknown>>,
) => new ApiError(code, message, undefined, extra);

function sentenceOf([first, ...rest]: readonly Problem[]): string {
  if (!first) return 'The request cannot be understood.';
  const more = rest.length === 0 ? '' : ` (and ${rest.length} more)`;
  return `${first.field === '' ? 'The request' : first.field} ${first.message}${more}.`;
}

/** Answers every API path nobody else answered. */
export const noSuchRoute: RequestHandler = (request) => {
  throw new ApiError(
    'not-found',
    `There is no ${request.method} ${request.baseUrl}${request.path}.`,
  );
};

/** The last handler: turns whatever was thrown into an `ApiProblem`. */
export const answerError: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const refusal = refusalOf(error);
  if (refusal.code === 'failed' || refusal.code === 'unavailable') {
    request.log.error({ err: error }, refusal.code);
  }
  answerProblem(response, refusal);
};

/** Sends a refusal as JSON with its status. */
export function answerProblem(response: Response, refusal: ApiError): void {
  const problem: ApiProblem = {
    code: refusal.code,
    message: refusal.message,
    ...(refusal.fields && { fields: [...refusal.fields] }),
    requestId: response.get('X-Request-Id') ?? '',
  };
  if (refusal.code === 'unavailable') response.set('Retry-After', '5');
  response.status(statusOf(refusal.code)).json({ ...problem, ...refusal.extra });
}

function refusalOf(error: unknown): ApiError {
  if (error instanceof ApiError) return error;
  if (databaseIsAway(error)) {
    return new ApiError(
      'unavailable',
      'The database does not answer at the moment. Nothing was changed; try again in a little while.',
    );
  }
  return (
    unreadableRequest(error) ??
    new ApiError('failed', 'Something went wrong on the server. It has been noted; try again.')
  );
}

/** What Express and its body parser throw about a request, in our words; null for any other error. */
function unreadableRequest(error: unknown): ApiError | null {
  if (!(error instanceof Error) || !('status' in error)) return null;
  if (!('type' in error)) {
    return error.status === 400 ? new ApiError('bad-input', 'The address cannot be read.') : null;
  }
  if (error.type === 'entity.too.large') {
    const limit = 'limit' in error ? Math.floor(Number(error.limit) / 1024) : 0;
    return new ApiError(
      'too-large',
      `The request is too large: at most ${limit} kB are taken here.`,
    );
  }
  const client = typeof error.status === 'number' && error.status >= 400 && error.status < 500;
  return client ? badInput([{ field: '', message: 'must be JSON in UTF-8' }]) : null;
}
