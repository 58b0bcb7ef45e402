import { beforeEach, describe, expect, it, vi } from 'vitest';
import { confirmNewAddress } from '@/app/(auth)/new-address/actions';
import { signIn } from '@/app/(auth)/sign-in/actions';
import { askForAddress } from '@/app/(studio)/settings/address/actions';
import { closeAccount } from '@/app/(studio)/settings/leave/actions';
import { setPassword } from '@/app/(studio)/settings/password/actions';
import { findDesk } from '@/db/queries/desk';
import { findInvitation, listInvitations } from '@/db/queries/invitations';
import { endSessions, listSessions } from '@/db/queries/sessions';
import type { Viewer } from '@/db/queries/viewer';
import { hashPassword } from '@/lib/auth/password';
import { beginSession, viewerOfSecret } from '@/lib/auth/sessions';
import { databaseOfFile } from '../support/database';
import { lettersTo } from '../support/letters';
import { formOf, newBrowser, outcomeOf } from '../support/next-request';
import { makeRound, makeViewer } from '../support/people';
import { invitationTo, openTo } from '../support/sharing';

vi.mock('next/headers', () => import('../support/next-request'));
vi.mock('next/navigation', () => import('../support/next-request'));
// Of one request it is remembered who asks; these tests are many requests.
vi.mock('react', async (actual) => ({ ...(await actual<object>()), cache: (read: unknown) => read }));

const database = databaseOfFile();
const PASSWORD = 'three green words';
let jar: Map<string, string>;
let me: Viewer;
let elsewhere: string;

beforeEach(async () => {
  me = await makeViewer(database.owner, 'Ann');
  await database.owner`update users set password_hash = ${await hashPassword(PASSWORD)} where id = ${me.userId}`;
  jar = newBrowser({ 'x-ruckle-client': me.userId });
  jar.set('session', await beginSession(me.userId, 'here', new Date()));
  elsewhere = await beginSession(me.userId, 'elsewhere', new Date());
});

const isIn = async (secret: string | undefined) => secret !== undefined && (await viewerOfSecret(secret, new Date())) !== null; // prettier-ignore
const row = async () => (await database.owner`select email, password_hash, deleted_at from users where id = ${me.userId}`)[0]; // prettier-ignore

describe('a session that was left open', () => {
  it('changes nothing of an account without the password, and does not get to try many', async () => {
    const before = await row();
    const tries = [
      () => setPassword({}, formOf({ current: 'wrong', password: 'four other green words' })),
      () => askForAddress({}, formOf({ current: 'wrong', email: 'eve@example.org' })),
      () => closeAccount({}, formOf({ current: 'wrong' })),
    ];
    for (const attempt of tries)
      expect(await outcomeOf(attempt())).toMatchObject({ fields: { current: [expect.any(String)] } });
    for (let i = 0; i < 3; i++) await closeAccount({}, formOf({ current: 'wrong' }));
    expect(await closeAccount({}, formOf({ current: PASSWORD }))).toMatchObject({ message: expect.stringMatching(/minutes?/) }); // prettier-ignore
    expect(await row()).toEqual(before);
    expect(await lettersTo(database, 'eve@example.org')).toEqual([]);
  });
});

describe('changing the password', () => {
  it('ends every session, begins a new one here, and tells the owner', async () => {
    const before = jar.get('session');
    expect(await outcomeOf(setPassword({}, formOf({ current: PASSWORD, password: 'four other green words' })))).toEqual({ to: '/settings' }); // prettier-ignore
    expect([await isIn(before), await isIn(elsewhere), await isIn(jar.get('session'))]).toEqual([false, false, true]); // prettier-ignore
    expect((await lettersTo(database, me.email)).map(({ kind }) => kind)).toEqual(['password-changed']);
  });
});

describe('changing the address', () => {
  const ask = (email: string) => outcomeOf(askForAddress({}, formOf({ current: PASSWORD, email })));
  const confirm = (token: string) => outcomeOf(confirmNewAddress({}, formOf({ token })));

  it('waits for the new address, then ends every session, once, and tells the old one', async () => {
    const email = `new-${me.email}`;
    expect(await ask(email)).toMatchObject({ isDone: true });
    expect((await row())?.email).toBe(me.email);
    const [letter] = await lettersTo(database, email);
    expect(await confirm(letter?.secret ?? '')).toEqual({ to: '/sign-in?confirmed=1' });
    expect((await row())?.email).toBe(email);
    expect([await isIn(jar.get('session')), await isIn(elsewhere)]).toEqual([false, false]);
    expect((await lettersTo(database, me.email)).map(({ kind }) => kind)).toEqual(['email-changed']);
    expect(await confirm(letter?.secret ?? '')).toMatchObject({ message: expect.any(String) });
  });

  it('to one that has an account says the same, sends nothing and changes nothing', async () => {
    const other = await makeViewer(database.owner, 'Other');
    for (const email of [other.email, `free-${me.email}`])
      expect(await ask(email)).toEqual({ isDone: true, values: { email } });
    expect(await lettersTo(database, other.email)).toEqual([]);
  });

  it('fails where somebody else signed up with it meanwhile', async () => {
    const email = `late-${me.email}`;
    await ask(email);
    const [letter] = await lettersTo(database, email);
    const late = await makeViewer(database.owner, 'Late');
    await database.owner`update users set email = ${email} where id = ${late.userId}`;
    expect(await confirm(letter?.secret ?? '')).toMatchObject({ message: expect.any(String) });
    expect((await row())?.email).toBe(me.email);
  });

  it('brings the invitations of the new address and leaves those of the old', async () => {
    const ada = await makeViewer(database.owner, 'Ada');
    const { journalId } = await makeRound(database.owner, ada);
    const email = `moved-${me.email}`;
    await invitationTo(ada, { journalId }, me);
    const invited = await invitationTo(ada, { journalId }, { ...me, email });
    await ask(email);
    const letters = await lettersTo(database, email);
    await confirm(letters.find(({ kind }) => kind === 'change-email')?.secret ?? '');
    expect((await listInvitations({ ...me, email })).map(({ id }) => id)).toEqual([invited]);
  });
});

describe('sessions', () => {
  it('are listed without what the table knows them by, and end one by one or all but this', async () => {
    const here = jar.get('session') ?? '';
    const listed = await listSessions(me, here);
    expect(listed.map(({ userAgent, isThis }) => [userAgent, isThis]).sort()).toEqual([['elsewhere', false], ['here', true]]); // prettier-ignore
    const ids = (await database.owner<{ id: string }[]>`select id from sessions`).map(({ id }) => id);
    expect(ids.some((id) => JSON.stringify(listed).includes(id))).toBe(false);
    const one = listed.find(({ isThis }) => !isThis)?.handle ?? '';
    const other = await makeViewer(database.owner, 'Other');
    expect(await endSessions(other, '', one)).toBe(false);
    expect(await endSessions(me, here, one)).toBe(true);
    await beginSession(me.userId, 'third', new Date());
    expect(await endSessions(me, here, 'others')).toBe(true);
    expect((await listSessions(me, here)).map(({ isThis }) => isThis)).toEqual([true]);
    expect(await endSessions(me, here, 'others')).toBe(false);
  });
});

describe('closing the account', () => {
  it('ends sessions and everything it had opened at once; signing in again takes it up, and what was opened stays closed', async () => {
    const friend = await makeViewer(database.owner, 'Friend');
    const { journalId } = await makeRound(database.owner, me);
    await openTo(me, { journalId }, friend);
    expect(await outcomeOf(closeAccount({}, formOf({ current: PASSWORD })))).toEqual({ to: '/' });
    expect([await isIn(elsewhere), jar.get('session')]).toEqual([false, undefined]);
    expect(await findDesk(friend, journalId)).toBeNull();
    expect(await outcomeOf(signIn({}, formOf({ email: me.email, password: PASSWORD })))).toEqual({ to: '/journals' }); // prettier-ignore
    expect((await row())?.deleted_at).toBeNull();
    expect([await findDesk(friend, journalId), (await findDesk(me, journalId)) !== null]).toEqual([null, true]); // prettier-ignore
  });

  it('cannot be undone once the days of grace are over', async () => {
    await outcomeOf(closeAccount({}, formOf({ current: PASSWORD })));
    await database.owner`update users set deleted_at = now() - interval '14 days 1 minute' where id = ${me.userId}`;
    expect(await outcomeOf(signIn({}, formOf({ email: me.email, password: PASSWORD })))).toMatchObject({ message: expect.any(String) }); // prettier-ignore
    expect(await isIn(jar.get('session'))).toBe(false);
  });
});

it('a link that was never given out opens nothing', async () => {
  expect(await findInvitation('')).toBeNull();
});
