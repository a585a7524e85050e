import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { pino, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** Structured log lines on standard output; secrets are taken out before they are written. */
export function createLogger(level: string): Logger {
  return pino({
    level,
    redact: {
      paths: [
        'req.headers.cookie',
        'req.headers.authorization',
        'req.headers["x-xsrf-token"]',
        'res.headers["set-cookie"]',
      ],
      censor: '(kept out)',
    },
  });
}

/** A proxy's request id is taken over when it looks like one, so that its log and ours can be laid side by side. */
const REQUEST_ID = /^[A-Za-z0-9_-]{8,64}$/;

/** One log line a request, with the id that also goes back in `X-Request-Id`. */
export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: (request: IncomingMessage, response: ServerResponse) => {
      const given = request.headers['x-request-id'];
      const id = typeof given === 'string' && REQUEST_ID.test(given) ? given : randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    customLogLevel: (_request, response, error) =>
      error || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'warn' : 'info',
  });
}
