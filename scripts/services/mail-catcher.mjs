import { randomUUID } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

/** Takes every message sent to it and keeps it as one JSON file; the local application shows them as a mailbox. */
export function startMailCatcher({ port, folder }) {
  mkdirSync(folder, { recursive: true });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    onData(stream, _session, done) {
      keep(stream, folder).then(() => done(), done);
    },
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}

async function keep(stream, folder) {
  const mail = await simpleParser(stream);
  const addresses = (field) =>
    [field ?? []].flat().flatMap(({ value }) => value.map(({ address }) => address));
  const id = `${Date.now()}-${randomUUID()}`;
  const message = {
    id,
    messageId: mail.messageId ?? '',
    from: addresses(mail.from)[0] ?? '',
    to: addresses(mail.to),
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || '',
    receivedAt: new Date().toISOString(),
  };
  // Written aside and renamed: a reader never sees half a message.
  await writeFile(join(folder, `.${id}`), JSON.stringify(message));
  await rename(join(folder, `.${id}`), join(folder, `${id}.json`));
}

if (process.env.MAIL_PORT)
  await startMailCatcher({ port: Number(process.env.MAIL_PORT), folder: process.env.MAIL_CATCHER_DIR });
