import 'server-only';
import { lte } from 'drizzle-orm';
import { db } from '../client';
import { doomedObjects } from '../schema/doomed-objects';
import { photos } from '../schema/photos';
import { tombstones } from '../schema/tombstones';

const DAY_MS = 86_400_000;
const BIN_DAYS = 30;

/**
 * Erases the rows of photos that have lain in the bin long enough, with their marks. What is left of each is its id and a hash; its
 * files are erased a day later, so that a backup that saw the row finds them still.
 * @param keysOf the files of one revision of a photo
 */
export async function purgePhotos(
  now: Date,
  keysOf: (photoId: string, revision: number) => string[],
): Promise<void> {
  const due = new Date(now.getTime() - BIN_DAYS * DAY_MS);
  const eraseAfter = new Date(now.getTime() + DAY_MS);
  await db().transaction(async (tx) => {
    const gone = await tx
      .delete(photos)
      .where(lte(photos.deletedAt, due))
      .returning({ id: photos.id, revision: photos.revision, hash: photos.masterSha256 });
    if (gone.length === 0) return;
    await tx.insert(tombstones).values(gone.map(({ id, hash }) => ({ id, hash, objectKind: 'photo' })));
    const keys = gone.flatMap(({ id, revision }) => keysOf(id, revision));
    await tx.insert(doomedObjects).values(keys.map((key) => ({ key, eraseAfter })));
  });
}
