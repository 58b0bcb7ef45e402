import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, moment } from './columns';
import { users } from './users';

/** A link sent by mail: single use, hash only. Asking again ends the one before of the same kind. */
export const tokens = pgTable(
  'tokens',
  {
    id: id(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    kind: text({ enum: ['verify-email', 'reset-password', 'change-email'] }).notNull(),
    tokenHash: text().notNull().unique(),
    /** The address it was sent to; a token for an address that has changed since is void. */
    email: text().notNull(),
    expiresAt: moment().notNull(),
    usedAt: moment(),
    createdAt: createdAt(),
  },
  (table) => [index('tokens_user').on(table.userId)],
);
