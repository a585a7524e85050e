/**
 * Older layout files are brought up to the present format one version at a time. A step takes the parsed
 * document of its version and returns that of the next; it never sees anything but plain JSON. There is no
 * older version yet, so the list is empty: the first change of format adds its step here.
 */
import { LAYOUT_FORMAT_VERSION } from './schema';

export type LayoutDocument = Readonly<Record<string, unknown>>;

/** Brings a document of version `from` to version `from + 1`. */
export interface Migration {
  readonly from: number;
  readonly migrate: (document: LayoutDocument) => LayoutDocument;
}

export const MIGRATIONS: readonly Migration[] = [];

/** The document brought to the present version, its `formatVersion` with it. */
export function migrateLayout(
  document: LayoutDocument,
  version: number,
  migrations: readonly Migration[] = MIGRATIONS,
  present: number = LAYOUT_FORMAT_VERSION,
): LayoutDocument {
  let migrated = document;
  for (let from = version; from < present; from++) {
    const step = migrations.find((migration) => migration.from === from);
    if (!step) break;
    migrated = { ...step.migrate(migrated), formatVersion: from + 1 };
  }
  return migrated;
}
