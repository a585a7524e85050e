import { STAGES } from '@shared/api/commission';
import { date, index, pgEnum, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { workshops } from './workshops';

export const stage = pgEnum('stage', STAGES);

/** The order. An archived commission and its layout can be read and exported, but not changed. */
export const commissions = pgTable(
  'commissions',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    workshopId: uuid('workshop_id')
      .notNull()
      .references(() => workshops.id),
    title: text('title').notNull(),
    client: text('client'),
    due: date('due', { mode: 'string' }),
    stage: stage('stage').notNull().default('design'),
    archivedAt: timestamp('archived_at', { withTimezone: true }),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [index('commissions_workshop').on(table.workshopId)],
);
