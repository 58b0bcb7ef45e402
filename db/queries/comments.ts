import 'server-only';
import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import { db } from '../client';
import { comments } from '../schema/comments';
import { photos } from '../schema/photos';
import { rounds } from '../schema/rounds';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import { done, missing, type Written } from './outcome';
import type { Viewer } from './viewer';
import { photoIsKept, roundFittableBy, roundIds, roundVisibleTo } from './visible-to';

const columns = (viewer: Viewer) => ({
  id: comments.id,
  photoId: comments.photoId,
  x: comments.x,
  y: comments.y,
  sign: comments.sign,
  asksCheck: comments.asksCheck,
  body: comments.body,
  createdAt: comments.createdAt,
  version: comments.version,
  authorName: users.displayName,
  isMine: sql<boolean>`${comments.authorId} = ${viewer.userId}`,
});

const withAuthor = (viewer: Viewer) =>
  db().select(columns(viewer)).from(comments).innerJoin(users, eq(users.id, comments.authorId));

/** What was said about a round, oldest first; nothing where the round is not in sight. */
export function listComments(viewer: Viewer, roundId: string) {
  return withAuthor(viewer)
    .where(
      and(
        eq(comments.roundId, roundId),
        inArray(comments.roundId, roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)))),
      ),
    )
    .orderBy(asc(comments.id))
    .limit(500);
}
export type CommentDto = Awaited<ReturnType<typeof listComments>>[number];

/** One's own comment in a round that is still open to one. */
const isOwn = (viewer: Viewer, id: string) =>
  and(
    eq(comments.id, id),
    eq(comments.authorId, viewer.userId),
    inArray(comments.roundId, roundIds(roundFittableBy(viewer))),
  );

async function findOwnComment(viewer: Viewer, id: string): Promise<CommentDto | null> {
  const [row] = await withAuthor(viewer).where(isOwn(viewer, id));
  return row ?? null;
}

export interface CommentInput {
  id: string;
  body: string;
  place: { photoId: string; x: number; y: number } | null;
  sign: string | null;
  asksCheck: string | null;
}

/** Says something about a round. Sent again under its id it is one comment. Null when the viewer may not, or the photo is of another round. */
export async function addComment(
  viewer: Viewer,
  roundId: string,
  { place, ...input }: CommentInput,
): Promise<CommentDto | null> {
  const isIn = await db().transaction(async (tx) => {
    const [allowed] = await roundIds(and(roundFittableBy(viewer), eq(rounds.id, roundId)));
    if (!allowed) return false;
    if (place) {
      const [photo] = await tx
        .select({ id: photos.id })
        .from(photos)
        .where(and(eq(photos.id, place.photoId), eq(photos.roundId, roundId), photoIsKept));
      if (!photo) return false;
    }
    const made = await tx
      .insert(comments)
      .values({ ...input, ...place, roundId, authorId: viewer.userId })
      .onConflictDoNothing()
      .returning({ id: comments.id });
    if (made.length > 0)
      await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'comment', objectId: input.id }); // prettier-ignore
    return true;
  });
  return isIn ? findOwnComment(viewer, input.id) : null;
}

/** Rewrites one's own comment; where it was changed elsewhere meanwhile, both versions come back. */
export async function editComment(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  body: string,
): Promise<Written<CommentDto>> {
  const isWritten = await db().transaction(async (tx) => {
    const rows = await tx
      .update(comments)
      .set({ body, version: sql`${comments.version} + 1` })
      .where(and(isOwn(viewer, id), eq(comments.version, seenVersion)))
      .returning({ id: comments.id });
    if (rows.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'comment', objectId: id, fields: ['body'] }); // prettier-ignore
    return true;
  });
  const now = await findOwnComment(viewer, id);
  if (!now) return missing();
  return isWritten ? done(now) : { kind: 'conflict', mine: { body }, theirs: now };
}

/** Takes back one's own comment. */
export async function removeComment(viewer: Viewer, id: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const gone = await tx.delete(comments).where(isOwn(viewer, id)).returning({ id: comments.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'delete', objectKind: 'comment', objectId: id });
    return true;
  });
}
