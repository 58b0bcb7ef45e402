import { doublePrecision, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, lengthMm, version } from './columns';
import { patterns } from './patterns';

/** One draft of a pattern. A journal keeps the version it was cut from, whatever is drafted later. */
export const patternVersions = pgTable(
  'pattern_versions',
  {
    id: id(),
    patternId: uuid()
      .notNull()
      .references(() => patterns.id, { onDelete: 'cascade' }),
    ordinal: integer().notNull(),
    label: text().notNull().default(''),
    clothKind: text({ enum: ['woven', 'stretch-woven', 'knit'] })
      .notNull()
      .default('woven'),
    /** Gauge stretch that the draft needs, per cent across. */
    stretchPercent: doublePrecision().notNull().default(0),
    allowanceMm: lengthMm(),
    allowanceTyped: text(),
    notes: text().notNull().default(''),
    createdAt: createdAt(),
    version: version(),
  },
  (table) => [unique('pattern_versions_ordinal').on(table.patternId, table.ordinal)],
);
