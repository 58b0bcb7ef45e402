import { boolean, date, doublePrecision, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, version } from './columns';
import { journals } from './journals';

/** One cutting: the cloth, its stretch and grain, and what was cut. It may be worn, re-basted and patched in several rounds. */
export const muslins = pgTable(
  'muslins',
  {
    id: id(),
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: 'cascade' }),
    ordinal: integer().notNull(),
    cut: text({ enum: ['full', 'shorts'] })
      .notNull()
      .default('full'),
    cloth: text().notNull().default(''),
    clothKind: text({ enum: ['woven', 'stretch-woven', 'knit'] })
      .notNull()
      .default('woven'),
    stretchPercent: doublePrecision().notNull().default(0),
    isOnGrain: boolean().notNull().default(true),
    size: text().notNull().default(''),
    /** Cut straight from the draft, or altered on paper first. */
    isStraightFromDraft: boolean().notNull().default(true),
    sewnOn: date(),
    createdAt: createdAt(),
    version: version(),
  },
  (table) => [unique('muslins_ordinal').on(table.journalId, table.ordinal)],
);
