import { integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { lengthMm } from './columns';
import { measurementSets } from './measurement-sets';

/** One reading of the tape; the same measure may be taken several times in a set (`take` 1, 2, 3 …). */
export const measurements = pgTable(
  'measurements',
  {
    setId: uuid()
      .notNull()
      .references(() => measurementSets.id, { onDelete: 'cascade' }),
    measure: text().notNull(),
    take: integer().notNull().default(1),
    valueMm: lengthMm().notNull(),
    /** What was typed, at most 24 characters, so that an inch stays the inch it was. */
    typed: text().notNull(),
  },
  (table) => [primaryKey({ columns: [table.setId, table.measure, table.take] })],
);
