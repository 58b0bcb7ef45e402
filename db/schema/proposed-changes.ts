import { pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { id, lengthMm, moment } from './columns';
import { proposals } from './proposals';

/** One change of a proposed plan. `answer` is the owner's, given once: taken into the plan, or left. */
export const proposedChanges = pgTable(
  'proposed_changes',
  {
    id: id(),
    proposalId: uuid()
      .notNull()
      .references(() => proposals.id, { onDelete: 'cascade' }),
    correction: text().notNull(),
    side: text({ enum: ['left', 'right', 'both'] }).notNull(),
    basis: text({ enum: ['round', 'piece', 'edge', 'pinch'] }),
    plannedMm: lengthMm(),
    plannedTyped: text(),
    reason: text().notNull().default(''),
    answer: text({ enum: ['taken', 'left'] }),
    answeredAt: moment(),
  },
  (table) => [unique('proposed_changes_once').on(table.proposalId, table.correction, table.side)],
);
