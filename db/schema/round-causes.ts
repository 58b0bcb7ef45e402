import { boolean, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { moment, version } from './columns';
import { rounds } from './rounds';
import { users } from './users';

/** A cause that is not a length (grain, trimming, stance …), found present or ruled out. */
export const roundCauses = pgTable(
  'round_causes',
  {
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    cause: text().notNull(),
    isPresent: boolean().notNull(),
    updatedAt: moment().notNull().defaultNow(),
    version: version(),
  },
  (table) => [primaryKey({ columns: [table.roundId, table.authorId, table.cause] })],
);
