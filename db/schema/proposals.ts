import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id } from './columns';
import { rounds } from './rounds';
import { users } from './users';

/** A plan that someone else proposes for one round of one wearer, with its reason. What becomes of it stands at each of its changes. */
export const proposals = pgTable(
  'proposals',
  {
    id: id(),
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    reason: text().notNull(),
    createdAt: createdAt(),
  },
  (table) => [index('proposals_round').on(table.roundId, table.id)],
);
