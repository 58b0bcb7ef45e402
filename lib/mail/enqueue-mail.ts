import 'server-only';
import { v7 } from 'uuid';
import type { Executor } from '@/db/client';
import { mails } from '@/db/schema/mails';
import { env } from '@/lib/env';
import { enqueue } from '@/lib/jobs/enqueue';
import type { MailBody } from './compose';

/**
 * Writes the letter and the job that sends it into the transaction of the event. Its Message-ID is fixed here, once and for all tries.
 * @param grantId the invitation whose link the letter carries
 */
export async function enqueueMail(
  tx: Executor,
  to: { userId: string | null; email: string },
  kind: string,
  body: MailBody,
  grantId: string | null = null,
): Promise<void> {
  const id = v7();
  const messageId = `<${id}@${new URL(env().APP_ORIGIN).hostname}>`;
  await tx
    .insert(mails)
    .values({ id, kind, messageId, grantId, userId: to.userId, toEmail: to.email, ...body });
  await enqueue(tx, 'send-mail', { mailId: id });
}
