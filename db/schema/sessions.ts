import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, moment } from './columns';
import { users } from './users';

/** `id` is the SHA-256 of the secret in the cookie: a dump of this table signs nobody in. Idle end in `expiresAt`, absolute in `endsAt`. */
export const sessions = pgTable(
  'sessions',
  {
    id: text().primaryKey(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    expiresAt: moment().notNull(),
    endsAt: moment().notNull(),
    createdAt: createdAt(),
    userAgent: text().notNull().default(''),
  },
  (table) => [index('sessions_user').on(table.userId)],
);
