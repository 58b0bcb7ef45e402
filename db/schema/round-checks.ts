import { integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { lengthMm, moment, version } from './columns';
import { rounds } from './rounds';
import { users } from './users';

/** What a finger, pin or release test said. An amount says its basis; a pinch of depth d at n places is 2·d·n of cloth. */
export const roundChecks = pgTable(
  'round_checks',
  {
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    check: text().notNull(),
    side: text({ enum: ['left', 'right', 'both'] }).notNull(),
    outcome: text().notNull(),
    amountMm: lengthMm(),
    amountTyped: text(),
    basis: text({ enum: ['round', 'piece', 'edge', 'pinch'] }),
    places: integer(),
    updatedAt: moment().notNull().defaultNow(),
    version: version(),
  },
  (table) => [primaryKey({ columns: [table.roundId, table.authorId, table.check, table.side] })],
);
