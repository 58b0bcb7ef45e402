import { jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, lengthMm, version } from './columns';
import { rounds } from './rounds';

export interface MeasuredTerm {
  dimension: string;
  weight: number;
  side: 'left' | 'right' | 'both';
}

/** A length that speaks about a weighted sum of needs, with its error. Applied once, in its round; removable. */
export const roundMeasured = pgTable('round_measured', {
  id: id(),
  roundId: uuid()
    .notNull()
    .references(() => rounds.id, { onDelete: 'cascade' }),
  label: text().notNull(),
  terms: jsonb().$type<MeasuredTerm[]>().notNull(),
  needMm: lengthMm().notNull(),
  sdMm: lengthMm().notNull(),
  createdAt: createdAt(),
  version: version(),
});
