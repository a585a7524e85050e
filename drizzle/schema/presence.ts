import type { Whereabouts } from '@shared/api/live';
import { index, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { layouts } from './layouts';
import { people } from './people';

/**
 * Who has which layout open, one row a browser tab. In the database so that several server processes see the
 * same people; rows not renewed are of tabs that went without a word. The table is unlogged: after a crash
 * nobody is here any more.
 */
export const presence = pgTable(
  'presence',
  {
    connection: uuid('connection').primaryKey(),
    layoutId: uuid('layout_id')
      .notNull()
      .references(() => layouts.id),
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id),
    station: text('station').$type<Whereabouts['station']>().notNull(),
    tile: jsonb('tile').$type<Whereabouts['tile']>(),
    seenAt: timestamp('seen_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [index('presence_layout').on(table.layoutId)],
);
