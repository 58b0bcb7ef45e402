import 'server-only';
import { and, asc, eq, inArray } from 'drizzle-orm';
import { db, type Executor } from '../client';
import { photoLandmarks } from '../schema/photo-landmarks';
import { photos } from '../schema/photos';
import { recordAudit } from './audit';
import { done, missing, type Written } from './outcome';
import type { Viewer } from './viewer';
import { photoIsKept, roundFittableBy, roundIds, roundVisibleTo } from './visible-to';

export interface LandmarkInput {
  landmark: string;
  x: number;
  y: number;
}

/** Where the figure lies on a photo: one set for the photo, whoever placed it. `version` 0: nobody has yet. */
export interface LandmarksDto {
  revision: number;
  version: number;
  landmarks: LandmarkInput[];
}

async function readSet(tx: Executor, photoId: string, revision: number): Promise<LandmarksDto> {
  const { landmark, x, y, version } = photoLandmarks;
  const rows = await tx
    .select({ landmark, x, y, version })
    .from(photoLandmarks)
    .where(eq(photoLandmarks.photoId, photoId))
    .orderBy(asc(landmark));
  return {
    revision,
    version: Math.max(0, ...rows.map((row) => row.version)),
    landmarks: rows.map((row) => ({ landmark: row.landmark, x: row.x, y: row.y })),
  };
}

/** Null where the viewer may not see the photo. */
export async function findLandmarks(viewer: Viewer, photoId: string): Promise<LandmarksDto | null> {
  const [photo] = await db()
    .select({ revision: photos.revision })
    .from(photos)
    .where(
      and(eq(photos.id, photoId), photoIsKept, inArray(photos.roundId, roundIds(roundVisibleTo(viewer)))),
    );
  return photo ? readSet(db(), photoId, photo.revision) : null;
}

export interface LandmarksSave {
  revision: number;
  seen: number;
  landmarks: LandmarkInput[];
}

/**
 * Puts a whole set in the place of the one that was seen. A newer set, or a photo that was cut or turned meanwhile, is a
 * conflict and gives back what stands there. The same set sent again changes nothing. The photo's row is held meanwhile.
 */
export async function saveLandmarks(
  viewer: Viewer,
  photoId: string,
  { revision, seen, landmarks }: LandmarksSave,
): Promise<Written<LandmarksDto>> {
  return db().transaction(async (tx): Promise<Written<LandmarksDto>> => {
    const [photo] = await tx
      .select({ revision: photos.revision })
      .from(photos)
      .where(
        and(eq(photos.id, photoId), photoIsKept, inArray(photos.roundId, roundIds(roundFittableBy(viewer)))),
      )
      .for('update');
    if (!photo) return missing();
    const standing = await readSet(tx, photoId, photo.revision);
    if (photo.revision === revision && isSameSet(standing.landmarks, landmarks)) return done(standing);
    if (photo.revision !== revision || standing.version !== seen)
      return { kind: 'conflict', mine: landmarks, theirs: standing };
    await tx.delete(photoLandmarks).where(eq(photoLandmarks.photoId, photoId));
    const version = standing.version + 1;
    if (landmarks.length > 0)
      await tx.insert(photoLandmarks).values(landmarks.map((one) => ({ photoId, ...one, version })));
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'photo', objectId: photoId, fields: ['landmarks'] }); // prettier-ignore
    return done(await readSet(tx, photoId, photo.revision));
  });
}

function isSameSet(standing: readonly LandmarkInput[], sent: readonly LandmarkInput[]): boolean {
  const places = new Map(standing.map(({ landmark, x, y }) => [landmark, { x, y }]));
  return (
    standing.length === sent.length &&
    sent.every(({ landmark, x, y }) => places.get(landmark)?.x === x && places.get(landmark)?.y === y)
  );
}
