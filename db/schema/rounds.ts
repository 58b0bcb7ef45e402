import { date, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, moment, version } from './columns';
import { journals } from './journals';
import { muslins } from './muslins';

/** One wearing of a muslin. Numbered over the journal: "round 3" is its address and its name, and no number is given twice. */
export const rounds = pgTable(
  'rounds',
  {
    id: id(),
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: 'cascade' }),
    muslinId: uuid()
      .notNull()
      .references(() => muslins.id, { onDelete: 'cascade' }),
    number: integer().notNull(),
    begun: text({ enum: ['new-cloth', 're-baste', 'patch'] })
      .notNull()
      .default('new-cloth'),
    wornOn: date(),
    note: text().notNull().default(''),
    hangsCleanAt: moment(),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [unique('rounds_number').on(table.journalId, table.number)],
);
