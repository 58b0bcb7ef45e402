import 'server-only';
import { createTransport, type Transporter } from 'nodemailer';
import { findUnsentMail, markMailSent } from '@/db/queries/mails';
import { env } from '@/lib/env';

let transport: Transporter | undefined;

/** Sends one letter. It is marked only once the host has taken it: a crash in between sends the same Message-ID again, never another. */
export async function sendMail(mailId: string): Promise<void> {
  const mail = await findUnsentMail(mailId);
  if (!mail) return;
  transport ??= createTransport({ url: env().SMTP_URL, connectionTimeout: 10_000, socketTimeout: 20_000 });
  await transport.sendMail({
    from: env().MAIL_FROM,
    to: { name: '', address: mail.toEmail },
    subject: mail.subject,
    text: mail.textBody,
    html: mail.htmlBody,
    messageId: mail.messageId,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  await markMailSent(mailId);
}
