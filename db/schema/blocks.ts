import { pgTable, primaryKey, uuid } from 'drizzle-orm/pg-core';
import { createdAt } from './columns';
import { users } from './users';

/** Whose invitations someone does not want. The other one is not told: an invitation can be written, and goes nowhere. */
export const blocks = pgTable(
  'blocks',
  {
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    blockedUserId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.blockedUserId] })],
);
