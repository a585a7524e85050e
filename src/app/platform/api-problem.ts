import { HttpErrorResponse } from '@angular/common/http';
import { problemSchema, type ApiProblemCode } from '@shared/api/problem';

const NO_ANSWER =
  'The server does not answer. Check the connection of this computer; what is on the page stays as it is.';
const UNKNOWN = 'Something went wrong on the server. Try again; if it stays, tell whoever runs it.';

export interface FieldProblem {
  readonly field: string;
  readonly message: string;
}

/**
 * A request that was not answered as hoped, in words a person can read. `status` is 0 and `code`
 * "unavailable" when no answer came at all; `body` is the whole answer, for problems that carry more
 * than the common fields (a conflict, the checks that stopped a bundle).
 */
export class ApiFailure extends Error {
  override readonly name = 'ApiFailure';

  constructor(
    readonly status: number,
    readonly code: ApiProblemCode,
    message: string,
    readonly fields: readonly FieldProblem[] = [],
    readonly body: unknown = null,
  ) {
    super(message);
  }
}

/** The failure behind anything a request threw; never throws itself. */
export function apiFailureOf(thrown: unknown): ApiFailure {
  if (thrown instanceof ApiFailure) return thrown;
  if (!(thrown instanceof HttpErrorResponse)) return new ApiFailure(0, 'failed', UNKNOWN);
  const body: unknown = bodyOf(thrown);
  const parsed = problemSchema.safeParse(body);
  if (parsed.success) {
    const { code, message, fields } = parsed.data;
    return new ApiFailure(thrown.status, code, message, fields, body);
  }
  if (thrown.status === 0 || (thrown.status >= 502 && thrown.status <= 504)) {
    return new ApiFailure(thrown.status, 'unavailable', NO_ANSWER, [], body);
  }
  return new ApiFailure(thrown.status, codeOfStatus(thrown.status), UNKNOWN, [], body);
}

/** An answer read as text (a download that was refused) is still JSON. */
function bodyOf(response: HttpErrorResponse): unknown {
  if (typeof response.error !== 'string') return response.error;
  try {
    return JSON.parse(response.error);
  } catch {
    return response.error;
  }
}

function codeOfStatus(status: number): ApiProblemCode {
  switch (status) {
    case 401:
      return 'not-signed-in';
    case 403:
      return 'not-allowed';
    case 404:
      return 'not-found';
    case 409:
      return 'conflict';
    case 413:
      return 'too-large';
    case 429:
      return 'too-many-requests';
    default:
      return 'failed';
  }
}
