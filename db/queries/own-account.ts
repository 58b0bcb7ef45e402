import 'server-only';
import { and, eq, isNull, or, sql } from 'drizzle-orm';
import { env } from '@/lib/env';
import { accountLeavingLetter, changeEmailLetter, emailChangedLetter, passwordChangedLetter } from '@/lib/mail/compose'; // prettier-ignore
import { enqueueMail } from '@/lib/mail/enqueue-mail';
import { db } from '../client';
import { grants } from '../schema/grants';
import { sessions } from '../schema/sessions';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import { consumeToken, voidTokens } from './tokens';
import type { Viewer } from './viewer';

const audited = (viewer: { userId: string }, verb: 'update' | 'delete' | 'restore', fields: string[]) => ({
  actorId: viewer.userId,
  verb,
  objectKind: 'user',
  objectId: viewer.userId,
  fields,
});

/** What the viewer's password is held against before anything about the account changes. */
export async function findPasswordHash(viewer: Viewer): Promise<string | null> {
  const [row] = await db()
    .select({ passwordHash: users.passwordHash })
    .from(users)
    .where(eq(users.id, viewer.userId));
  return row?.passwordHash ?? null;
}

/** Sets the new password, ends every session, and tells the owner. */
export async function changePassword(viewer: Viewer, passwordHash: string): Promise<void> {
  await db().transaction(async (tx) => {
    await tx
      .update(users)
      .set({ passwordHash, version: sql`${users.version} + 1` })
      .where(eq(users.id, viewer.userId));
    await voidTokens(tx, viewer.userId, 'reset-password');
    await tx.delete(sessions).where(eq(sessions.userId, viewer.userId));
    await enqueueMail(tx, viewer, 'password-changed', passwordChangedLetter(env().APP_ORIGIN));
    await recordAudit(tx, audited(viewer, 'update', ['passwordHash']));
  });
}

/** Writes to the new address; nothing changes until its link is used. To an address that has an account nothing is sent, and nothing is said of it. */
export async function askForEmailChange(viewer: Viewer, email: string): Promise<void> {
  await db().transaction(async (tx) => {
    const [taken] = await tx.select({ id: users.id }).from(users).where(eq(users.email, email));
    await voidTokens(tx, viewer.userId, 'change-email');
    if (taken) return;
    const to = { userId: viewer.userId, email };
    await enqueueMail(tx, to, 'change-email', changeEmailLetter(env().APP_ORIGIN));
  });
}

/**
 * The new address becomes the account's: every session ends, links to the old address are void, and the old address is told.
 * False when the link does not hold, or somebody else has signed up with that address meanwhile.
 */
export async function confirmEmailChange(secret: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const token = await consumeToken(tx, secret, 'change-email');
    if (!token) return false;
    const { userId, email } = token;
    const [before] = await tx
      .select({ email: users.email })
      .from(users)
      .where(and(eq(users.id, userId), isNull(users.deletedAt), isNull(users.suspendedAt)))
      .for('update');
    const [taken] = await tx.select({ id: users.id }).from(users).where(eq(users.email, email));
    if (!before || taken) return false;
    await tx
      .update(users)
      .set({ email, emailVerifiedAt: sql`now()`, version: sql`${users.version} + 1` })
      .where(eq(users.id, userId));
    await voidTokens(tx, userId, 'reset-password');
    await voidTokens(tx, userId, 'verify-email');
    await tx.delete(sessions).where(eq(sessions.userId, userId));
    const old = { userId, email: before.email };
    await enqueueMail(tx, old, 'email-changed', emailChangedLetter(env().APP_ORIGIN));
    await recordAudit(tx, audited({ userId }, 'update', ['email']));
    return true;
  });
}

/** Closes the account: nobody sees anything of it any more, and it is erased in 14 days. What it had opened to others stays closed. */
export async function leaveRuckle(viewer: Viewer): Promise<void> {
  await db().transaction(async (tx) => {
    await tx
      .update(users)
      .set({ deletedAt: sql`now()`, version: sql`${users.version} + 1` })
      .where(and(eq(users.id, viewer.userId), isNull(users.deletedAt)));
    await tx
      .update(grants)
      .set({ revokedAt: sql`now()`, revokedBy: viewer.userId, tokenHash: null })
      .where(
        and(
          or(eq(grants.grantedBy, viewer.userId), eq(grants.subjectUserId, viewer.userId)),
          isNull(grants.revokedAt),
        ),
      );
    await tx.delete(sessions).where(eq(sessions.userId, viewer.userId));
    await enqueueMail(tx, viewer, 'account-leaving', accountLeavingLetter(env().APP_ORIGIN));
    await recordAudit(tx, audited(viewer, 'delete', []));
  });
}

/** Signing in within the days of grace takes the account up again. */
export async function comeBack(userId: string): Promise<void> {
  await db().transaction(async (tx) => {
    const back = await tx
      .update(users)
      .set({ deletedAt: null, version: sql`${users.version} + 1` })
      .where(and(eq(users.id, userId), sql`${users.deletedAt} > now() - interval '14 days'`))
      .returning({ id: users.id });
    if (back.length > 0) await recordAudit(tx, audited({ userId }, 'restore', []));
  });
}
