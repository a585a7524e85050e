/**
 * Layouts and the log of their edits.
 *
 * A document is kept whole, as the layout file, in one jsonb column with the cells as base64 inside it: the
 * same schema then reads files, request bodies and rows; nothing ever asks the database about one tile; and
 * the greatest pattern is 38 kB of text that PostgreSQL compresses out of line. What the table of
 * commissions shows of a layout is written beside it with every edit, so that the table does not read the
 * documents.
 *
 * The log keeps every edit: any base revision that a browser may still hold can be merged from it.
 */
import type { WirePatch } from '@shared/api/layout';
import type { LayoutSummary } from '@shared/api/layout-summary';
import type { LayoutFile } from '@shared/layout/schema';
import {
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { commissions } from './commissions';
import { people } from './people';

export const layouts = pgTable('layouts', {
  id: uuid('id').primaryKey().defaultRandom(),
  commissionId: uuid('commission_id')
    .notNull()
    .unique()
    .references(() => commissions.id),
  document: jsonb('document').$type<LayoutFile>().notNull(),
  /** Counts the edits: the draft is the starting document with edits 1 to `revision` applied. */
  revision: integer('revision').notNull().default(0),
  summary: jsonb('summary').$type<LayoutSummary>().notNull(),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
});

export const layoutEdits = pgTable(
  'layout_edits',
  {
    layoutId: uuid('layout_id')
      .notNull()
      .references(() => layouts.id),
    /** The revision this edit made. */
    revision: integer('revision').notNull(),
    /** The revision it was made on. With the log it gives the answer again when the request is repeated. */
    baseRevision: integer('base_revision').notNull(),
    patch: jsonb('patch').$type<WirePatch>().notNull(),
    authorId: uuid('author_id')
      .notNull()
      .references(() => people.id),
    idempotencyKey: uuid('idempotency_key').notNull(),
    /** SHA-256 of the request, to tell a repeated request from a key used twice. */
    requestDigest: text('request_digest').notNull(),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.layoutId, table.revision] }),
    unique('layout_edits_idempotency_key').on(table.layoutId, table.idempotencyKey),
  ],
);
