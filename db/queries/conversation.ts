import 'server-only';
import { and, asc, eq, inArray, ne } from 'drizzle-orm';
import { db } from '../client';
import { marks } from '../schema/marks';
import { photos } from '../schema/photos';
import { rounds } from '../schema/rounds';
import { users } from '../schema/users';
import { listComments } from './comments';
import { listProposals } from './proposals';
import type { Viewer } from './viewer';
import { photoIsKept, roundIds, roundVisibleTo } from './visible-to';

/** The marks of everybody else on the photos of a round; one's own layer is read by itself. */
const listOthersMarks = (viewer: Viewer, roundId: string) =>
  db()
    .select({
      id: marks.id,
      photoId: marks.photoId,
      authorName: users.displayName,
      kind: marks.kind,
      severity: marks.severity,
      side: marks.side,
      points: marks.points,
      note: marks.note,
      version: marks.version,
    })
    .from(marks)
    .innerJoin(photos, eq(photos.id, marks.photoId))
    .innerJoin(users, eq(users.id, marks.authorId))
    .where(
      and(
        eq(photos.roundId, roundId),
        photoIsKept,
        ne(marks.authorId, viewer.userId),
        inArray(photos.roundId, roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)))),
      ),
    )
    .orderBy(asc(marks.id))
    .limit(2000);

/** What others put on a round: their marks, what was said, the plans proposed. Null when the round is not in sight. */
export async function findConversation(viewer: Viewer, roundId: string) {
  const seen = await roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)));
  if (seen.length === 0) return null;
  const [others, comments, proposals] = await Promise.all([
    listOthersMarks(viewer, roundId),
    listComments(viewer, roundId),
    listProposals(viewer, roundId),
  ]);
  return { marks: others, comments, proposals };
}
export type ConversationDto = NonNullable<Awaited<ReturnType<typeof findConversation>>>;
