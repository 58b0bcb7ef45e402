import { index, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id } from './columns';
import { rounds } from './rounds';

/** What the engine answered, with what it was asked and which engine it was. Insert only: the record of what the person saw. */
export const readings = pgTable(
  'readings',
  {
    id: id(),
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    case: jsonb().$type<unknown>().notNull(),
    output: jsonb().$type<unknown>().notNull(),
    engine: text().notNull(),
    createdAt: createdAt(),
  },
  (table) => [index('readings_round').on(table.roundId, table.id)],
);
