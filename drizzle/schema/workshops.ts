import type { Role } from '@shared/api/session';
import { sql } from 'drizzle-orm';
import { check, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { people } from './people';

export const workshops = pgTable('workshops', {
  id: uuid('id').primaryKey().defaultRandom(),
  name: text('name').notNull(),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
});

/** Who belongs to which workshop, and the hats they wear there: rights are those of all roles together. */
export const memberships = pgTable(
  'memberships',
  {
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id),
    workshopId: uuid('workshop_id')
      .notNull()
      .references(() => workshops.id),
    roles: text('roles').array().$type<Role[]>().notNull(),
    since: timestamp('since', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.workshopId] }),
    check(
      'memberships_roles_known',
      sql`${table.roles} <@ ARRAY['owner', 'designer', 'maker', 'client'] AND cardinality(${table.roles}) > 0`,
    ),
  ],
);
