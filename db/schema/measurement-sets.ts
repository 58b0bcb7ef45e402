import { boolean, date, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, version } from './columns';
import { wearers } from './wearers';

/** One sitting with the tape. Sets are never overwritten by a later one: bodies change, and the record stays. */
export const measurementSets = pgTable(
  'measurement_sets',
  {
    id: id(),
    wearerId: uuid()
      .notNull()
      .references(() => wearers.id, { onDelete: 'cascade' }),
    measuredOn: date().notNull(),
    takenAlone: boolean().notNull().default(false),
    /** Which waist is meant: navel and narrowest place lie far apart. */
    waistPlace: text({ enum: ['narrowest', 'navel', 'band'] })
      .notNull()
      .default('narrowest'),
    note: text().notNull().default(''),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [index('measurement_sets_wearer').on(table.wearerId, table.measuredOn)],
);
