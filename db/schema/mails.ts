import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, moment } from './columns';
import { grants } from './grants';
import { users } from './users';

/**
 * One row per event that is told by mail, written in the transaction of the event; the job carries only the id. The
 * Message-ID is fixed here, so that a copy sent twice after a crash is known as one. Bodies are emptied once sent.
 */
export const mails = pgTable(
  'mails',
  {
    id: id(),
    userId: uuid().references(() => users.id, { onDelete: 'cascade' }),
    kind: text().notNull(),
    /** The invitation whose link the letter carries. */
    grantId: uuid().references(() => grants.id, { onDelete: 'cascade' }),
    messageId: text().notNull().unique(),
    toEmail: text().notNull(),
    subject: text().notNull(),
    textBody: text().notNull(),
    htmlBody: text().notNull(),
    createdAt: createdAt(),
    sentAt: moment(),
    failedAt: moment(),
  },
  (table) => [index('mails_user').on(table.userId)],
);
