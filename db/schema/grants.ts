import { sql } from 'drizzle-orm';
import { check, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, moment } from './columns';
import { journals } from './journals';
import { rounds } from './rounds';
import { users } from './users';

/**
 * The only way, besides owning it, to see something: a named person, one journal or one round, a level, an end. An invitation
 * is a grant without a user and with a hashed token; it binds only to an account whose verified address is the invited one.
 */
export const grants = pgTable(
  'grants',
  {
    id: id(),
    subjectUserId: uuid().references(() => users.id, { onDelete: 'cascade' }),
    invitedEmail: text(),
    tokenHash: text().unique(),
    journalId: uuid().references(() => journals.id, { onDelete: 'cascade' }),
    roundId: uuid().references(() => rounds.id, { onDelete: 'cascade' }),
    level: text({ enum: ['read', 'fit', 'share-to-test'] }).notNull(),
    grantedBy: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    expiresAt: moment(),
    revokedAt: moment(),
    revokedBy: uuid().references(() => users.id, { onDelete: 'set null' }),
    /** When the person it names last opened something through it, to the minute. */
    lastLookedAt: moment(),
    createdAt: createdAt(),
  },
  (table) => [
    check('grants_one_object', sql`num_nonnulls(${table.journalId}, ${table.roundId}) = 1`),
    check('grants_subject', sql`num_nonnulls(${table.subjectUserId}, ${table.invitedEmail}) >= 1`),
    index('grants_subject_user').on(table.subjectUserId),
    index('grants_journal').on(table.journalId),
    index('grants_round').on(table.roundId),
  ],
);
