import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, version } from './columns';
import { users } from './users';

/** A pattern as its owner keeps it; what is drafted lives in its versions. */
export const patterns = pgTable(
  'patterns',
  {
    id: id(),
    ownerId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    name: text().notNull(),
    maker: text().notNull().default(''),
    garment: text({ enum: ['trousers'] })
      .notNull()
      .default('trousers'),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [index('patterns_owner').on(table.ownerId, table.id)],
);
