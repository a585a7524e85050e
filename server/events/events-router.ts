import type { Database } from '@drizzle/database';
import type { Logger } from 'pino';
import { API_ROUTES } from '../api-routes';
import { notFound } from '../http/errors';
import type { RouteMount } from '../http/route';
import { isLayoutOf } from '../layouts/layouts-store';
import { LayoutStream, type Watcher } from './layout-stream';
import type { LiveLayouts } from './live-layouts';
import { putPresence } from './presence-store';

interface EventsDependencies {
  readonly database: Database;
  readonly live: LiveLayouts;
  readonly logger: Logger;
}

/** Watching a layout, and saying where one is in it. */
export function mountEvents(mount: RouteMount, { database, live, logger }: EventsDependencies) {
  mount(API_ROUTES.watchLayout, async ({ person, params, query, request }) => {
    if (!(await isLayoutOf(database, person.workshop.id, params.id))) throw notFound('layout');
    const since = resumedFrom(request.get('Last-Event-ID')) ?? query.since;
    return {
      open: (response) => {
        const watcher: Watcher = {
          layoutId: params.id,
          personId: person.id,
          sessionId: request.sessionID,
          connection: query.connection,
          since,
        };
        live.add(new LayoutStream(database, response, logger, watcher));
      },
    };
  });

  mount(API_ROUTES.tellWhereabouts, async ({ person, params, body }) => {
    if (!(await isLayoutOf(database, person.workshop.id, params.id))) throw notFound('layout');
    await putPresence(database, params.id, person.id, body);
    return undefined;
  });
}

/** The revision a browser that connects again has already seen, or null. */
function resumedFrom(lastEventId: string | undefined): number | null {
  return lastEventId !== undefined && /^\d{1,9}$/.test(lastEventId) ? Number(lastEventId) : null;
}
