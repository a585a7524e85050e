/** Every route of the API, against everybody who may and may not call it. */
import { randomUUID } from 'node:crypto';
import type { Role } from '@shared/api/session';
import { API_ROUTES } from '@server/api-routes';
import type { RouteDeclaration } from '@server/http/route';
import type { Router } from 'express';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Browser, EMAILS, signedIn, type Somebody } from './browser';
import { commissionTitled, editOf, laid, problem } from './demonstration';
import { runningApp, type RunningApp } from './running-app';

type RouteName = keyof typeof API_ROUTES;

/** Open to anyone; and the stream, which answers without end: events.spec.ts tries its doors. */
type Elsewhere = 'whoIsSignedIn' | 'signIn' | 'signOut' | 'watchLayout';

/** Who may call what, written out once more: the table of the README, not the one the server reads. */
const MAY: Record<Exclude<RouteName, Elsewhere>, Role[]> = {
  listCommissions: ['owner', 'designer', 'maker'],
  createCommission: ['owner', 'designer'],
  readCommission: ['owner', 'designer', 'maker'],
  changeCommission: ['owner', 'designer'],
  openLayout: ['owner', 'designer', 'maker'],
  editLayout: ['owner', 'designer', 'maker'],
  downloadLayout: ['owner', 'designer', 'maker'],
  tellWhereabouts: ['owner', 'designer', 'maker'],
  preparePicture: ['owner', 'designer'],
  listVersions: ['owner', 'designer', 'maker'],
  keepVersion: ['owner', 'designer', 'maker'],
  readVersion: ['owner', 'designer', 'maker'],
  downloadVersion: ['owner', 'designer', 'maker'],
  restoreVersion: ['owner', 'designer', 'maker'],
  exportBundle: ['owner', 'maker'],
};
const PROTECTED = Object.keys(MAY) as (keyof typeof MAY)[];

const ROLES_OF: Partial<Record<Somebody, Role[]>> = {
  owner: ['owner'],
  designer: ['designer'],
  maker: ['maker'],
  designerAndMaker: ['designer', 'maker'],
  client: ['client'],
};

let running: RunningApp;
const browsers = new Map<Somebody, Browser>();
let ids: { commission: string; layout: string };
beforeAll(async () => {
  running = await runningApp();
  for (const somebody of Object.keys(EMAILS) as Somebody[]) {
    browsers.set(somebody, await signedIn(running.app, somebody));
  }
  const lantern = await commissionTitled(browserOf('owner'), 'Ferry-hall lantern');
  ids = { commission: lantern.id, layout: lantern.layoutId };
});
afterAll(() => running.close());

function browserOf(somebody: Somebody): Browser {
  const browser = browsers.get(somebody);
  if (!browser) throw new Error(`${somebody} is not signed in`);
  return browser;
}

function pathOf(route: RouteDeclaration): string {
  const id = route.path.startsWith('/layouts') ? ids.layout : ids.commission;
  return route.path.replace(':id', id).replace(':number', '3');
}

/** A body that passes the schema and changes nothing that other cases need. */
function bodyFor(name: RouteName): object | undefined {
  if (API_ROUTES[name].method === 'get') return undefined;
  const bodies: Partial<Record<RouteName, object>> = {
    createCommission: { title: 'Matrix' },
    changeCommission: { client: 'Harbour Trust' },
    editLayout: { ...editOf(0, laid(0)), baseRevision: 1_000_000 },
    tellWhereabouts: { connection: randomUUID(), station: 'shell', tile: null },
    keepVersion: { revision: 1_000_000 },
  };
  return bodies[name] ?? {};
}

/** Past the door: the request was judged by the handler, whatever it said. */
const ADMITTED = [200, 201, 204, 400, 409];

describe.each(PROTECTED)('%s', (name) => {
  const route: RouteDeclaration = API_ROUTES[name];

  it.each(Object.entries(ROLES_OF) as [Somebody, Role[]][])(
    'admits or refuses the %s as the table says',
    async (somebody, roles) => {
      const answer = await browserOf(somebody).send(route.method, pathOf(route), bodyFor(name));
      if (roles.some((role) => MAY[name].includes(role))) {
        expect(ADMITTED).toContain(answer.status);
      } else {
        expect(problem(answer, 403).code).toBe('not-allowed');
      }
    },
  );

  it('is closed without a session', async () => {
    const stranger = new Browser(running.app);
    await stranger.get('/session');
    const answer = await stranger.send(route.method, pathOf(route), bodyFor(name));
    expect(problem(answer, 401).code).toBe('not-signed-in');
  });

  it('answers another workshop that there is no such thing', async () => {
    if (!route.path.includes(':id')) return;
    const answer = await browserOf('elsewhere').send(route.method, pathOf(route), bodyFor(name));
    expect(problem(answer, 404).code).toBe('not-found');
  });

  it('answers an id that is none the same way', async () => {
    if (!route.path.includes(':id')) return;
    for (const id of ['none', randomUUID()]) {
      const path = pathOf(route).replace(ids.layout, id).replace(ids.commission, id);
      const answer = await browserOf('owner').send(route.method, path, bodyFor(name));
      expect(problem(answer, 404).code).toBe('not-found');
    }
  });

  it('demands the token when it changes something', async () => {
    if (route.method === 'get') return;
    const headers = { 'X-XSRF-TOKEN': '' };
    const sent = browserOf('owner').send(route.method, pathOf(route), bodyFor(name), headers);
    expect(problem(await sent, 403).code).toBe('forged-request');
  });

  it('refuses a body that is missing or broken', async () => {
    if (!route.body && !route.upload) return;
    for (const body of [undefined, '{"broken":', '[]']) {
      const answer = await browserOf('owner').send(route.method, pathOf(route), body);
      expect(problem(answer, 400).code).toBe('bad-input');
    }
  });

  it('refuses a body over its limit', async () => {
    if (!route.body) return;
    const kilobytes = route.bodyLimit === 'layout' ? 2049 : 257;
    const body = JSON.stringify({ filler: 'x'.repeat(kilobytes * 1024) });
    const answer = await browserOf('owner').send(route.method, pathOf(route), body);
    expect(problem(answer, 413).code).toBe('too-large');
  });
});

describe('the OpenAPI document', () => {
  interface Operation {
    parameters?: { name: string; in: string; required: boolean; schema: object }[];
    requestBody?: { content: Record<string, { schema: object }> };
    responses: Record<string, unknown>;
    security: object[];
  }

  async function operations(): Promise<Map<string, Operation>> {
    const answer = await new Browser(running.app).get('/openapi.json');
    expect(answer.body).toMatchObject({ openapi: '3.1.0', servers: [{ url: '/api' }] });
    const { paths } = answer.body as { paths: Record<string, Record<string, Operation>> };
    return new Map(
      Object.entries(paths).flatMap(([path, methods]) =>
        Object.entries(methods).map(([method, operation]) => [`${method} ${path}`, operation]),
      ),
    );
  }

  it('holds every route the server answers, and no other', async () => {
    const served = routesUnder(running.app.router)
      .map((route) => route.replace(/:(\w+)/g, '{$1}'))
      .filter((route) => route !== 'get /openapi.json' && !route.includes('*'));
    expect([...(await operations()).keys()].sort()).toEqual(served.sort());
  });

  it('says of every route its parameters, body, refusals and session', async () => {
    const all = await operations();
    for (const [name, route] of Object.entries<RouteDeclaration>(API_ROUTES)) {
      const path = route.path.replace(/:(\w+)/g, '{$1}');
      const operation = all.get(`${route.method} ${path}`);
      if (!operation) throw new Error(`${name} is not in the document`);
      const inPath = operation.parameters?.filter((each) => each.in === 'path') ?? [];
      expect(inPath.map((each) => each.name)).toEqual(
        [...route.path.matchAll(/:(\w+)/g)].map(([, parameter]) => parameter),
      );
      expect(operation.requestBody !== undefined).toBe(
        route.body !== undefined || route.upload !== undefined,
      );
      expect(operation.responses).toHaveProperty(String(route.answer.status));
      expect(operation.responses).toHaveProperty('503');
      if (route.access !== 'anyone') {
        expect(operation.security).toEqual([{ session: [] }]);
        expect(operation.responses).toHaveProperty('401');
        expect(operation.responses).toHaveProperty('403');
      }
    }
  });
});

interface Layer {
  readonly route?: { path: string; stack: readonly { method: string }[] };
  readonly handle: Partial<Router>;
}

/** Every "method path" a router answers, those of routers in it included. */
function routesUnder(router: Partial<Router>): string[] {
  return ((router.stack ?? []) as unknown as Layer[]).flatMap(({ route, handle }) => {
    if (!route) return routesUnder(handle);
    return [...new Set(route.stack.map(({ method }) => `${method} ${route.path}`))];
  });
}
