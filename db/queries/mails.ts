import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import { db } from '../client';
import { mails } from '../schema/mails';
import { issueToken, isTokenKind } from './tokens';

const COLUMNS = {
  userId: mails.userId,
  kind: mails.kind,
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

/** The secret of the link in a letter that is about to go out; null for a letter without one. */
export async function issueLinkSecret(mail: UnsentMail): Promise<string | null> {
  if (!isTokenKind(mail.kind) || !mail.userId) return null;
  return issueToken(db(), mail.userId, mail.kind, mail.toEmail);
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
