import type { Database } from '@drizzle/database';
import { layoutFileOf, printLayout } from '@shared/layout/read-layout';
import { layoutFileName } from '@shared/layout/file-name';
import { API_ROUTES } from '../api-routes';
import { notFound } from '../http/errors';
import type { RouteMount } from '../http/route';
import { findDraft, findLastVersion } from './layouts-store';
import { saveEdit } from './save-edit';

/** Opening, editing and downloading the draft of a layout. */
export function mountLayouts(mount: RouteMount, database: Database): void {
  mount(API_ROUTES.openLayout, async ({ person, params }) => {
    const draft = await findDraft(database, person.workshop.id, params.id);
    if (!draft) throw notFound('layout');
    return {
      id: draft.id,
      commission: draft.commission,
      revision: draft.revision,
      layout: layoutFileOf(draft.layout),
      lastVersion: await findLastVersion(database, draft.id),
    };
  });

  mount(API_ROUTES.editLayout, ({ person, params, body }) =>
    saveEdit(database, person, params.id, body),
  );

  mount(API_ROUTES.downloadLayout, async ({ person, params }) => {
    const draft = await findDraft(database, person.workshop.id, params.id);
    if (!draft) throw notFound('layout');
    return {
      fileName: layoutFileName(draft.layout.name, '.json'),
      content: printLayout(draft.layout),
    };
  });
}
