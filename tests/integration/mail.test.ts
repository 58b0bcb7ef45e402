import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { db } from '@/db/client';
import { resendVerification, signUp, verifyEmail } from '@/db/queries/accounts';
import { verifyLetter } from '@/lib/mail/compose';
import { enqueueMail } from '@/lib/mail/enqueue-mail';
import { sendMail } from '@/lib/mail/send-mail';
import { databaseOfFile } from '../support/database';
import { SmtpHost } from '../support/smtp-host';

const database = databaseOfFile();
const host = new SmtpHost();
beforeAll(async () => {
  await host.up();
  process.env.SMTP_URL = `smtp://127.0.0.1:${host.port}`;
});
afterAll(() => host.down());

const mailsTo = (email: string) =>
  database.owner<
    { id: string; messageId: string; sentAt: Date | null; failedAt: Date | null; textBody: string }[]
  >`
    select id, message_id as "messageId", sent_at as "sentAt", failed_at as "failedAt", text_body as "textBody"
    from mails where to_email = ${email} order by id`;
const jobsOf = (mailId: string) =>
  database.owner`select retry_limit, retry_delay from pgboss.job where name = 'send-mail' and data->>'mailId' = ${mailId}`;

async function letterTo(email: string): Promise<string> {
  await signUp({ email, displayName: 'Ann', passwordHash: 'x' });
  const [mail] = await mailsTo(email);
  if (!mail) throw new Error('no letter was written');
  return mail.id;
}

describe('a letter', () => {
  it('is written with its event and its job in one transaction: an event that fails leaves neither', async () => {
    const id = await letterTo('one@example.org');
    expect(await jobsOf(id)).toHaveLength(1);
    const before =
      await database.owner`select (select count(*) from mails) as mails, (select count(*) from pgboss.job) as jobs`;
    const [user] = await database.owner<
      { id: string }[]
    >`select id from users where email = 'one@example.org'`;
    const failing = db().transaction(async (tx) => {
      await enqueueMail(
        tx,
        { userId: user?.id ?? '', email: 'one@example.org' },
        'verify-email',
        verifyLetter('http://x.invalid'),
      );
      throw new Error('the event failed');
    });
    await expect(failing).rejects.toThrow('the event failed');
    expect(
      await database.owner`select (select count(*) from mails) as mails, (select count(*) from pgboss.job) as jobs`,
    ).toEqual(before);
  });

  it('has one Message-ID however often it is tried, and goes out once', async () => {
    const id = await letterTo('two@example.org');
    await host.down();
    for (let i = 0; i < 3; i += 1) await expect(sendMail(id)).rejects.toThrow();
    await host.up();
    host.refusal = { responseCode: 451 };
    await expect(sendMail(id)).rejects.toThrow();
    host.refusal = null;
    await sendMail(id);
    await sendMail(id);
    const [mail] = await mailsTo('two@example.org');
    const sent = host.caught.filter(({ recipients }) => recipients.includes('two@example.org'));
    expect(sent.map(({ parsed }) => parsed.messageId)).toEqual([mail?.messageId]);
    expect(mail?.sentAt).not.toBeNull();
    expect(mail?.textBody).toBe('');
  });

  it('that was sent twice after a crash carries the same Message-ID; either link works, and one use ends both', async () => {
    const id = await letterTo('three@example.org');
    await sendMail(id);
    await database.owner`update mails set sent_at = null, text_body = ${verifyLetter('http://127.0.0.1:4321').textBody} where id = ${id}`;
    await sendMail(id);
    const copies = host.caught.filter(({ recipients }) => recipients.includes('three@example.org'));
    expect(new Set(copies.map(({ parsed }) => parsed.messageId)).size).toBe(1);
    const secrets = copies.map(({ parsed }) => /token=([\w-]{43})/.exec(parsed.text ?? '')?.[1] ?? '');
    expect(await verifyEmail(secrets[1] ?? '')).not.toBeNull();
    expect(await verifyEmail(secrets[0] ?? '')).toBeNull();
  });

  it('is tried for days while the host is down, and given up at once when it is refused for good', async () => {
    const id = await letterTo('four@example.org');
    const [job] = await jobsOf(id);
    expect(Number(job?.retry_limit) * Number(job?.retry_delay)).toBeGreaterThan(7 * 86_400);
    host.refusal = { responseCode: 550 };
    await sendMail(id);
    host.refusal = null;
    await sendMail(id);
    const [mail] = await mailsTo('four@example.org');
    expect(mail).toMatchObject({ sentAt: null, failedAt: expect.any(Date), textBody: '' });
    expect(host.caught.filter(({ recipients }) => recipients.includes('four@example.org'))).toEqual([]);
  });

  it('holds no usable link until it goes out, and its link afterwards stands nowhere in the database', async () => {
    const id = await letterTo('five@example.org');
    expect(await database.owner`select 1 from tokens where email = 'five@example.org'`).toHaveLength(0);
    await sendMail(id);
    const letter = host.caught.find(({ recipients }) => recipients.includes('five@example.org'));
    const secret = /token=([\w-]{43})/.exec(letter?.parsed.text ?? '')?.[1] ?? 'none';
    const dump = await database.owner`
      select (select json_agg(t) from tokens t) as tokens, (select json_agg(m) from mails m) as mails,
        (select json_agg(j) from pgboss.job j) as jobs, (select json_agg(s) from sessions s) as sessions`;
    expect(JSON.stringify(dump)).not.toContain(secret);
    expect(await verifyEmail(secret)).not.toBeNull();
  });

  it('makes the link before it void when asked for again', async () => {
    const first = await letterTo('six@example.org');
    await sendMail(first);
    const [user] = await database.owner<{ userId: string; email: string }[]>`
      select id as "userId", email from users where email = 'six@example.org'`;
    if (user) await resendVerification(user);
    const secret = /token=([\w-]{43})/.exec(host.caught.at(-1)?.parsed.text ?? '')?.[1] ?? '';
    expect(await verifyEmail(secret)).toBeNull();
  });

  const HOSTILE = ['a@example.org\r\nBcc: b@example.org', 'a@example.org\nX-Extra: 1', 'a@example.org, b@example.org', 'A <a@example.org>, b@example.org', 'x\r\n\r\nbody', 'x\u2028Bcc: b@example.org']; // prettier-ignore

  it('reaches nobody else, whatever stands in its address', async () => {
    for (const [i, hostile] of HOSTILE.entries()) {
      const id = await letterTo(`seven${i}@example.org`);
      await database.owner`update mails set to_email = ${hostile} where id = ${id}`;
      const before = host.caught.length;
      await sendMail(id).catch(() => undefined);
      expect(host.caught.slice(before).flatMap(({ recipients }) => recipients)).not.toContain(
        'b@example.org',
      );
    }
  });

  it('gains no header, whatever stands in its subject', async () => {
    for (const [i, hostile] of HOSTILE.entries()) {
      const id = await letterTo(`eight${i}@example.org`);
      await database.owner`update mails set subject = ${hostile} where id = ${id}`;
      await sendMail(id);
      const { parsed, recipients } = host.caught.at(-1) ?? {};
      expect(recipients).toEqual([`eight${i}@example.org`]);
      expect([...(parsed?.headers.keys() ?? [])].sort()).toEqual(['content-type', 'date', 'from', 'message-id', 'mime-version', 'subject', 'to']); // prettier-ignore
    }
  });
});
