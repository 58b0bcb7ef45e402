import type { Sql } from 'postgres';
import { LINK_SECRET } from '@/lib/mail/compose';

interface Letter {
  id: string;
  subject: string;
  kind: string;
  messageId: string;
  text: string;
  /** Made as the worker makes it when the letter goes out; null for a letter without a link of one use. */
  secret: string | null;
}

/** The letters written to an address that wait to be sent, oldest first. */
export async function lettersTo(database: { owner: Sql }, email: string): Promise<Letter[]> {
  const { findUnsentMail, issueLinkSecret } = await import('@/db/queries/mails');
  const rows = await database.owner<{ id: string }[]>`
    select id from mails where to_email = ${email} order by id`;
  const letters = await Promise.all(
    rows.map(async ({ id }) => {
      const mail = await findUnsentMail(id);
      if (!mail) return [];
      const link = mail.textBody.includes(LINK_SECRET) ? await issueLinkSecret(mail) : 'void';
      const secret = link === 'void' ? null : link.secret;
      const { subject, kind, messageId, textBody: text } = mail;
      return [{ id, subject, kind, messageId, text, secret }];
    }),
  );
  return letters.flat();
}
