import 'server-only';
import { findKeptRevisions, forgetDoomed, listDoomed } from '@/db/queries/photo-leftovers';
import { deleteObject, listObjects } from '@/lib/photo-store';
import { photoOfKey } from './keys';

const YOUNG_MS = 3_600_000;

/** Files that belong to no row, once they are old enough not to be an upload under way. */
async function eraseOrphans(now: Date): Promise<void> {
  let after: string | undefined;
  for (;;) {
    const page = await listObjects('photos/', after);
    const old = page.filter(({ modifiedAt }) => now.getTime() - modifiedAt.getTime() > YOUNG_MS);
    const owners = old.flatMap(({ key }) => photoOfKey(key) ?? []);
    const kept = await findKeptRevisions([...new Set(owners.map(({ photoId }) => photoId))]);
    for (const { key } of old) {
      const owner = photoOfKey(key);
      if (owner && !kept.has(`${owner.photoId} ${owner.revision}`)) await deleteObject(key);
    }
    if (page.length === 0) return;
    after = page.at(-1)?.key;
  }
}

async function eraseDoomed(now: Date): Promise<void> {
  for (const key of await listDoomed(now)) {
    await deleteObject(key);
    await forgetDoomed(key);
  }
}

/** Sweeps the store: what was doomed and is due, and what a broken upload left behind. */
export async function erasePhotoLeftovers(now: Date): Promise<void> {
  await eraseDoomed(now);
  await eraseOrphans(now);
}
