import { beforeEach, describe, expect, it, vi } from 'vitest';
import { sendReset } from '@/app/(auth)/forgot/actions';
import { choosePassword } from '@/app/(auth)/reset/actions';
import { signIn } from '@/app/(auth)/sign-in/actions';
import { signUp } from '@/app/(auth)/sign-up/actions';
import { confirmAddress } from '@/app/(auth)/verify/actions';
import { signOut } from '@/app/(studio)/settings/actions';
import { currentViewer } from '@/lib/auth/viewer';
import { databaseOfFile } from '../support/database';
import { lettersTo } from '../support/letters';
import { formOf, newBrowser, outcomeOf } from '../support/next-request';

vi.mock('next/headers', () => import('../support/next-request'));
vi.mock('next/navigation', () => import('../support/next-request'));

const database = databaseOfFile();
const PASSWORD = 'three green words';
let number = 0;
const freshAddress = () => `person${(number += 1)}@example.org`;

/** A client address of its own for each test: the limits of one do not reach into another. */
const browser = () => newBrowser({ 'x-ruckle-client': `192.0.2.${(number % 250) + 1}` });

const ask = (email: string, password = PASSWORD) =>
  outcomeOf(signUp({}, formOf({ displayName: 'Ann', email, password })));
const enter = (email: string, password = PASSWORD, next = '/journals') =>
  outcomeOf(signIn({}, formOf({ email, password, next })));
const confirm = (token: string) => outcomeOf(confirmAddress({}, formOf({ token })));
const linkTo = async (email: string) => (await lettersTo(database, email)).at(-1)?.secret ?? '';

async function account(): Promise<string> {
  const email = freshAddress();
  browser();
  await ask(email);
  await confirm(await linkTo(email));
  browser();
  return email;
}

beforeEach(() => void browser());

describe('sign-up', () => {
  it('opens an account by a link that is used by POST, in the browser that asked, and signs in', async () => {
    const email = freshAddress();
    expect(await ask(email)).toMatchObject({ isDone: true });
    expect(await enter(email)).toMatchObject({ message: expect.stringContaining('not confirmed yet') });
    expect(await currentViewer()).toBeNull();
    expect(await confirm(await linkTo(email))).toEqual({ to: '/journals' });
    expect(await currentViewer()).toMatchObject({ email, displayName: 'Ann', isAdmin: false });
  });

  it('answers a known address and an unknown one alike, and tells the owner by letter', async () => {
    const known = await account();
    const [toKnown, toUnknown] = [await ask(known), await ask(freshAddress())];
    expect({ ...toKnown, values: null }).toEqual({ ...toUnknown, values: null });
    const letters = await lettersTo(database, known);
    expect(letters.at(-1)?.subject).toBe('You already have a Ruckle account');
    expect(await enter(known)).toEqual({ to: '/journals' });
  });

  it('does not let a stranger set the password of an account that somebody else confirms', async () => {
    const email = freshAddress();
    await ask(email, 'the owner chose this');
    newBrowser({ 'x-ruckle-client': '198.51.100.7' });
    await ask(email, 'a stranger chose this');
    browser();
    expect(await confirm(await linkTo(email))).toEqual({ to: '/sign-in?confirmed=1' });
    expect(await currentViewer()).toBeNull();
  });

  it('refuses short, common, overlong and address-bearing passwords, and never hands one back', async () => {
    const email = 'margaret@example.org';
    for (const password of ['short', 'passwordpassword', 'ü'.repeat(101), 'margaret is my name']) {
      const answer = await ask(email, password);
      expect(answer).toMatchObject({ fields: { password: [expect.any(String)] } });
      expect(JSON.stringify(answer)).not.toContain(password);
    }
  });

  it('refuses addresses that would add a header to a letter', async () => {
    const corpus = [
      'a@example.org\r\nBcc: b@example.org',
      'a@example.org\nSubject: x',
      'a@example.org,b@example.org',
      '"a\r\n"@example.org',
      'a@example.org%0aBcc:b@example.org',
      'Ann <a@example.org>',
      'a@example.org\u0000',
      'a\u2028@example.org',
    ];
    for (const email of corpus)
      expect(await ask(email)).toMatchObject({ fields: { email: [expect.any(String)] } });
    const [{ count } = { count: -1 }] = await database.owner`
      select count(*)::int from users where email ~ '[[:cntrl:],<>%]'`;
    expect(count).toBe(0);
  });
});

describe('links', () => {
  it('hold once, also when two presses come at the same time', async () => {
    const email = freshAddress();
    await ask(email);
    const secret = await linkTo(email);
    const answers = await Promise.all([confirm(secret), confirm(secret)]);
    expect(answers.filter((answer) => 'to' in answer)).toHaveLength(1);
    expect(await confirm(secret)).toMatchObject({ message: expect.stringContaining('used already') });
  });

  it('run out after 24 hours, and for a new password after 30 minutes', async () => {
    const email = await account();
    await outcomeOf(sendReset({}, formOf({ email })));
    await linkTo(email);
    const rows = await database.owner`
      select kind, extract(epoch from expires_at - created_at)::int / 60 as minutes from tokens order by created_at`;
    expect(rows.filter(({ kind }) => kind === 'verify-email').every(({ minutes }) => minutes === 1440)).toBe(
      true,
    );
    expect(rows.filter(({ kind }) => kind === 'reset-password').map(({ minutes }) => minutes)).toEqual([30]);
    const late = freshAddress();
    await ask(late);
    const secret = await linkTo(late);
    await database.owner`update tokens set expires_at = now() - interval '1 second' where email = ${late}`;
    expect(await confirm(secret)).toMatchObject({ message: expect.any(String) });
  });

  it('are void for the other purpose, and once the address has changed', async () => {
    const email = freshAddress();
    await ask(email);
    const secret = await linkTo(email);
    const reset = await outcomeOf(
      choosePassword({}, formOf({ token: secret, password: 'another set of words' })),
    );
    expect(reset).toMatchObject({ message: expect.any(String) });
    await database.owner`update users set email = ${`moved-${email}`} where email = ${email}`;
    expect(await confirm(secret)).toMatchObject({ message: expect.any(String) });
  });
});

describe('a new password', () => {
  it('ends every session, lets only the new one in, and is told by letter', async () => {
    const email = await account();
    await enter(email);
    const other = [...newBrowser().entries()];
    expect(other).toEqual([]);
    await enter(email);
    await outcomeOf(sendReset({}, formOf({ email })));
    const token = await linkTo(email);
    browser();
    expect(await outcomeOf(choosePassword({}, formOf({ token, password: 'another set of words' })))).toEqual({
      to: '/journals',
    });
    const sessions = await database.owner`
      select s.id from sessions s join users u on u.id = s.user_id where u.email = ${email}`;
    expect(sessions).toHaveLength(1);
    browser();
    expect(await enter(email, PASSWORD)).toMatchObject({
      message: expect.stringContaining('do not go together'),
    });
    expect(await enter(email, 'another set of words')).toEqual({ to: '/journals' });
    const letters = await lettersTo(database, email);
    expect(letters.at(-1)?.subject).toBe('Your Ruckle password was changed');
  });

  it('is offered alike for known and unknown addresses; an unknown one gets no letter', async () => {
    const known = await account();
    const unknown = freshAddress();
    const [a, b] = [
      await outcomeOf(sendReset({}, formOf({ email: known }))),
      await outcomeOf(sendReset({}, formOf({ email: unknown }))),
    ];
    expect({ ...a, values: null }).toEqual({ ...b, values: null });
    expect(await lettersTo(database, unknown)).toEqual([]);
  });
});

describe('signing in and out', () => {
  it('says the same of a wrong password and of an unknown address', async () => {
    const known = await account();
    const [wrong, unknown] = [
      await enter(known, 'not the password'),
      await enter(freshAddress(), 'not the password'),
    ];
    expect({ ...wrong, values: null }).toEqual({ ...unknown, values: null });
  });

  it('goes on only to paths of our own', async () => {
    const email = await account();
    expect(await enter(email, PASSWORD, '/journals/new?wearer=1')).toEqual({ to: '/journals/new?wearer=1' });
    for (const next of [
      '//elsewhere.invalid',
      'https://elsewhere.invalid',
      '/a/..//elsewhere.invalid',
      '/\\elsewhere.invalid',
    ])
      expect(await enter(email, PASSWORD, next)).toEqual({ to: '/journals' });
  });

  it('ends this session on signing out, and no other', async () => {
    const email = await account();
    await enter(email);
    expect(await currentViewer()).not.toBeNull();
    expect(await outcomeOf(signOut({}, formOf({})))).toEqual({ to: '/' });
    expect(await currentViewer()).toBeNull();
    expect(
      await database.owner`select 1 from sessions s join users u on u.id = s.user_id where u.email = ${email}`,
    ).toHaveLength(1);
  });

  it('refuses a suspended account, and ends the sessions it has at their next request', async () => {
    const email = await account();
    await enter(email);
    await database.owner`update users set suspended_at = now() where email = ${email}`;
    expect(await currentViewer()).toBeNull();
    expect(await enter(email)).toMatchObject({ message: expect.stringContaining('closed') });
  });

  it('takes no form from another site', async () => {
    const email = await account();
    const foreign: Record<string, string>[] = [
      { origin: 'https://elsewhere.invalid', 'sec-fetch-site': 'cross-site' },
      { origin: 'null', 'sec-fetch-site': 'same-origin' },
      { origin: 'http://127.0.0.1:4321', 'sec-fetch-site': 'same-site' },
    ];
    for (const headers of foreign) {
      newBrowser(headers);
      expect(await enter(email)).toMatchObject({
        message: expect.stringContaining('did not come from Ruckle'),
      });
    }
  });

  it('changes nothing for twenty fields more than the form has', async () => {
    const email = freshAddress();
    const extra = ['isAdmin', 'is_admin', 'isFitter', 'isPatternMaker', 'emailVerifiedAt', 'suspendedAt', 'deletedAt', 'id', 'userId', 'version', 'createdAt', 'passwordHash', 'unit', 'words', 'hidesMeasurements', '__proto__', 'constructor', 'role', 'verified', 'next']; // prettier-ignore
    const form = formOf({ displayName: 'Ann', email, password: PASSWORD });
    for (const name of extra) form.set(name, '1');
    await outcomeOf(signUp({}, form));
    const [row] = await database.owner`select * from users where email = ${email}`;
    expect(row).toMatchObject({
      is_admin: false, is_fitter: false, is_pattern_maker: false, email_verified_at: null, suspended_at: null,
      deleted_at: null, version: 1, unit: 'cm', words: 'uk', hides_measurements: false, display_name: 'Ann',
    }); // prettier-ignore
    expect(row?.password_hash).toMatch(/^\$argon2id\$/);
  });
});
