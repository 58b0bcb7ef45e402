import { integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { moment, version } from './columns';
import { rounds } from './rounds';
import { users } from './users';

/** Looked for and there (1–3) or looked, not there (0). No row: not looked at, which says nothing. */
export const roundSigns = pgTable(
  'round_signs',
  {
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    sign: text().notNull(),
    side: text({ enum: ['left', 'right', 'both'] }).notNull(),
    severity: integer().notNull(),
    updatedAt: moment().notNull().defaultNow(),
    version: version(),
  },
  (table) => [primaryKey({ columns: [table.roundId, table.authorId, table.sign, table.side] })],
);
