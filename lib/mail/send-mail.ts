import 'server-only';
import { createTransport, type Transporter } from 'nodemailer';
import {
  findUnsentMail,
  issueLinkSecret,
  markMailRefused,
  markMailSent,
  type UnsentMail,
} from '@/db/queries/mails';
import { env } from '@/lib/env';
import { LINK_SECRET } from './compose';

let transport: Transporter | undefined;

/** Whether there was still something to send: the link of an invitation that ended meanwhile leads nowhere. */
async function handOver(mail: UnsentMail): Promise<boolean> {
  transport ??= createTransport({ url: env().SMTP_URL, connectionTimeout: 10_000, socketTimeout: 20_000 });
  const link = await issueLinkSecret(mail);
  if (link === 'void') return false;
  const { secret } = link;
  const filled = (body: string) => (secret ? body.replaceAll(LINK_SECRET, secret) : body);
  await transport.sendMail({
    from: env().MAIL_FROM,
    to: { name: '', address: mail.toEmail },
    subject: mail.subject,
    text: filled(mail.textBody),
    html: filled(mail.htmlBody),
    messageId: mail.messageId,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return true;
}

/** A refusal for good (RFC 5321 4.2.1: 5yz), as against a host that is down or asks to come later. */
const isRefusal = (thrown: unknown): boolean =>
  thrown instanceof Error &&
  'responseCode' in thrown &&
  typeof thrown.responseCode === 'number' &&
  thrown.responseCode >= 500;

/**
 * Sends one letter. It is marked only once the host has taken it: a crash in between sends the same Message-ID again, never another.
 * @throws whatever kept it from being handed over just now; the job then tries again
 */
export async function sendMail(mailId: string): Promise<void> {
  const mail = await findUnsentMail(mailId);
  if (!mail) return;
  try {
    if (!(await handOver(mail))) return await markMailRefused(mailId);
  } catch (thrown) {
    if (!isRefusal(thrown)) throw thrown;
    return markMailRefused(mailId);
  }
  await markMailSent(mailId);
}
