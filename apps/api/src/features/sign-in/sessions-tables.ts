import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { people } from '../people/people-tables';

/** Column names and the unit of `expires_at` (seconds since 1970) are those of lucia's adapter. */
export const sessions = sqliteTable(
  'sessions',
  {
    /** SHA-256 of the cookie's token, in hexadecimal: a stolen copy of the file signs nobody in. */
    id: text('id').primaryKey(),
    userId: text('user_id')
      .notNull()
      .references(() => people.id),
    expiresAt: integer('expires_at').notNull(),
    startedAt: text('started_at').notNull(),
    /** What the browser calls itself, cut to a line: how a person tells her phone from her laptop in the list. */
    device: text('device').notNull(),
  },
  (table) => [index('sessions_by_person').on(table.userId), index('sessions_by_expiry').on(table.expiresAt)],
);
