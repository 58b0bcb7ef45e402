import 'server-only';
import { eq, inArray, lte } from 'drizzle-orm';
import { db } from '../client';
import { doomedObjects } from '../schema/doomed-objects';
import { photos } from '../schema/photos';

/** The revisions that rows stand for, as `id revision`; a photo in the bin keeps its files. */
export async function findKeptRevisions(ids: string[]): Promise<Set<string>> {
  if (ids.length === 0) return new Set();
  const rows = await db()
    .select({ id: photos.id, revision: photos.revision })
    .from(photos)
    .where(inArray(photos.id, ids));
  return new Set(rows.map(({ id, revision }) => `${id} ${revision}`));
}

/** Of these files, the ones that have a day of their own to be erased: no sooner. */
export async function findDoomed(keys: string[]): Promise<Set<string>> {
  if (keys.length === 0) return new Set();
  const rows = await db()
    .select({ key: doomedObjects.key })
    .from(doomedObjects)
    .where(inArray(doomedObjects.key, keys));
  return new Set(rows.map(({ key }) => key));
}

/** A page of what is due; the next one comes once these are forgotten. */
export async function listDoomed(now: Date): Promise<string[]> {
  const rows = await db()
    .select({ key: doomedObjects.key })
    .from(doomedObjects)
    .where(lte(doomedObjects.eraseAfter, now))
    .limit(500);
  return rows.map(({ key }) => key);
}

export async function forgetDoomed(key: string): Promise<void> {
  await db().delete(doomedObjects).where(eq(doomedObjects.key, key));
}
