import 'server-only';
import { and, desc, eq, gt, inArray, isNull, or, sql } from 'drizzle-orm';
import { env } from '@/lib/env';
import { invitationLetter } from '@/lib/mail/compose';
import { enqueueMail } from '@/lib/mail/enqueue-mail';
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
import type { Viewer } from './viewer';
import { journalIds, journalOwnedBy, mayShare, roundIds, roundOwnedBy } from './visible-to';

type GrantState = 'waiting' | 'open' | 'ran-out' | 'taken-back' | 'declined';

const STATE = sql<GrantState>`case
  when ${grants.revokedBy} <> ${grants.grantedBy} then 'declined'
  when ${grants.revokedAt} is not null then 'taken-back'
  when ${grants.expiresAt} <= now() then 'ran-out'
  when ${grants.subjectUserId} is null then 'waiting' else 'open' end`;

export const isLive = and(
  isNull(grants.revokedAt),
  or(isNull(grants.expiresAt), gt(grants.expiresAt, sql`now()`)),
);

/** The ids of grants on things of the viewer's own. */
const ownGrantIds = (viewer: Viewer) =>
  db()
    .select({ id: grants.id })
    .from(grants)
    .leftJoin(rounds, eq(rounds.id, grants.roundId))
    .innerJoin(journals, sql`${journals.id} = coalesce(${grants.journalId}, ${rounds.journalId})`)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(journalOwnedBy(viewer));

/**
 * Everyone a journal or a round of it was opened to, newest first: how far, until when, and when they last looked. A state of
 * `declined` also says that they have left since. Empty for a journal that is not the viewer's.
 */
export function listGrants(viewer: Viewer, journalId: string) {
  return db()
    .select({
      id: grants.id,
      email: grants.invitedEmail,
      level: grants.level,
      roundNumber: rounds.number,
      state: STATE,
      expiresAt: grants.expiresAt,
      lastLookedAt: grants.lastLookedAt,
    })
    .from(grants)
    .leftJoin(rounds, eq(rounds.id, grants.roundId))
    .where(
      and(
        sql`coalesce(${grants.journalId}, ${rounds.journalId}) = ${journalId}`,
        inArray(grants.id, ownGrantIds(viewer)),
      ),
    )
    .orderBy(desc(grants.id))
    .limit(200);
}
export type GrantDto = Awaited<ReturnType<typeof listGrants>>[number];

export type ShareTarget = { journalId: string } | { roundId: string };
export interface InviteInput {
  id: string;
  email: string;
  level: 'read' | 'fit';
  expiresInDays: number;
}

const ownTarget = (viewer: Viewer, target: ShareTarget) =>
  'journalId' in target
    ? journalIds(and(journalOwnedBy(viewer), eq(journals.id, target.journalId)))
    : roundIds(and(roundOwnedBy(viewer), eq(rounds.id, target.roundId)));
const sharableTarget = (viewer: Viewer, target: ShareTarget) =>
  'journalId' in target
    ? journalIds(and(journalOwnedBy(viewer), mayShare, eq(journals.id, target.journalId)))
    : roundIds(and(roundOwnedBy(viewer), mayShare, eq(rounds.id, target.roundId)));

/** Nothing is sent to someone who does not want this person's invitations; who invites is not told. */
async function sendInvitation(
  tx: Executor,
  viewer: Viewer,
  grant: { id: string; email: string },
): Promise<void> {
  const [blocked] = await tx
    .select({ one: sql`1` })
    .from(blocks)
    .innerJoin(users, eq(users.id, blocks.userId))
    .where(and(eq(blocks.blockedUserId, viewer.userId), eq(users.email, grant.email)));
  if (blocked) return;
  const letter = invitationLetter(env().APP_ORIGIN, viewer.displayName);
  await enqueueMail(tx, { userId: null, email: grant.email }, 'invitation', letter, grant.id);
}

/**
 * Invites an address to one journal or one round. The same id sent again is one invitation and one letter.
 * @returns `no-consent` where the wearer has not agreed to be shown, null where the thing is not the viewer's
 */
export async function invite(
  viewer: Viewer,
  target: ShareTarget,
  { id, email, level, expiresInDays }: InviteInput,
): Promise<'invited' | 'no-consent' | 'oneself' | null> {
  return db().transaction(async (tx) => {
    if ((await ownTarget(viewer, target)).length === 0) return null;
    if (email === viewer.email) return 'oneself';
    if ((await sharableTarget(viewer, target)).length === 0) return 'no-consent';
    const made = await tx
      .insert(grants)
      .values({
        id,
        ...target,
        invitedEmail: email,
        level,
        grantedBy: viewer.userId,
        expiresAt: sql`now() + make_interval(days => ${expiresInDays})`,
      })
      .onConflictDoNothing()
      .returning({ id: grants.id });
    if (made.length === 0) {
      const [had] = await tx.select({ id: grants.id }).from(grants).where(and(eq(grants.id, id), inArray(grants.id, ownGrantIds(viewer)))); // prettier-ignore
      return had ? 'invited' : null;
    }
    await sendInvitation(tx, viewer, { id, email });
    await recordAudit(tx, { actorId: viewer.userId, verb: 'grant', objectKind: 'grant', objectId: id });
    return 'invited';
  });
}

/** The address of an invitation of the viewer's that still waits; null for anything else. */
export async function findWaitingAddress(viewer: Viewer, id: string): Promise<string | null> {
  const [row] = await db()
    .select({ email: grants.invitedEmail })
    .from(grants)
    .where(
      and(eq(grants.id, id), isNull(grants.subjectUserId), isLive, inArray(grants.id, ownGrantIds(viewer))),
    );
  return row?.email ?? null;
}

/** Sends the letter of an invitation once more; the link of the one before ends when the new one is sent. */
export async function resendInvitation(viewer: Viewer, id: string): Promise<boolean> {
  const email = await findWaitingAddress(viewer, id);
  if (!email) return false;
  await db().transaction((tx) => sendInvitation(tx, viewer, { id, email }));
  return true;
}

/** Takes back what was opened to someone: their next request finds nothing. */
export async function revokeGrant(viewer: Viewer, id: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const gone = await tx
      .update(grants)
      .set({ revokedAt: sql`now()`, revokedBy: viewer.userId, tokenHash: null })
      .where(and(eq(grants.id, id), isNull(grants.revokedAt), inArray(grants.id, ownGrantIds(viewer))))
      .returning({ id: grants.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'revoke', objectKind: 'grant', objectId: id });
    return true;
  });
}

/** Notes, to the minute, that someone invited looked into this journal; nothing where it is their own. */
export async function noteLook(viewer: Viewer, journalId: string): Promise<void> {
  await db()
    .update(grants)
    .set({ lastLookedAt: sql`now()` })
    .where(
      and(
        eq(grants.subjectUserId, viewer.userId),
        isLive,
        sql`(${grants.journalId} = ${journalId} or ${grants.roundId} in (select r.id from rounds r where r.journal_id = ${journalId}))`,
        or(isNull(grants.lastLookedAt), sql`${grants.lastLookedAt} < now() - interval '1 minute'`),
      ),
    );
}
