/** Shops, the people who sign in, and who is a member of which shop. Times are ISO 8601 in UTC, by the server's clock. */
import type { Role } from '@chargewright/contract/sign-in';
import { sql } from 'drizzle-orm';
import { index, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';

const now = sql`(strftime('%Y-%m-%dT%H:%M:%fZ', 'now'))`;

export const shops = sqliteTable('shops', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
  createdAt: text('created_at').notNull().default(now),
});

/** A person signs in once, whatever shops she works with. */
export const people = sqliteTable('people', {
  id: text('id').primaryKey(),
  /** Lower case, without spaces around. */
  email: text('email').notNull().unique(),
  name: text('name').notNull(),
  /** argon2id, with its parameters. */
  passwordHash: text('password_hash').notNull(),
  createdAt: text('created_at').notNull().default(now),
});

/** A membership that ended stays: what the person did keeps its name. */
export const memberships = sqliteTable(
  'memberships',
  {
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    personId: text('person_id')
      .notNull()
      .references(() => people.id),
    roles: text('roles', { mode: 'json' }).$type<readonly Role[]>().notNull(),
    createdAt: text('created_at').notNull().default(now),
    endedAt: text('ended_at'),
  },
  (table) => [
    primaryKey({ columns: [table.shopId, table.personId] }),
    index('memberships_by_person').on(table.personId, table.shopId),
  ],
);
