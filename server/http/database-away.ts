/** Codes of Node and PostgreSQL that mean: nobody there, going away, or not yet ready. */
const AWAY = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  'EHOSTUNREACH',
  'ENOTFOUND',
  'EAI_AGAIN',
  '57P01',
  '57P02',
  '57P03',
  '08000',
  '08001',
  '08003',
  '08006',
  '53300',
]);

/** What pg says, without a code, when a connection ends or cannot be had in time. */
const AWAY_MESSAGES =
  /^(timeout exceeded when trying to connect|Connection terminated|Query read timeout|Client has encountered a connection error|Cannot use a pool after)/;

/** True when an error, or what caused it, says that the database cannot be reached. */
export function databaseIsAway(error: unknown): boolean {
  for (let cause: unknown = error, depth = 0; cause instanceof Error && depth < 5; depth++) {
    if ('code' in cause && AWAY.has(String(cause.code))) return true;
    if (AWAY_MESSAGES.test(cause.message)) return true;
    if (cause instanceof AggregateError && cause.errors.some(databaseIsAway)) return true;
    cause = cause.cause;
  }
  return false;
}
