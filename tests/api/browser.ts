import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { DEMONSTRATION_PASSWORD } from '@seeds/demonstration';

export const EMAILS = {
  owner: 'runa@quarrylane.example',
  designerAndMaker: 'ines@quarrylane.example',
  designer: 'bela@quarrylane.example',
  maker: 'tomas@quarrylane.example',
  client: 'harriet@harbourtrust.example',
  elsewhere: 'jonah@saltmarsh.example',
} as const;
export type Somebody = keyof typeof EMAILS;

export type Method = 'get' | 'post' | 'patch' | 'delete';

export interface Answer {
  readonly status: number;
  readonly headers: Readonly<Record<string, string | undefined>>;
  readonly body: unknown;
  readonly bytes: Uint8Array;
}

export interface UploadedFile {
  readonly field: string;
  readonly bytes: Buffer;
  readonly fileName: string;
}

/** A browser: keeps cookies, and sends the token back in a header as Angular's HttpClient does. */
export class Browser {
  readonly cookies = new Map<string, string>();

  constructor(
    private readonly app: Express,
    private readonly headers: Readonly<Record<string, string>> = {},
  ) {}

  /** The same browser before another server process. */
  before(app: Express): Browser {
    const twin = new Browser(app, this.headers);
    for (const [name, value] of this.cookies) twin.cookies.set(name, value);
    return twin;
  }

  get(path: string): Promise<Answer> {
    return this.send('get', path);
  }

  post(path: string, body?: object): Promise<Answer> {
    return this.send('post', path, body);
  }

  patch(path: string, body?: object): Promise<Answer> {
    return this.send('patch', path, body);
  }

  delete(path: string): Promise<Answer> {
    return this.send('delete', path);
  }

  /** Sends a request to a path below /api; text is sent as it is, under the name of JSON. */
  async send(
    method: Method,
    path: string,
    body?: object | string,
    headers: Readonly<Record<string, string>> = {},
  ): Promise<Answer> {
    const sending = this.sending(method, path).set(headers);
    return this.answerTo(
      body === undefined ? sending : sending.type('application/json').send(body),
    );
  }

  /** Sends files to a path below /api, as a form does. */
  upload(path: string, ...files: readonly UploadedFile[]): Promise<Answer> {
    const sending = this.sending('post', path);
    for (const { field, bytes, fileName } of files) sending.attach(field, bytes, fileName);
    return this.answerTo(sending);
  }

  private sending(method: Method, path: string): Test {
    return request(this.app)
      [method](`/api${path}`)
      .set('Cookie', [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; '))
      .set('X-XSRF-TOKEN', this.cookies.get('XSRF-TOKEN') ?? '')
      .set(this.headers)
      .responseType('blob');
  }

  private async answerTo(sending: Test): Promise<Answer> {
    const response = await sending;
    this.keepCookies(response.get('Set-Cookie') ?? []);
    const bytes = response.body as Buffer;
    return {
      status: response.status,
      headers: response.headers,
      body: parsedBody(response.type, bytes),
      bytes,
    };
  }

  private keepCookies(lines: readonly string[]): void {
    for (const line of lines) {
      const [, name, value] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
      if (name === undefined) continue;
      if (value === undefined || value === '') this.cookies.delete(name);
      else this.cookies.set(name, value);
    }
  }
}

function parsedBody(type: string, bytes: Buffer): unknown {
  if (bytes.length === 0) return undefined;
  return type === 'application/json' ? JSON.parse(bytes.toString()) : bytes.toString();
}

/** Somebody's browser after signing in. */
export async function signedIn(app: Express, somebody: Somebody): Promise<Browser> {
  const browser = new Browser(app);
  await browser.get('/session');
  const email = EMAILS[somebody];
  const answer = await browser.post('/session', { email, password: DEMONSTRATION_PASSWORD });
  if (answer.status !== 200) throw new Error(`${email} could not sign in`);
  return browser;
}
