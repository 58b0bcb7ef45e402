import { pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt } from './columns';

/** What is left of something erased: its id and a hash, kept 90 days so that a restore does not bring it back. */
export const tombstones = pgTable('tombstones', {
  id: uuid().primaryKey(),
  objectKind: text().notNull(),
  hash: text().notNull(),
  erasedAt: createdAt(),
});
