import { boolean, pgTable, text } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, moment, version } from './columns';

/**
 * Everyone who signed up. An address is stored in lower case and belongs to one account at the most. A flag shows pages;
 * it never lets anyone see another person's things: only ownership and grants do.
 */
export const users = pgTable('users', {
  id: id(),
  email: text().notNull().unique(),
  emailVerifiedAt: moment(),
  displayName: text().notNull(),
  passwordHash: text().notNull(),
  isAdmin: boolean().notNull().default(false),
  isPatternMaker: boolean().notNull().default(false),
  isFitter: boolean().notNull().default(false),
  unit: text({ enum: ['cm', 'in'] })
    .notNull()
    .default('cm'),
  words: text({ enum: ['uk', 'us', 'tailor'] })
    .notNull()
    .default('uk'),
  hidesMeasurements: boolean().notNull().default(false),
  suspendedAt: moment(),
  createdAt: createdAt(),
  deletedAt: deletedAt(),
  version: version(),
});
