import { doublePrecision, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { version } from './columns';
import { photos } from './photos';

/** Where a named point of the figure lies on the photo, as fractions of the current master's width and height. */
export const photoLandmarks = pgTable(
  'photo_landmarks',
  {
    photoId: uuid()
      .notNull()
      .references(() => photos.id, { onDelete: 'cascade' }),
    landmark: text().notNull(),
    x: doublePrecision().notNull(),
    y: doublePrecision().notNull(),
    version: version(),
  },
  (table) => [primaryKey({ columns: [table.photoId, table.landmark] })],
);
