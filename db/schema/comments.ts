import { sql } from 'drizzle-orm';
import { check, doublePrecision, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, version } from './columns';
import { photos } from './photos';
import { rounds } from './rounds';
import { users } from './users';

/**
 * What someone says about a round: of the whole, of a sign, or of one place on a photo (fractions of its current master).
 * `asksCheck` names a test that is asked for. Only its author rewrites or takes back a comment.
 */
export const comments = pgTable(
  'comments',
  {
    id: id(),
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    photoId: uuid().references(() => photos.id, { onDelete: 'cascade' }),
    x: doublePrecision(),
    y: doublePrecision(),
    sign: text(),
    asksCheck: text(),
    body: text().notNull(),
    createdAt: createdAt(),
    version: version(),
  },
  (table) => [
    check('comments_place', sql`num_nonnulls(${table.photoId}, ${table.x}, ${table.y}) in (0, 3)`),
    index('comments_round').on(table.roundId, table.id),
  ],
);
