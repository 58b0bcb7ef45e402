import 'server-only';
import { and, desc, eq, gt, ne, sql } from 'drizzle-orm';
import { hashSecret } from '@/lib/auth/secret';
import { db } from '../client';
import { sessions } from '../schema/sessions';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

/** Names a session without giving what the table knows it by. */
const handle = sql<string>`encode(sha256(convert_to('handle ' || ${sessions.id}, 'UTF8')), 'hex')`;

/** Where the viewer is signed in, newest first. `isThis` is the one that asks. */
export function listSessions(viewer: Viewer, secret: string) {
  return db()
    .select({
      handle,
      userAgent: sessions.userAgent,
      createdAt: sessions.createdAt,
      isThis: sql<boolean>`${sessions.id} = ${hashSecret(secret)}`,
    })
    .from(sessions)
    .where(and(eq(sessions.userId, viewer.userId), gt(sessions.expiresAt, sql`now()`)))
    .orderBy(desc(sessions.createdAt))
    .limit(100);
}
export type SessionDto = Awaited<ReturnType<typeof listSessions>>[number];

/** Ends one session of the viewer's own, or with `others` all but the one that asks. False when there was none. */
export async function endSessions(viewer: Viewer, secret: string, which: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const chosen = which === 'others' ? ne(sessions.id, hashSecret(secret)) : sql`${handle} = ${which}`;
    const gone = await tx
      .delete(sessions)
      .where(and(eq(sessions.userId, viewer.userId), chosen))
      .returning({ id: sessions.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, {
      actorId: viewer.userId,
      verb: 'sign-out',
      objectKind: 'session',
      objectId: null,
    });
    return true;
  });
}
