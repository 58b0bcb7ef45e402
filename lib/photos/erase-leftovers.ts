import 'server-only';
import { findDoomed, findKeptRevisions, forgetDoomed, listDoomed } from '@/db/queries/photo-leftovers';
import { purgeBin } from '@/db/queries/purge-bin';
import { deleteObject, listObjects } from '@/lib/photo-store';
import { photoKeys, photoOfKey } from './keys';

const YOUNG_MS = 3_600_000;

/** Files that belong to no row and have no day of their own, once they are too old to be an upload under way. */
async function eraseOrphans(now: Date): Promise<void> {
  let after: string | undefined;
  for (;;) {
    const page = await listObjects('photos/', after);
    if (page.length === 0) return;
    const old = page.filter(({ modifiedAt }) => now.getTime() - modifiedAt.getTime() > YOUNG_MS);
    const owned = old.flatMap(({ key }) => {
      const owner = photoOfKey(key);
      return owner ? [{ key, ...owner }] : [];
    });
    const kept = await findKeptRevisions([...new Set(owned.map(({ photoId }) => photoId))]);
    const loose = owned.filter(({ photoId, revision }) => !kept.has(`${photoId} ${revision}`));
    const doomed = await findDoomed(loose.map(({ key }) => key));
    for (const { key } of loose) if (!doomed.has(key)) await deleteObject(key);
    after = page.at(-1)?.key;
  }
}

async function eraseDoomed(now: Date): Promise<void> {
  for (let keys = await listDoomed(now); keys.length > 0; keys = await listDoomed(now)) {
    for (const key of keys) {
      await deleteObject(key);
      await forgetDoomed(key);
    }
  }
}

/**
 * Sweeps up: what has lain in the bin long enough, files that were doomed and are due, and what a broken upload left behind. Safe to
 * run twice at once, and again after it broke off.
 */
export async function erasePhotoLeftovers(now: Date): Promise<void> {
  await purgeBin(now, photoKeys);
  await eraseDoomed(now);
  await eraseOrphans(now);
}
