import type { Database } from '@drizzle/database';
import { buildBundle, bundleZip } from '@exports/bundle';
import { layoutFileName } from '@shared/layout/file-name';
import { API_ROUTES } from '../api-routes';
import { refusalWith } from '../http/errors';
import type { RouteMount } from '../http/route';
import { versionNumbered } from '../versions/version-numbered';
import { recordExport } from './bundle-exports-store';

/** Exporting the bundle of a version. */
export function mountBundles(mount: RouteMount, database: Database): void {
  mount(API_ROUTES.exportBundle, async ({ person, params, body }) => {
    const { version, layout } = await versionNumbered(database, person, params);
    const { override, ...options } = body;
    const built = buildBundle(layout, {
      ...options,
      version: { number: version.number, note: version.note },
      ...(override && { override: { who: person.name, reason: override.reason } }),
    });
    if (!built.ok) {
      throw refusalWith(
        'stopped',
        'A check says stop, so this version is not exported. Mend it, or write down why you go on.',
        { checks: built.checks },
      );
    }
    const overridden = built.bundle.checks.some(({ result }) => result === 'stop');
    await recordExport(database, {
      layoutId: params.id,
      versionNumber: version.number,
      personId: person.id,
      options,
      overrideReason: overridden ? override?.reason : null,
    });
    return {
      fileName: layoutFileName(layout.name, `-v${version.number}.zip`),
      content: bundleZip(built.bundle),
    };
  });
}
