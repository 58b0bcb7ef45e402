import { beforeEach, describe, expect, it, vi } from 'vitest';
import { sendReset } from '@/app/(auth)/forgot/actions';
import { signIn } from '@/app/(auth)/sign-in/actions';
import { signUp } from '@/app/(auth)/sign-up/actions';
import { confirmAddress } from '@/app/(auth)/verify/actions';
import { takePoint } from '@/lib/limits/limit';
import { databaseOfFile } from '../support/database';
import { lettersTo } from '../support/letters';
import { formOf, newBrowser, outcomeOf } from '../support/next-request';

vi.mock('next/headers', () => import('../support/next-request'));
vi.mock('next/navigation', () => import('../support/next-request'));

const database = databaseOfFile();
const PASSWORD = 'three green words';
const WAIT = { message: expect.stringContaining('tried too often') };
const enter = (email: string, password: string) =>
  outcomeOf(signIn({}, formOf({ email, password, next: '/journals' })));

async function account(email: string): Promise<void> {
  newBrowser();
  await outcomeOf(signUp({}, formOf({ displayName: 'Ann', email, password: PASSWORD })));
  const token = (await lettersTo(database, email)).at(-1)?.secret ?? '';
  await outcomeOf(confirmAddress({}, formOf({ token })));
  newBrowser();
}

beforeEach(async () => {
  await database.owner`delete from rate_limits`;
  newBrowser();
});

describe('signing in', () => {
  it('is refused from the sixth try for one account, from wherever it comes, the right password too', async () => {
    await account('one@example.org');
    for (let i = 0; i < 5; i += 1) {
      newBrowser({ 'x-ruckle-client': `203.0.113.${i}` });
      expect(await enter('one@example.org', 'wrong password')).not.toMatchObject(WAIT);
    }
    newBrowser({ 'x-ruckle-client': '203.0.113.99' });
    expect(await enter('one@example.org', PASSWORD)).toMatchObject(WAIT);
  });

  it('is refused from the sixth try of one address, whichever accounts it names and whatever it forwards', async () => {
    for (let i = 0; i < 5; i += 1) {
      newBrowser({ 'x-forwarded-for': `10.0.0.${i}`, 'x-real-ip': `10.0.0.${i}`, forwarded: `for=10.0.0.${i}`, 'cf-connecting-ip': `10.0.0.${i}` }); // prettier-ignore
      expect(await enter(`nobody${i}@example.org`, 'wrong password')).not.toMatchObject(WAIT);
    }
    newBrowser({ 'x-forwarded-for': '10.0.0.77' });
    expect(await enter('nobody77@example.org', 'wrong password')).toMatchObject(WAIT);
  });

  it('counts a whole IPv6 line as one address', async () => {
    for (let i = 0; i < 5; i += 1) {
      newBrowser({ 'x-ruckle-client': `2001:db8:1:2::${i}` });
      await enter(`nobody${i}@example.org`, 'wrong password');
    }
    newBrowser({ 'x-ruckle-client': '2001:db8:1:2:ffff::1' });
    expect(await enter('nobody9@example.org', 'wrong password')).toMatchObject(WAIT);
    newBrowser({ 'x-ruckle-client': '2001:db8:1:3::1' });
    expect(await enter('nobody9@example.org', 'wrong password')).not.toMatchObject(WAIT);
  });

  it('is not used up by people who sign in rightly, nor bought back by them for tries at others', async () => {
    await account('two@example.org');
    for (let i = 0; i < 8; i += 1)
      expect(await enter('two@example.org', PASSWORD)).toEqual({ to: '/journals' });
    for (let i = 0; i < 5; i += 1) {
      await enter(`victim${i}@example.org`, 'wrong password');
      if (i < 4) await enter('two@example.org', PASSWORD);
    }
    expect(await enter('victim9@example.org', 'wrong password')).toMatchObject(WAIT);
  });

  it('is counted in the database: a new process knows what the last one counted, for 15 minutes', async () => {
    for (let i = 0; i < 5; i += 1) await enter('three@example.org', 'wrong password');
    vi.resetModules();
    const { signIn: again } = await import('@/app/(auth)/sign-in/actions');
    newBrowser({ 'x-ruckle-client': '203.0.113.5' });
    expect(await outcomeOf(again({}, formOf({ email: 'three@example.org', password: 'x' })))).toMatchObject(
      WAIT,
    );
    const rows =
      await database.owner`select max(expire) - now() < interval '15 minutes' as soon from rate_limits`;
    expect(rows).toEqual([{ soon: true }]);
    await database.owner`update rate_limits set expire = now() - interval '1 second'`;
    expect(
      await outcomeOf(again({}, formOf({ email: 'three@example.org', password: 'x' }))),
    ).not.toMatchObject(WAIT);
  });

  it('keeps neither e-mail nor client address in its counters', async () => {
    await enter('four@example.org', 'wrong password');
    const rows = await database.owner`select key from rate_limits`;
    expect(rows.length).toBeGreaterThan(1);
    expect(JSON.stringify(rows)).not.toMatch(/four|192\.0\.2/);
  });
});

describe('letters', () => {
  it('go to one mailbox three times an hour, whether it has an account or not', async () => {
    await account('five@example.org');
    await database.owner`delete from rate_limits`;
    for (const email of ['five@example.org', 'nobody@example.org']) {
      const before = (await lettersTo(database, email)).length;
      for (let i = 0; i < 3; i += 1)
        expect(await outcomeOf(sendReset({}, formOf({ email })))).toMatchObject({ isDone: true });
      expect(await outcomeOf(sendReset({}, formOf({ email })))).toMatchObject(WAIT);
      expect((await lettersTo(database, email)).length - before).toBe(email.startsWith('five') ? 3 : 0);
    }
  });

  it('do not go out to ever new mailboxes from one address', async () => {
    for (let i = 0; i < 60; i += 1) await takePoint('mail-from', ['address 192.0.2.1']);
    expect(await outcomeOf(sendReset({}, formOf({ email: 'stranger@example.org' })))).toMatchObject(WAIT);
    newBrowser({ 'x-ruckle-client': '192.0.2.2' });
    expect(await outcomeOf(sendReset({}, formOf({ email: 'stranger@example.org' })))).toMatchObject({
      isDone: true,
    });
  });
});

it('lets 60 uploads an hour pass and says how long to wait at the next', async () => {
  const answers: (number | null)[] = [];
  for (let i = 0; i < 61; i += 1) answers.push(await takePoint('upload', ['user x']));
  expect(answers.slice(0, 60).every((answer) => answer === null)).toBe(true);
  expect(answers[60]).toBeGreaterThan(3000);
  expect(answers[60]).toBeLessThanOrEqual(3600);
});

it('lets no more than five through when forty tries come at once', async () => {
  const answers = await Promise.all(Array.from({ length: 40 }, () => takePoint('sign-in', ['account rush'])));
  expect(answers.filter((answer) => answer === null)).toHaveLength(5);
});
