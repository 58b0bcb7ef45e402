import 'server-only';
import { and, eq, isNull, or, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { env } from '@/lib/env';
import { alreadyLetter, passwordChangedLetter, resetLetter, verifyLetter } from '@/lib/mail/compose';
import { enqueueMail } from '@/lib/mail/enqueue-mail';
import { db, type Executor } from '../client';
import { sessions } from '../schema/sessions';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import { consumeToken, voidTokens } from './tokens';

interface Account {
  userId: string;
  email: string;
}

const byEmail = (email: string) => and(eq(users.email, email), isNull(users.deletedAt));

async function sendVerification(tx: Executor, account: Account): Promise<void> {
  await voidTokens(tx, account.userId, 'verify-email');
  await enqueueMail(tx, account, 'verify-email', verifyLetter(env().APP_ORIGIN));
}

/** A new account, or a letter to the one that is there: whoever asks learns nothing of it. */
export async function signUp(input: {
  email: string;
  displayName: string;
  passwordHash: string;
}): Promise<void> {
  await db().transaction(async (tx) => {
    const [made] = await tx
      .insert(users)
      .values({ ...input, id: v7() })
      .onConflictDoNothing()
      .returning({ userId: users.id, email: users.email });
    if (made) {
      await recordAudit(tx, {
        actorId: made.userId,
        verb: 'create',
        objectKind: 'user',
        objectId: made.userId,
      });
      return sendVerification(tx, made);
    }
    const [had] = await tx
      .select({ userId: users.id, email: users.email, emailVerifiedAt: users.emailVerifiedAt })
      .from(users)
      .where(byEmail(input.email));
    if (!had) return;
    if (had.emailVerifiedAt) return enqueueMail(tx, had, 'already', alreadyLetter(env().APP_ORIGIN));
    // Never confirmed: whoever holds the address decides, so the newest password counts once the link is used.
    await tx
      .update(users)
      .set({ passwordHash: input.passwordHash, displayName: input.displayName })
      .where(eq(users.id, had.userId));
    return sendVerification(tx, had);
  });
}

/** With `isLeaving`, an account that was closed and may still be taken up again. */
export async function findForSignIn(email: string) {
  const [row] = await db()
    .select({
      userId: users.id,
      email: users.email,
      passwordHash: users.passwordHash,
      isVerified: sql<boolean>`${users.emailVerifiedAt} is not null`,
      isLeaving: sql<boolean>`${users.deletedAt} is not null`,
      isSuspended: sql<boolean>`${users.suspendedAt} is not null`,
    })
    .from(users)
    .where(
      and(
        eq(users.email, email),
        or(isNull(users.deletedAt), sql`${users.deletedAt} > now() - interval '14 days'`),
      ),
    );
  return row ?? null;
}

export async function resendVerification(account: Account): Promise<void> {
  await db().transaction((tx) => sendVerification(tx, account));
}

/** Whose address the link confirmed, and the password that stands; null when the link does not hold. */
export async function verifyEmail(secret: string): Promise<{ userId: string; passwordHash: string } | null> {
  return db().transaction(async (tx) => {
    const token = await consumeToken(tx, secret, 'verify-email');
    if (!token) return null;
    const [account] = await tx
      .update(users)
      .set({ emailVerifiedAt: sql`coalesce(${users.emailVerifiedAt}, now())` })
      .where(and(eq(users.id, token.userId), eq(users.email, token.email), isNull(users.deletedAt)))
      .returning({ userId: users.id, passwordHash: users.passwordHash });
    if (!account) return null;
    await recordAudit(tx, { actorId: token.userId, verb: 'update', objectKind: 'user', objectId: token.userId, fields: ['emailVerifiedAt'] }); // prettier-ignore
    return account;
  });
}

/** A letter to choose a new password, where there is such an account. */
export async function askForReset(email: string): Promise<void> {
  await db().transaction(async (tx) => {
    const [account] = await tx
      .select({ userId: users.id, email: users.email })
      .from(users)
      .where(byEmail(email));
    if (!account) return;
    await voidTokens(tx, account.userId, 'reset-password');
    await enqueueMail(tx, account, 'reset-password', resetLetter(env().APP_ORIGIN));
  });
}

/** Sets the new password, ends every session, and tells the owner. The link also proves the address. */
export async function resetPassword(secret: string, passwordHash: string): Promise<string | null> {
  return db().transaction(async (tx) => {
    const token = await consumeToken(tx, secret, 'reset-password');
    if (!token) return null;
    const { userId, email } = token;
    const rows = await tx
      .update(users)
      .set({
        passwordHash,
        emailVerifiedAt: sql`coalesce(${users.emailVerifiedAt}, now())`,
        version: sql`${users.version} + 1`,
      })
      .where(and(eq(users.id, userId), eq(users.email, email), isNull(users.deletedAt)))
      .returning({ id: users.id });
    if (rows.length === 0) return null;
    await tx.delete(sessions).where(eq(sessions.userId, userId));
    await enqueueMail(tx, { userId, email }, 'password-changed', passwordChangedLetter(env().APP_ORIGIN));
    await recordAudit(tx, {
      actorId: userId,
      verb: 'update',
      objectKind: 'user',
      objectId: userId,
      fields: ['passwordHash'],
    });
    return userId;
  });
}

export async function auditSession(userId: string, verb: 'sign-in' | 'sign-out'): Promise<void> {
  await recordAudit(db(), { actorId: userId, verb, objectKind: 'session', objectId: null });
}
