import { pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { lengthMm } from './columns';
import { journals } from './journals';

/** A finished measure of a garment that fitted, between seamlines: what a habit is made of. Never a difference, never a body. */
export const fittedMeasures = pgTable(
  'fitted_measures',
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: 'cascade' }),
    measure: text().notNull(),
    valueMm: lengthMm().notNull(),
    typed: text().notNull(),
  },
  (table) => [primaryKey({ columns: [table.journalId, table.measure] })],
);
