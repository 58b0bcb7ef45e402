import 'server-only';
import { and, desc, eq, isNotNull, isNull, lt, or, sql, type SQL } from 'drizzle-orm';
import { db } from '../client';
import { audit } from '../schema/audit';
import { mails } from '../schema/mails';
import { sessions } from '../schema/sessions';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

/** Asked of the row that stands, not of what the session said. It opens lists of accounts and of work, never anyone's things. */
const isAdminNow = (viewer: Viewer): SQL =>
  sql`exists (select 1 from users a where a.id = ${viewer.userId} and a.is_admin and a.suspended_at is null and a.deleted_at is null)`;

const PAGE = 50;

/** Accounts, newest first, with what they take up in the store (masters, bytes). Null where the viewer is no admin. */
export async function listUsers(viewer: Viewer, before?: string) {
  if (!(await mayAdminister(viewer))) return null;
  return db()
    .select({
      id: users.id,
      email: users.email,
      displayName: users.displayName,
      isAdmin: users.isAdmin,
      isPatternMaker: users.isPatternMaker,
      isFitter: users.isFitter,
      isVerified: sql<boolean>`${users.emailVerifiedAt} is not null`,
      isSuspended: sql<boolean>`${users.suspendedAt} is not null`,
      isLeaving: sql<boolean>`${users.deletedAt} is not null`,
      photos: sql<number>`(select count(*)::int from photos p join rounds r on r.id = p.round_id join journals j on j.id = r.journal_id where j.owner_id = users.id)`,
      bytes: sql<number>`(select coalesce(sum(p.master_bytes), 0)::float8 from photos p join rounds r on r.id = p.round_id join journals j on j.id = r.journal_id where j.owner_id = users.id)`,
    })
    .from(users)
    .where(and(isAdminNow(viewer), before === undefined ? undefined : lt(users.id, before)))
    .orderBy(desc(users.id))
    .limit(PAGE);
}
export type AdminUserDto = NonNullable<Awaited<ReturnType<typeof listUsers>>>[number];

export async function mayAdminister(viewer: Viewer): Promise<boolean> {
  const [row] = await db()
    .select({ id: users.id })
    .from(users)
    .where(and(eq(users.id, viewer.userId), isAdminNow(viewer)));
  return row !== undefined;
}

/**
 * Closes or opens an account to its person, or gives and takes the flag of an admin. Suspending ends every session. Nobody does it
 * to themselves, so that an admin is always left.
 * @returns false where the viewer is no admin, or there is no such account
 */
export async function setUserFlags(
  viewer: Viewer,
  userId: string,
  { isSuspended, isAdmin }: { isSuspended?: boolean | undefined; isAdmin?: boolean | undefined },
): Promise<boolean> {
  return db().transaction(async (tx) => {
    // One admin at a time: two who took the flag from each other at once would leave none.
    await tx.execute(sql`select pg_advisory_xact_lock(hashtext('ruckle admins'))`);
    const set = {
      ...(isAdmin === undefined ? {} : { isAdmin }),
      ...(isSuspended === undefined ? {} : { suspendedAt: isSuspended ? sql`now()` : null }),
    };
    const written = await tx
      .update(users)
      .set({ ...set, version: sql`${users.version} + 1` })
      .where(and(eq(users.id, userId), sql`${users.id} <> ${viewer.userId}`, isAdminNow(viewer)))
      .returning({ id: users.id });
    if (written.length === 0) return false;
    if (isSuspended) await tx.delete(sessions).where(eq(sessions.userId, userId));
    const fields = Object.keys(set);
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'user', objectId: userId, fields }); // prettier-ignore
    return true;
  });
}

interface FailedJob extends Record<string, unknown> {
  id: string;
  queue: string;
  state: string;
  retries: number;
  createdAt: string;
}

/** Letters that were refused, or have waited an hour, and jobs that failed: never what a letter says. Null where the viewer is no admin. */
export async function listTroubles(viewer: Viewer) {
  if (!(await mayAdminister(viewer))) return null;
  const letters = await db()
    .select({
      id: mails.id,
      kind: mails.kind,
      messageId: mails.messageId,
      createdAt: mails.createdAt,
      isRefused: sql<boolean>`${mails.failedAt} is not null`,
    })
    .from(mails)
    .where(
      and(
        isAdminNow(viewer),
        isNull(mails.sentAt),
        or(isNotNull(mails.failedAt), sql`${mails.createdAt} < now() - interval '1 hour'`),
      ),
    )
    .orderBy(desc(mails.id))
    .limit(PAGE);
  const jobs = await db().execute<FailedJob>(sql`
    select id, name as queue, state, retry_count as retries, created_on as "createdAt" from pgboss.job
    where ${isAdminNow(viewer)} and (state = 'failed' or (state = 'retry' and retry_count > 2))
    order by created_on desc limit ${PAGE}`);
  return { letters, jobs: [...jobs] };
}
export type TroublesDto = NonNullable<Awaited<ReturnType<typeof listTroubles>>>;

export interface AuditFilter {
  actorId?: string | undefined;
  verb?: string | undefined;
  objectKind?: string | undefined;
  before?: number | undefined;
}

/** Who did what to which thing, newest first: ids and names of fields. Null where the viewer is no admin. */
export async function listAudit(viewer: Viewer, { actorId, verb, objectKind, before }: AuditFilter) {
  if (!(await mayAdminister(viewer))) return null;
  return db()
    .select()
    .from(audit)
    .where(
      and(
        isAdminNow(viewer),
        actorId === undefined ? undefined : eq(audit.actorId, actorId),
        verb === undefined ? undefined : eq(audit.verb, verb),
        objectKind === undefined ? undefined : eq(audit.objectKind, objectKind),
        before === undefined ? undefined : lt(audit.id, before),
      ),
    )
    .orderBy(desc(audit.id))
    .limit(PAGE);
}
export type AuditDto = NonNullable<Awaited<ReturnType<typeof listAudit>>>[number];
