import 'server-only';
import { and, asc, count, eq, inArray, sql } from 'drizzle-orm';
import { db, type Executor } from '../client';
import { marks } from '../schema/marks';
import { photos } from '../schema/photos';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';
import { photoIsKept, roundFittableBy, roundIds, roundVisibleTo } from './visible-to';

const MARKS_MAX = 500;

const COLUMNS = {
  id: marks.id,
  kind: marks.kind,
  severity: marks.severity,
  side: marks.side,
  points: marks.points,
  note: marks.note,
  version: marks.version,
};

export interface MarkInput {
  id: string;
  kind: (typeof marks.kind.enumValues)[number];
  severity: number;
  side: (typeof marks.side.enumValues)[number];
  points: { x: number; y: number }[];
  note: string;
}
export interface MarkBatchInput {
  revision: number;
  upserts: { mark: MarkInput; seen: number }[];
  deletes: { id: string; seen: number }[];
}

/** The viewer's own layer of a photo that they may see, and the revision it belongs to; null where they may not. */
export async function findOwnMarks(viewer: Viewer, photoId: string) {
  const [photo] = await db()
    .select({ revision: photos.revision })
    .from(photos)
    .where(
      and(eq(photos.id, photoId), photoIsKept, inArray(photos.roundId, roundIds(roundVisibleTo(viewer)))),
    );
  if (!photo) return null;
  return { revision: photo.revision, marks: await ownMarks(db(), viewer, photoId) };
}

const ownMarks = (tx: Executor, viewer: Viewer, photoId: string) =>
  tx
    .select(COLUMNS)
    .from(marks)
    .where(and(eq(marks.photoId, photoId), eq(marks.authorId, viewer.userId)))
    .orderBy(asc(marks.id));

export type MarkDto = Awaited<ReturnType<typeof ownMarks>>[number];

export interface MarkAnswerDto {
  saved: MarkDto[];
  deleted: string[];
  conflicts: { id: string; theirs: MarkDto | null }[];
}
export type MarkSaving =
  | { kind: 'done'; answer: MarkAnswerDto }
  | { kind: 'missing' }
  | { kind: 'other-revision'; revision: number }
  | { kind: 'too-many' };

const ofAuthor = (viewer: Viewer, photoId: string, id: string) =>
  and(eq(marks.id, id), eq(marks.photoId, photoId), eq(marks.authorId, viewer.userId));

async function saveOne(
  tx: Executor,
  viewer: Viewer,
  photoId: string,
  { mark: { id, ...drawn }, seen }: MarkBatchInput['upserts'][number],
  answer: MarkAnswerDto,
): Promise<void> {
  const [now] = await tx
    .select(COLUMNS)
    .from(marks)
    .where(ofAuthor(viewer, photoId, id))
    .for('update');
  if (!now && seen === 0) {
    const [made] = await tx
      .insert(marks)
      .values({ id, photoId, authorId: viewer.userId, ...drawn })
      .onConflictDoNothing()
      .returning(COLUMNS);
    if (made) answer.saved.push(made);
    else answer.conflicts.push({ id, theirs: null });
    return;
  }
  if (now?.version !== seen) {
    answer.conflicts.push({ id, theirs: now ?? null });
    return;
  }
  const [written] = await tx
    .update(marks)
    .set({ ...drawn, version: sql`${marks.version} + 1`, updatedAt: sql`now()` })
    .where(ofAuthor(viewer, photoId, id))
    .returning(COLUMNS);
  if (written) answer.saved.push(written);
}

async function deleteOne(
  tx: Executor,
  viewer: Viewer,
  photoId: string,
  { id, seen }: MarkBatchInput['deletes'][number],
  answer: MarkAnswerDto,
): Promise<void> {
  const [now] = await tx
    .select(COLUMNS)
    .from(marks)
    .where(ofAuthor(viewer, photoId, id))
    .for('update');
  if (now && now.version !== seen) {
    answer.conflicts.push({ id, theirs: now });
    return;
  }
  if (now) await tx.delete(marks).where(ofAuthor(viewer, photoId, id));
  answer.deleted.push(id);
}

/**
 * Saves a batch into the viewer's own layer: adding never conflicts; a mark that has changed since it was seen comes back with
 * what stands there, and the rest is saved. Sent again, a batch changes nothing but the versions.
 */
export async function saveMarks(viewer: Viewer, photoId: string, batch: MarkBatchInput): Promise<MarkSaving> {
  return db().transaction(async (tx): Promise<MarkSaving> => {
    const [photo] = await tx
      .select({ revision: photos.revision })
      .from(photos)
      .where(
        and(eq(photos.id, photoId), photoIsKept, inArray(photos.roundId, roundIds(roundFittableBy(viewer)))),
      )
      .for('update');
    if (!photo) return { kind: 'missing' };
    if (photo.revision !== batch.revision) return { kind: 'other-revision', revision: photo.revision };
    const answer: MarkAnswerDto = { saved: [], deleted: [], conflicts: [] };
    for (const gone of batch.deletes) await deleteOne(tx, viewer, photoId, gone, answer);
    const [held] = await tx
      .select({ marks: count() })
      .from(marks)
      .where(and(eq(marks.photoId, photoId), eq(marks.authorId, viewer.userId)));
    const added = batch.upserts.filter(({ seen }) => seen === 0).length;
    if ((held?.marks ?? 0) + added > MARKS_MAX) return { kind: 'too-many' };
    for (const upsert of batch.upserts) await saveOne(tx, viewer, photoId, upsert, answer);
    if (answer.saved.length + answer.deleted.length > 0) {
      await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'photo-marks', objectId: photoId, fields: ['marks'] }); // prettier-ignore
    }
    return { kind: 'done', answer };
  });
}
