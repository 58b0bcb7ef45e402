import { index, pgTable, text } from 'drizzle-orm/pg-core';
import { moment } from './columns';

/** Files that nothing serves any more, to be erased from the store once `eraseAfter` has passed. */
export const doomedObjects = pgTable(
  'doomed_objects',
  { key: text().primaryKey(), eraseAfter: moment().notNull() },
  (table) => [index('doomed_objects_due').on(table.eraseAfter)],
);
