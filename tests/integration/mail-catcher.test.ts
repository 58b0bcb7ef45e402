import { once } from 'node:events';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { createConnection, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import type { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest';
import { startMailCatcher } from '@/scripts/services/mail-catcher.mjs';

let folder: string;
let catcher: SMTPServer;
let port: number;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ruckle mail '));
  catcher = (await startMailCatcher({ port: 0, folder })) as SMTPServer;
  port = (catcher.server.address() as AddressInfo).port;
});
beforeEach(async () => {
  for (const name of await readdir(folder)) await rm(join(folder, name));
});
afterAll(async () => {
  await new Promise<void>((resolve) => catcher.close(resolve));
  await rm(folder, { recursive: true });
});

const caught = async () =>
  Promise.all(
    (await readdir(folder))
      .sort()
      .map(async (name) => JSON.parse(await readFile(join(folder, name), 'utf8'))),
  );

it('keeps what was sent: addresses, subject and both bodies, letters beyond ASCII too', async () => {
  const transport = createTransport({ host: '127.0.0.1', port });
  const before = Date.now();
  await transport.sendMail({
    messageId: '<one@ruckle.invalid>',
    from: 'Ruckle <no-reply@ruckle.invalid>',
    to: ['Zoë <zoe@example.invalid>', 'b@example.invalid'],
    subject: 'Naïve ½ inch — ✂',
    text: 'A line with a very long address: http://127.0.0.1:3000/verify?token='.concat('x'.repeat(120)),
    html: '<p>½ in</p>',
  });
  const [mail, ...others] = await caught();
  expect(others).toEqual([]);
  const { id, receivedAt, text, html, ...rest } = mail;
  expect(rest).toEqual({
    messageId: '<one@ruckle.invalid>',
    from: 'no-reply@ruckle.invalid',
    to: ['zoe@example.invalid', 'b@example.invalid'],
    subject: 'Naïve ½ inch — ✂',
  });
  expect(text).toContain('x'.repeat(120));
  expect(html).toContain('½ in');
  expect(Date.parse(receivedAt)).toBeGreaterThanOrEqual(before);
  expect(id).toMatch(/^\d+-[\w-]+$/);
});

it('keeps every one of many that arrive at once, each whole', async () => {
  const transport = createTransport({ host: '127.0.0.1', port, pool: true, maxConnections: 8 });
  const subjects = Array.from({ length: 40 }, (_, i) => `letter ${i}`);
  await Promise.all(
    subjects.map((subject) =>
      transport.sendMail({
        from: 'a@example.invalid',
        to: 'b@example.invalid',
        subject,
        text: subject.repeat(500),
      }),
    ),
  );
  transport.close();
  const mails = await caught();
  expect(mails.map(({ subject }) => subject).sort()).toEqual([...subjects].sort());
  for (const { subject, text } of mails) expect(text.trim()).toBe(subject.repeat(500));
});

it('keeps nothing of a message that breaks off', async () => {
  const socket = createConnection(port, '127.0.0.1');
  const replies = socket[Symbol.asyncIterator]();
  await replies.next();
  for (const line of ['EHLO x', 'MAIL FROM:<a@example.invalid>', 'RCPT TO:<b@example.invalid>', 'DATA']) {
    socket.write(`${line}\r\n`);
    await replies.next();
  }
  socket.write('Subject: half\r\n\r\nhalf a mess');
  socket.destroy();
  await once(socket, 'close');
  await new Promise((resolve) => setTimeout(resolve, 300));
  expect(await readdir(folder)).toEqual([]);
});
