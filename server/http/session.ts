import type { OpenDatabase } from '@drizzle/database';
import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';
import type { Logger } from 'pino';
import type { Config } from '../config';

export const SESSION_COOKIE = 'staveloom.sid';

/**
 * Sessions in PostgreSQL, so that any server process can answer any request. Nobody gets one before signing
 * in. The cookie is marked secure as soon as the request came in over HTTPS (through a trusted proxy too).
 */
export function sessions(config: Config, pool: OpenDatabase['pool'], logger: Logger) {
  const PostgresStore = connectPgSimple(session);
  return session({
    name: SESSION_COOKIE,
    secret: config.sessionSecret,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    store: new PostgresStore({
      pool,
      tableName: 'sessions',
      pruneSessionInterval: config.environment === 'test' ? false : 15 * 60,
      errorLog: (...details: unknown[]) => logger.error({ details }, 'sessions'),
    }),
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: 'auto',
      maxAge: config.sessionHours * 3_600_000,
    },
  });
}
