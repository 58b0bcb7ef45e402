import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import { db } from '../client';
import { mails } from '../schema/mails';

const COLUMNS = {
  messageId: mails.messageId,
  toEmail: mails.toEmail,
  subject: mails.subject,
  textBody: mails.textBody,
  htmlBody: mails.htmlBody,
};

/** For the worker: a letter that has not been handed over yet. */
export async function findUnsentMail(id: string) {
  const [mail] = await db()
    .select(COLUMNS)
    .from(mails)
    .where(and(eq(mails.id, id), isNull(mails.sentAt)));
  return mail ?? null;
}

/** Handed over: its links have done their work, so what it said is not kept. */
export async function markMailSent(id: string): Promise<void> {
  await db()
    .update(mails)
    .set({ sentAt: sql`now()`, textBody: '', htmlBody: '' })
    .where(eq(mails.id, id));
}
