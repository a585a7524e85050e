import type { Thumbnail } from '@shared/api/commission';
import type { BundleRequest } from '@shared/api/bundle';
import type { LayoutFile } from '@shared/layout/schema';
import {
  foreignKey,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uuid,
} from 'drizzle-orm/pg-core';
import { layouts } from './layouts';
import { people } from './people';

/** Numbered copies of layouts. A trigger refuses to change or delete a row. */
export const versions = pgTable(
  'versions',
  {
    layoutId: uuid('layout_id')
      .notNull()
      .references(() => layouts.id),
    number: integer('number').notNull(),
    document: jsonb('document').$type<LayoutFile>().notNull(),
    note: text('note').notNull(),
    keptBy: uuid('kept_by')
      .notNull()
      .references(() => people.id),
    keptAt: timestamp('kept_at', { withTimezone: true }).notNull().defaultNow(),
    /** The revision of the draft it was kept from. */
    revision: integer('revision').notNull(),
    restoredFrom: integer('restored_from'),
    thumbnail: jsonb('thumbnail').$type<Thumbnail>().notNull(),
  },
  (table) => [primaryKey({ columns: [table.layoutId, table.number] })],
);

/** Who took which bundle out, with what options, and why in spite of a stop. */
export const bundleExports = pgTable(
  'bundle_exports',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    layoutId: uuid('layout_id').notNull(),
    versionNumber: integer('version_number').notNull(),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id),
    exportedAt: timestamp('exported_at', { withTimezone: true }).notNull().defaultNow(),
    options: jsonb('options').$type<Omit<BundleRequest, 'override'>>().notNull(),
    overrideReason: text('override_reason'),
  },
  (table) => [
    foreignKey({
      columns: [table.layoutId, table.versionNumber],
      foreignColumns: [versions.layoutId, versions.number],
    }),
  ],
);
