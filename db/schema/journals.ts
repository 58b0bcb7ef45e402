import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, moment, version } from './columns';
import { patternVersions } from './pattern-versions';
import { users } from './users';
import { wearers } from './wearers';

/** One garment for one person: a wearer and a pattern version. It hides while its wearer or its pattern is in the bin. */
export const journals = pgTable(
  'journals',
  {
    id: id(),
    ownerId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    wearerId: uuid()
      .notNull()
      .references(() => wearers.id, { onDelete: 'cascade' }),
    patternVersionId: uuid()
      .notNull()
      .references(() => patternVersions.id, { onDelete: 'cascade' }),
    name: text().notNull(),
    settledAt: moment(),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [
    index('journals_owner').on(table.ownerId, table.id),
    index('journals_wearer').on(table.wearerId),
  ],
);
