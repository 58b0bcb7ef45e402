import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import { hashSecret, makeSecret } from '@/lib/auth/secret';
import { db } from '../client';
import { grants } from '../schema/grants';
import { mails } from '../schema/mails';
import { isLive } from './sharing';
import { issueToken, isTokenKind } from './tokens';

const COLUMNS = {
  userId: mails.userId,
  kind: mails.kind,
  grantId: mails.grantId,
  messageId: mails.messageId,
  toEmail: mails.toEmail,
  subject: mails.subject,
  textBody: mails.textBody,
  htmlBody: mails.htmlBody,
};

/** For the worker: a letter that has not been handed over yet, and was not refused for good. */
export async function findUnsentMail(id: string) {
  const [mail] = await db()
    .select(COLUMNS)
    .from(mails)
    .where(and(eq(mails.id, id), isNull(mails.sentAt), isNull(mails.failedAt)));
  return mail ?? null;
}
export type UnsentMail = NonNullable<Awaited<ReturnType<typeof findUnsentMail>>>;

/**
 * The secret of the link in a letter that is about to go out; null for a letter without one, `void` where what it leads to has
 * ended while it waited.
 */
export async function issueLinkSecret(mail: UnsentMail): Promise<{ secret: string | null } | 'void'> {
  if (mail.grantId) return issueInvitationSecret(mail.grantId);
  if (!isTokenKind(mail.kind) || !mail.userId) return { secret: null };
  return { secret: await issueToken(db(), mail.userId, mail.kind, mail.toEmail) };
}

/** A copy sent twice after a crash carries a newer link; the invitation is found by signing in with its address as well. */
async function issueInvitationSecret(grantId: string): Promise<{ secret: string } | 'void'> {
  const secret = makeSecret();
  const rows = await db()
    .update(grants)
    .set({ tokenHash: hashSecret(secret) })
    .where(and(eq(grants.id, grantId), isNull(grants.subjectUserId), isLive))
    .returning({ id: grants.id });
  return rows.length > 0 ? { secret } : 'void';
}

/** The host will never take it, as for an address that is not there. */
export async function markMailRefused(id: string): Promise<void> {
  await db()
    .update(mails)
    .set({ failedAt: sql`now()`, textBody: '', htmlBody: '' })
    .where(eq(mails.id, id));
}

/** Handed over: what it said is not kept. */
export async function markMailSent(id: string): Promise<void> {
  await db()
    .update(mails)
    .set({ sentAt: sql`now()`, textBody: '', htmlBody: '' })
    .where(eq(mails.id, id));
}
