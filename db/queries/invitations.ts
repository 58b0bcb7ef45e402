import 'server-only';
import { and, desc, eq, isNull, ne, or, sql, type SQL } from 'drizzle-orm';
import { hashSecret } from '@/lib/auth/secret';
import { db, type Executor } from '../client';
import { blocks } from '../schema/blocks';
import { grants } from '../schema/grants';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { rounds } from '../schema/rounds';
import { users } from '../schema/users';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import { isLive } from './sharing';
import type { Viewer } from './viewer';
import { mayShare } from './visible-to';

/** An invitation that could be taken: nobody's yet, not ended, and what it opens is still there to be shown. */
const isTakeable = and(
  isNull(grants.subjectUserId),
  isLive,
  isNull(journals.deletedAt),
  isNull(wearers.deletedAt),
  isNull(patterns.deletedAt),
  or(isNull(rounds.id), isNull(rounds.deletedAt)),
  mayShare,
  isNull(users.deletedAt),
  isNull(users.suspendedAt),
);

/** What an invitation says before it is taken, and no more: not the garment, not the wearer. */
const invitations = () =>
  db()
    .select({
      id: grants.id,
      inviterName: users.displayName,
      level: grants.level,
      isOneRound: sql<boolean>`${grants.roundId} is not null`,
      expiresAt: grants.expiresAt,
    })
    .from(grants)
    .innerJoin(users, eq(users.id, grants.grantedBy))
    .leftJoin(rounds, eq(rounds.id, grants.roundId))
    .innerJoin(journals, sql`${journals.id} = coalesce(${grants.journalId}, ${rounds.journalId})`)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .$dynamic();

/** Who invites to what, for whoever holds the link. Reading it changes nothing. Null when the link no longer holds. */
export async function findInvitation(secret: string) {
  const [row] = await invitations().where(and(eq(grants.tokenHash, hashSecret(secret)), isTakeable));
  return row ?? null;
}
export type InvitationDto = NonNullable<Awaited<ReturnType<typeof findInvitation>>>;

/** The invitations that wait for the viewer's own confirmed address, newest first. */
export function listInvitations(viewer: Viewer): Promise<InvitationDto[]> {
  const isBlocked = sql`exists (select 1 from ${blocks} where ${blocks.userId} = ${viewer.userId} and ${blocks.blockedUserId} = ${grants.grantedBy})`;
  return invitations()
    .where(and(eq(grants.invitedEmail, viewer.email), isTakeable, sql`not ${isBlocked}`))
    .orderBy(desc(grants.id))
    .limit(100);
}

/** The secret of a letter's link, or the id of an invitation to one's own address. */
export type InvitationKey = { token: string } | { grantId: string };

async function lockInvitation(tx: Executor, viewer: Viewer, key: InvitationKey) {
  const isMeant = 'token' in key ? eq(grants.tokenHash, hashSecret(key.token)) : eq(grants.id, key.grantId);
  const [row] = await tx
    .select({
      id: grants.id,
      grantedBy: grants.grantedBy,
      journalId: journals.id,
      roundNumber: rounds.number,
    })
    .from(grants)
    .innerJoin(users, eq(users.id, grants.grantedBy))
    .leftJoin(rounds, eq(rounds.id, grants.roundId))
    .innerJoin(journals, sql`${journals.id} = coalesce(${grants.journalId}, ${rounds.journalId})`)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(and(isMeant, eq(grants.invitedEmail, viewer.email), isTakeable))
    .for('update', { of: grants });
  return row ?? null;
}

async function settle(tx: Executor, viewer: Viewer, id: string, set: Record<string, string | SQL>) {
  await tx
    .update(grants)
    .set({ ...set, tokenHash: null })
    .where(and(eq(grants.id, id), eq(grants.invitedEmail, viewer.email)));
}

/**
 * Takes up an invitation. Only the account whose confirmed address was invited can; for any other it is as if there were none,
 * and it waits on.
 * @returns where it leads, or null
 */
export async function acceptInvitation(
  viewer: Viewer,
  key: InvitationKey,
): Promise<{ journalId: string; roundNumber: number | null } | null> {
  return db().transaction(async (tx) => {
    const found = await lockInvitation(tx, viewer, key);
    if (!found) return null;
    await settle(tx, viewer, found.id, { subjectUserId: viewer.userId });
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'grant', objectId: found.id, fields: ['subjectUserId'] }); // prettier-ignore
    return { journalId: found.journalId, roundNumber: found.roundNumber };
  });
}

/** Says no to an invitation, and with `isBlocking` to every later one of the same person. */
export async function declineInvitation(
  viewer: Viewer,
  key: InvitationKey,
  isBlocking: boolean,
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const found = await lockInvitation(tx, viewer, key);
    if (!found) return false;
    await settle(tx, viewer, found.id, { revokedAt: sql`now()`, revokedBy: viewer.userId });
    if (isBlocking)
      await tx
        .insert(blocks)
        .values({ userId: viewer.userId, blockedUserId: found.grantedBy })
        .onConflictDoNothing();
    await recordAudit(tx, {
      actorId: viewer.userId,
      verb: 'revoke',
      objectKind: 'grant',
      objectId: found.id,
    });
    return true;
  });
}

/** Gives back what was opened to the viewer: every grant on this journal or on rounds of it. */
export async function leaveJournal(viewer: Viewer, journalId: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const left = await tx
      .update(grants)
      .set({ revokedAt: sql`now()`, revokedBy: viewer.userId })
      .where(
        and(
          eq(grants.subjectUserId, viewer.userId),
          ne(grants.grantedBy, viewer.userId),
          isLive,
          sql`(${grants.journalId} = ${journalId} or ${grants.roundId} in (select r.id from rounds r where r.journal_id = ${journalId}))`,
        ),
      )
      .returning({ id: grants.id });
    for (const { id } of left)
      await recordAudit(tx, { actorId: viewer.userId, verb: 'revoke', objectKind: 'grant', objectId: id });
    return left.length > 0;
  });
}
