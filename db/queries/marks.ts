import 'server-only';
import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import { MARKS_MAX } from '@/components/marks/mark-limits-schema';
import { db, type Executor } from '../client';
import { marks } from '../schema/marks';
import { photos } from '../schema/photos';
import { recordAudit } from './audit';
import { judgeMarks } from './judge-marks';
import type { Viewer } from './viewer';
import { photoIsKept, roundFittableBy, roundIds, roundVisibleTo } from './visible-to';

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

const ownedBy = (viewer: Viewer, photoId: string) =>
  and(eq(marks.photoId, photoId), eq(marks.authorId, viewer.userId));

const ownMarks = (tx: Executor, viewer: Viewer, photoId: string) =>
  tx.select(COLUMNS).from(marks).where(ownedBy(viewer, photoId)).orderBy(asc(marks.id));

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

const SENT = {
  kind: sql`excluded.kind`,
  severity: sql`excluded.severity`,
  side: sql`excluded.side`,
  points: sql`excluded.points`,
  note: sql`excluded.note`,
};

/** Writes them in one statement. An id that stands on another photo or with another author is left alone and not given back. */
async function writeMarks(tx: Executor, viewer: Viewer, photoId: string, drawn: MarkInput[]) {
  if (drawn.length === 0) return [];
  return tx
    .insert(marks)
    .values(drawn.map((mark) => ({ photoId, authorId: viewer.userId, ...mark })))
    .onConflictDoUpdate({
      target: marks.id,
      set: { ...SENT, version: sql`${marks.version} + 1`, updatedAt: sql`now()` },
      setWhere: ownedBy(viewer, photoId)!,
    })
    .returning(COLUMNS);
}

/**
 * Saves a batch into the viewer's own layer: adding never conflicts; a mark that has changed since it was seen comes back with
 * what stands there, and the rest is saved. Sent again, a batch changes nothing. The photo's row is held meanwhile, so that
 * two batches go one after the other.
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
    const judged = judgeMarks(await ownMarks(tx, viewer, photoId), batch);
    if (judged.countAfter > MARKS_MAX) return { kind: 'too-many' };
    if (judged.toDelete.length > 0)
      await tx.delete(marks).where(and(ownedBy(viewer, photoId), inArray(marks.id, judged.toDelete)));
    const written = await writeMarks(tx, viewer, photoId, judged.toWrite);
    if (written.length + judged.toDelete.length > 0) {
      await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'photo-marks', objectId: photoId, fields: ['marks'] }); // prettier-ignore
    }
    const done = new Set(written.map(({ id }) => id));
    const taken = judged.toWrite.filter(({ id }) => !done.has(id)).map(({ id }) => ({ id, theirs: null }));
    return {
      kind: 'done',
      answer: {
        saved: [...judged.standing, ...written],
        deleted: judged.deleted,
        conflicts: [...judged.conflicts, ...taken],
      },
    };
  });
}
