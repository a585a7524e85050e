import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { pino, type DestinationStream, type Logger } from 'pino';
import { pinoHttp, type Options } from 'pino-http';

/** Structured log lines, on standard output unless another destination is given. */
export function createLogger(level: string, destination?: DestinationStream): Logger {
  return destination ? pino({ level }, destination) : pino({ level });
}

/** A proxy's request id is taken over when it looks like one, so that its log and ours can be laid side by side. */
const REQUEST_ID = /^[A-Za-z0-9_-]{8,64}$/;

/** What is written of request and answer: chosen here one by one, so that cookies and tokens never are. */
const serializers = {
  req: ({ id, method, url, remoteAddress }: Record<string, unknown>) => ({
    id,
    method,
    url,
    remoteAddress,
  }),
  res: ({ statusCode }: Record<string, unknown>) => ({ statusCode }),
} satisfies Options['serializers'];

/** One log line a request, with the id that also goes back in `X-Request-Id`. */
export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    serializers,
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
