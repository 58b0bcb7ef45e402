import 'server-only';
import { inArray, lte, or, type SQL, sql } from 'drizzle-orm';
import { db, type Executor } from '../client';
import { doomedObjects } from '../schema/doomed-objects';
import { photos } from '../schema/photos';
import { tombstones } from '../schema/tombstones';

const DAY_MS = 86_400_000;
const BIN_DAYS = 30;
const GRACE_DAYS = 14;

type KeysOf = (photoId: string, revision: number) => string[];

/** Erases the rows of these photos with their marks; their files follow a day later, so that a backup that saw the rows finds them still. */
async function erasePhotos(tx: Executor, now: Date, which: SQL | undefined, keysOf: KeysOf): Promise<void> {
  const gone = await tx
    .delete(photos)
    .where(which)
    .returning({ id: photos.id, revision: photos.revision, hash: photos.masterSha256 });
  if (gone.length === 0) return;
  const eraseAfter = new Date(now.getTime() + DAY_MS);
  await tx.insert(tombstones).values(gone.map(({ id, hash }) => ({ id, hash, objectKind: 'photo' })));
  const keys = gone.flatMap(({ id, revision }) => keysOf(id, revision));
  await tx.insert(doomedObjects).values(keys.map((key) => ({ key, eraseAfter })));
}

const photosBelow = (due: Date, graceEnd: Date) => sql`
  select p.id from photos p join rounds r on r.id = p.round_id join journals j on j.id = r.journal_id
  join wearers w on w.id = j.wearer_id join pattern_versions v on v.id = j.pattern_version_id
  join patterns t on t.id = v.pattern_id join users u on u.id = j.owner_id
  where least(r.deleted_at, j.deleted_at, w.deleted_at, t.deleted_at) <= ${due.toISOString()}
    or u.deleted_at <= ${graceEnd.toISOString()}`;

/** Outermost last, so that each leaves its own tombstone before what it hung on takes it along. */
const CONTAINERS = [
  ['rounds', 'round', BIN_DAYS],
  ['journals', 'journal', BIN_DAYS],
  ['wearers', 'wearer', BIN_DAYS],
  ['patterns', 'pattern', BIN_DAYS],
  ['users', 'user', GRACE_DAYS],
] as const;

/**
 * Erases what has lain in the bin 30 days, with everything below it, and accounts whose 14 days of grace are over. Of each thing
 * its id and a hash are left, so that a restored backup does not bring it back.
 * @param keysOf the files of one revision of a photo
 */
export async function purgeBin(now: Date, keysOf: KeysOf): Promise<void> {
  const daysAgo = (days: number) => new Date(now.getTime() - days * DAY_MS);
  await db().transaction(async (tx) => {
    const below = inArray(photos.id, sql`(${photosBelow(daysAgo(BIN_DAYS), daysAgo(GRACE_DAYS))})`);
    await erasePhotos(tx, now, or(lte(photos.deletedAt, daysAgo(BIN_DAYS)), below), keysOf);
    for (const [table, objectKind, days] of CONTAINERS)
      await tx.execute(sql`
        with gone as (delete from ${sql.identifier(table)} where deleted_at <= ${daysAgo(days).toISOString()} returning id)
        insert into tombstones (id, object_kind, hash)
        select id, ${objectKind}, encode(sha256(convert_to(id::text, 'UTF8')), 'hex') from gone`);
  });
}
