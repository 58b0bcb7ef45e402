import { boolean, date, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, version } from './columns';
import { users } from './users';

/**
 * A person sewn for. Initials or a made-up name will do. Someone who is not the owner has a consent line, kept apart for
 * measuring, photographing and sharing: without the last nothing of theirs can be shared.
 */
export const wearers = pgTable(
  'wearers',
  {
    id: id(),
    ownerId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    name: text().notNull(),
    isSelf: boolean().notNull().default(true),
    isUnder18: boolean().notNull().default(false),
    fittedFor: text({ enum: ['standing', 'both', 'seated'] })
      .notNull()
      .default('standing'),
    wornBeneath: text().notNull().default(''),
    shape: text().array().notNull().default([]),
    consentsMeasure: boolean().notNull().default(false),
    consentsPhotograph: boolean().notNull().default(false),
    consentsShare: boolean().notNull().default(false),
    consentOn: date(),
    consentUntil: date(),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [index('wearers_owner').on(table.ownerId, table.id)],
);
