/** The environment, read once at start. Nothing else in the server looks at process.env. */
import { isIP } from 'node:net';
import * as z from 'zod';

const SECRET_BOUND = 'must be at least 32 characters long';

const environmentSchema = z.object({
  NODE_ENV: z
    .enum(['development', 'production', 'test'], {
      error: 'must be "development", "production" or "test"',
    })
    .default('production'),
  DATABASE_URL: z
    .string({ error: 'must be set to a postgres:// address' })
    .regex(/^postgres(ql)?:\/\//, 'must be a postgres:// address')
    .refine(URL.canParse, 'must be a postgres:// address'),
  DATABASE_CONNECTIONS: wholeNumber(1, 100).default(10),
  HOST: z.string().min(1, 'must not be empty').default('127.0.0.1'),
  PORT: wholeNumber(0, 65_535).default(3000),
  SESSION_SECRET: z.string({ error: `must be set; it ${SECRET_BOUND}` }).min(32, SECRET_BOUND),
  SESSION_HOURS: wholeNumber(1, 720).default(12),
  /** How many proxies stand in front, or their addresses as Express takes them; "false" for none. */
  TRUST_PROXY: z
    .string()
    .refine(
      isProxyList,
      'must be "false", a number of proxies, or their addresses such as "loopback, 10.0.0.0/8"',
    )
    .default('false'),
  LOG_LEVEL: z
    .enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'], {
      error: 'must be one of fatal, error, warn, info, debug, trace, silent',
    })
    .default('info'),
  APP_FOLDER: z.string().min(1, 'must not be empty').default('dist/app'),
});

function wholeNumber(least: number, most: number) {
  const range = `must be a whole number from ${least} to ${most}`;
  return z
    .string({ error: range })
    .regex(/^\d{1,9}$/, range)
    .transform(Number)
    .pipe(z.number().min(least, range).max(most, range));
}

export interface Config {
  readonly environment: 'development' | 'production' | 'test';
  readonly databaseUrl: string;
  readonly databaseConnections: number;
  readonly host: string;
  readonly port: number;
  readonly sessionSecret: string;
  readonly sessionHours: number;
  readonly trustProxy: boolean | number | string;
  readonly logLevel: string;
  readonly appFolder: string;
}

export type ConfigRead =
  | { readonly ok: true; readonly config: Config }
  | { readonly ok: false; readonly sentence: string };

/** The configuration in an environment, or the sentence that says which variable must be what. */
export function readConfig(environment: Readonly<Record<string, string | undefined>>): ConfigRead {
  const read = environmentSchema.safeParse(environment);
  if (!read.success) {
    const [issue] = read.error.issues;
    return { ok: false, sentence: `${String(issue?.path[0])} ${issue?.message}.` };
  }
  const values = read.data;
  return {
    ok: true,
    config: {
      environment: values.NODE_ENV,
      databaseUrl: values.DATABASE_URL,
      databaseConnections: values.DATABASE_CONNECTIONS,
      host: values.HOST,
      port: values.PORT,
      sessionSecret: values.SESSION_SECRET,
      sessionHours: values.SESSION_HOURS,
      trustProxy: trustedProxies(values.TRUST_PROXY),
      logLevel: values.LOG_LEVEL,
      appFolder: values.APP_FOLDER,
    },
  };
}

/** What Express takes: it would end the start with a stack trace at anything else. */
function isProxyList(text: string): boolean {
  return text === 'false' || /^\d{1,2}$/.test(text) || text.split(/ *, */).every(isProxyAddress);
}

function isProxyAddress(text: string): boolean {
  if (['loopback', 'linklocal', 'uniquelocal'].includes(text)) return true;
  const [address = '', bits, ...rest] = text.split('/');
  const longest = { 0: 0, 4: 32, 6: 128 }[isIP(address)] ?? 0;
  if (longest === 0 || rest.length > 0) return false;
  return bits === undefined || (/^[1-9]\d{0,2}$/.test(bits) && Number(bits) <= longest);
}

function trustedProxies(text: string): boolean | number | string {
  if (text === 'false') return false;
  return /^\d+$/.test(text) ? Number(text) : text;
}
