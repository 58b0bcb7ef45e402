import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { afterAll, beforeAll, expect, it, vi } from 'vitest';
import { signUp } from '@/db/queries/accounts';
import { databaseOfFile } from '../support/database';
import { SmtpHost } from '../support/smtp-host';

const database = databaseOfFile();
const host = new SmtpHost();
let worker: ChildProcess | undefined;

/** As it is started in production: its own process, under the role that serves people. */
function startWorker(): ChildProcess {
  return spawn(process.execPath, ['--conditions=react-server', '--import', 'tsx', 'lib/jobs/worker.ts'], {
    stdio: 'ignore',
    env: { ...process.env, NODE_ENV: 'production' },
  });
}
const endNow = async (child: ChildProcess) => {
  const ended = once(child, 'exit');
  child.kill('SIGKILL');
  await ended;
};
const arrives = (email: string) =>
  vi.waitFor(() => expect(host.to(email)).toHaveLength(1), { timeout: 15_000, interval: 100 });
const write = (email: string) => signUp({ email, displayName: 'Ann', passwordHash: 'x' });

beforeAll(async () => {
  await host.up();
  process.env.SMTP_URL = `smtp://127.0.0.1:${host.port}`;
});
afterAll(async () => {
  if (worker) await endNow(worker);
  await host.down();
});

it('sends each letter once: those written before it ran, while it runs, and while it was killed', async () => {
  await write('before@example.org');
  worker = startWorker();
  await arrives('before@example.org');
  await write('during@example.org');
  await arrives('during@example.org');
  await vi.waitFor(async () =>
    expect(await database.owner`select 1 from mails where sent_at is null`).toHaveLength(0),
  );
  await endNow(worker);
  await write('after@example.org');
  worker = startWorker();
  await arrives('after@example.org');
  const ids = host.caught.map(({ parsed }) => parsed.messageId);
  expect(new Set(ids).size).toBe(3);
  expect(ids).toHaveLength(3);
}, 45_000);

it('keeps a letter for the next try when the mail host is down', async () => {
  await host.down();
  await write('down@example.org');
  const waiting = () =>
    database.owner`select 1 from pgboss.job j join mails m on m.id::text = j.data->>'mailId'
      where m.to_email = 'down@example.org' and j.state = 'retry'`;
  await vi.waitFor(async () => expect(await waiting()).toHaveLength(1), { timeout: 15_000, interval: 100 });
  await host.up();
  await database.owner`update pgboss.job set start_after = now() where state = 'retry'`; // half a minute later
  await arrives('down@example.org');
}, 45_000);

it('stops when it is told to, and lets go of the database', async () => {
  const child = worker;
  if (!child) throw new Error('no worker is running');
  const ended = once(child, 'exit');
  child.kill('SIGTERM');
  expect(await ended).toEqual([0, null]);
  worker = undefined;
}, 20_000);
