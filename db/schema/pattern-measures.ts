import { integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { lengthMm } from './columns';
import { patternVersions } from './pattern-versions';

/** A cell of the size chart: the body it is for, the finished measure, or the paper between seamlines. A range has its upper end in `untilMm`. */
export const patternMeasures = pgTable(
  'pattern_measures',
  {
    patternVersionId: uuid()
      .notNull()
      .references(() => patternVersions.id, { onDelete: 'cascade' }),
    sizeName: text().notNull(),
    sizeOrdinal: integer().notNull(),
    measure: text().notNull(),
    kind: text({ enum: ['body', 'finished', 'paper'] }).notNull(),
    valueMm: lengthMm().notNull(),
    untilMm: lengthMm(),
    typed: text().notNull(),
  },
  (table) => [primaryKey({ columns: [table.patternVersionId, table.sizeName, table.measure, table.kind] })],
);
