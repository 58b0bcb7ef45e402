import { index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, moment, version } from './columns';
import { photos } from './photos';
import { users } from './users';

/**
 * What someone drew on a photo: a polyline of fractions of the current master, a kind and a strength. Each author has an own
 * layer. The id comes from the client: adding never conflicts; two edits of one mark give back both.
 */
export const marks = pgTable(
  'marks',
  {
    id: uuid().primaryKey(),
    photoId: uuid()
      .notNull()
      .references(() => photos.id, { onDelete: 'cascade' }),
    authorId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    kind: text({ enum: ['tight', 'slack', 'gap', 'pooling', 'tilt', 'pin'] }).notNull(),
    severity: integer().notNull(),
    side: text({ enum: ['left', 'right', 'both'] })
      .notNull()
      .default('both'),
    points: jsonb().$type<{ x: number; y: number }[]>().notNull(),
    note: text().notNull().default(''),
    /** The sign that the person took this mark for. */
    sign: text(),
    createdAt: createdAt(),
    updatedAt: moment().notNull().defaultNow(),
    version: version(),
  },
  (table) => [index('marks_photo').on(table.photoId, table.id)],
);
