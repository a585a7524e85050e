import { pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';

/** Everybody who can sign in; what they may do is said by their membership. */
export const people = pgTable('people', {
  id: uuid('id').primaryKey().defaultRandom(),
  name: text('name').notNull(),
  /** Always in small letters. */
  email: text('email').notNull().unique(),
  /** argon2id, in the encoded form that carries its own parameters. */
  passwordHash: text('password_hash').notNull(),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
});
