import { boolean, index, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, version } from './columns';
import { rounds } from './rounds';

/**
 * A photo of a round. There is never a row without its files: the files go to the store first, under a key made of the id
 * and the revision. `uploadKey` comes from the sender, so that the same upload sent five times is one photo.
 */
export const photos = pgTable(
  'photos',
  {
    id: id(),
    roundId: uuid()
      .notNull()
      .references(() => rounds.id, { onDelete: 'cascade' }),
    uploadKey: uuid().notNull(),
    view: text({ enum: ['front', 'back', 'left', 'right', 'seated', 'close-up'] }).notNull(),
    /** A mirror picture; what is stored is as the camera saw it, sides are always the wearer's. */
    isMirrored: boolean().notNull().default(false),
    revision: integer().notNull().default(1),
    widthPx: integer().notNull(),
    heightPx: integer().notNull(),
    masterSha256: text().notNull(),
    masterBytes: integer().notNull(),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
    version: version(),
  },
  (table) => [
    unique('photos_upload_key').on(table.roundId, table.uploadKey),
    index('photos_round').on(table.roundId, table.id),
  ],
);
