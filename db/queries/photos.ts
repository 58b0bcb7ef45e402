import 'server-only';
import { and, asc, eq, inArray, isNotNull, sql } from 'drizzle-orm';
import type { View } from '@/diagnosis/garments/schema';
import { db, type Executor } from '../client';
import { photos } from '../schema/photos';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
import type { Viewer } from './viewer';
import { mayPhotograph, photoIsKept, roundIds, roundOwnedBy, roundVisibleTo } from './visible-to';

const COLUMNS = {
  id: photos.id,
  view: photos.view,
  isMirrored: photos.isMirrored,
  revision: photos.revision,
  widthPx: photos.widthPx,
  heightPx: photos.heightPx,
  version: photos.version,
};

const inOwnRound = (viewer: Viewer) => inArray(photos.roundId, roundIds(roundOwnedBy(viewer)));

export function listPhotos(viewer: Viewer, roundId: string) {
  return db()
    .select(COLUMNS)
    .from(photos)
    .where(
      and(
        eq(photos.roundId, roundId),
        inArray(photos.roundId, roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)))),
        photoIsKept,
      ),
    )
    .orderBy(asc(photos.id))
    .limit(60);
}
export type PhotoDto = Awaited<ReturnType<typeof listPhotos>>[number];

/** The photos of a round; null when the round is not in sight, which is not the same as having none. */
export async function findPhotos(viewer: Viewer, roundId: string): Promise<PhotoDto[] | null> {
  const seen = await roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)));
  return seen.length > 0 ? listPhotos(viewer, roundId) : null;
}

/**
 * Whether these very pictures may be served: the photo is in sight and the revision is the one that stands.
 * @param audience the master, which is the photo to keep, goes to its owner; the smaller pictures to whoever may look
 */
export async function mayServePhoto(
  viewer: Viewer,
  id: string,
  revision: number,
  audience: 'owner' | 'readers',
): Promise<boolean> {
  const inSight = audience === 'owner' ? roundOwnedBy(viewer) : roundVisibleTo(viewer);
  const [row] = await db()
    .select({ id: photos.id })
    .from(photos)
    .where(
      and(
        eq(photos.id, id),
        eq(photos.revision, revision),
        photoIsKept,
        inArray(photos.roundId, roundIds(inSight)),
      ),
    );
  return row !== undefined;
}

async function findByUploadKey(tx: Executor, roundId: string, uploadKey: string): Promise<PhotoDto | null> {
  const [row] = await tx
    .select(COLUMNS)
    .from(photos)
    .where(and(eq(photos.roundId, roundId), eq(photos.uploadKey, uploadKey)));
  return row ?? null;
}

/**
 * What this upload has made already, and whether the wearer agreed to be photographed. Null: the round is not the viewer's.
 */
export async function findRoundForUpload(
  viewer: Viewer,
  roundId: string,
  uploadKey: string,
): Promise<{ had: PhotoDto | null; isAgreed: boolean } | null> {
  const own = and(roundOwnedBy(viewer), eq(rounds.id, roundId));
  const [owned] = await roundIds(own);
  if (!owned) return null;
  const agreed = await roundIds(and(own, mayPhotograph));
  return { had: await findByUploadKey(db(), roundId, uploadKey), isAgreed: agreed.length > 0 };
}

export interface NewPhoto {
  id: string;
  uploadKey: string;
  view: View;
  isMirrored: boolean;
  widthPx: number;
  heightPx: number;
  masterSha256: string;
  masterBytes: number;
}

/**
 * The row of a photo whose files are in the store. Of the same upload sent several times at once, one row comes to be: `isNew`
 * says whether it is this one's files that it stands for. Null when the round is not the viewer's.
 */
export async function addPhoto(
  viewer: Viewer,
  roundId: string,
  photo: NewPhoto,
): Promise<{ photo: PhotoDto; isNew: boolean } | null> {
  return db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: rounds.id })
      .from(rounds)
      .where(
        and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(and(roundOwnedBy(viewer), mayPhotograph)))),
      );
    if (!owned) return null;
    const [row] = await tx
      .insert(photos)
      .values({ ...photo, roundId })
      .onConflictDoNothing({ target: [photos.roundId, photos.uploadKey] })
      .returning(COLUMNS);
    if (row) {
      await recordAudit(tx, {
        actorId: viewer.userId,
        verb: 'create',
        objectKind: 'photo',
        objectId: row.id,
      });
      return { photo: row, isNew: true };
    }
    const had = await findByUploadKey(tx, roundId, photo.uploadKey);
    return had ? { photo: had, isNew: false } : null;
  });
}

async function findOwnPhoto(viewer: Viewer, id: string): Promise<PhotoDto | null> {
  const [row] = await db()
    .select(COLUMNS)
    .from(photos)
    .where(and(eq(photos.id, id), photoIsKept, inOwnRound(viewer)));
  return row ?? null;
}

export function updatePhoto(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: { view?: View | undefined; isMirrored?: boolean | undefined },
): Promise<Written<PhotoDto>> {
  return writeGuarded({
    viewer,
    objectKind: 'photo',
    id,
    edit,
    write: async (tx) => {
      const mine = and(eq(photos.id, id), photoIsKept, inOwnRound(viewer), eq(photos.version, seenVersion));
      const set = { ...edit, version: sql`${photos.version} + 1` };
      return (await tx.update(photos).set(set).where(mine).returning({ id: photos.id })).length > 0;
    },
    find: () => findOwnPhoto(viewer, id),
  });
}

/** Into the bin, or out of it again within 30 days. */
export async function setPhotoRemoved(viewer: Viewer, id: string, isRemoved: boolean): Promise<boolean> {
  return db().transaction(async (tx) => {
    const rows = await tx
      .update(photos)
      .set({ deletedAt: isRemoved ? sql`now()` : null, version: sql`${photos.version} + 1` })
      .where(
        and(eq(photos.id, id), isRemoved ? photoIsKept : isNotNull(photos.deletedAt), inOwnRound(viewer)),
      )
      .returning({ id: photos.id });
    if (rows.length === 0) return false;
    const verb = isRemoved ? 'delete' : 'restore';
    await recordAudit(tx, { actorId: viewer.userId, verb, objectKind: 'photo', objectId: id });
    return true;
  });
}
