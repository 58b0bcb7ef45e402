import { index, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, lengthMm, moment, version } from './columns';
import { rounds } from './rounds';
import { users } from './users';

/**
 * One change decided on after a round: what was planned, and later what was really made of it. The ledger of a journal is
 * these rows in order; nothing is deleted from it once made. Past a stop mark it carries a reason.
 */
export const changes = pgTable(
  'changes',
  {
    id: id(),
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    /** Whose proposal it was taken from, where it was one. */
    proposedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
    correction: text().notNull(),
    side: text({ enum: ['left', 'right', 'both'] }).notNull(),
    basis: text({ enum: ['round', 'piece', 'edge', 'pinch'] }),
    plannedMm: lengthMm(),
    plannedTyped: text(),
    madeMm: lengthMm(),
    madeTyped: text(),
    madeAt: moment(),
    reason: text().notNull().default(''),
    createdAt: createdAt(),
    version: version(),
  },
  (table) => [
    unique('changes_once').on(table.roundId, table.correction, table.side),
    index('changes_round').on(table.roundId, table.id),
  ],
);
