import type { Database } from '@drizzle/database';
import { layoutFileOf, printLayout } from '@shared/layout/read-layout';
import { layoutFileName } from '@shared/layout/file-name';
import { API_ROUTES } from '../api-routes';
import { notFound } from '../http/errors';
import type { RouteMount } from '../http/route';
import { isLayoutOf } from '../layouts/layouts-store';
import { keepVersion, restoreVersion } from './keep-version';
import { versionNumbered } from './version-numbered';
import { listVersions } from './versions-store';

/** Keeping, listing, reading and restoring versions. */
export function mountVersions(mount: RouteMount, database: Database): void {
  mount(API_ROUTES.listVersions, async ({ person, params }) => {
    if (!(await isLayoutOf(database, person.workshop.id, params.id))) throw notFound('layout');
    return { versions: await listVersions(database, params.id) };
  });

  mount(API_ROUTES.keepVersion, ({ person, params, body }) =>
    keepVersion(database, person, params.id, body),
  );

  mount(API_ROUTES.readVersion, async ({ person, params }) => {
    const { version, layout } = await versionNumbered(database, person, params);
    return { ...version, layout: layoutFileOf(layout) };
  });

  mount(API_ROUTES.downloadVersion, async ({ person, params }) => {
    const { layout } = await versionNumbered(database, person, params);
    return {
      fileName: layoutFileName(layout.name, `-v${params.number}.json`),
      content: printLayout(layout),
    };
  });

  mount(API_ROUTES.restoreVersion, ({ person, params, body }) =>
    restoreVersion(database, person, params.id, { number: params.number, note: body.note }),
  );
}
