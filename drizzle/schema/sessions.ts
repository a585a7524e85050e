import { index, integer, json, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** Sessions of signed-in people. Names and types are those connect-pg-simple writes. */
export const sessions = pgTable(
  'sessions',
  {
    sid: text('sid').primaryKey(),
    sess: json('sess').notNull(),
    expire: timestamp('expire', { precision: 6, withTimezone: true }).notNull(),
  },
  (table) => [index('sessions_expire').on(table.expire)],
);

/** Counted attempts, e.g. at signing in; in the database so that several server processes count together. */
export const rateLimits = pgTable('rate_limits', {
  key: text('key').primaryKey(),
  hits: integer('hits').notNull(),
  resetsAt: timestamp('resets_at', { withTimezone: true }).notNull(),
});
