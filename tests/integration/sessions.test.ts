import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { v7 } from 'uuid';
import { setCookie, formOf, newBrowser, outcomeOf } from '../support/next-request';
import { databaseOfFile } from '../support/database';
import { signIn } from '@/app/(auth)/sign-in/actions';
import { hashPassword } from '@/lib/auth/password';
import { beginSession, endAllSessions, endSession, viewerOfSecret } from '@/lib/auth/sessions';

vi.mock('next/headers', () => import('../support/next-request'));
vi.mock('next/navigation', () => import('../support/next-request'));

const database = databaseOfFile();
const DAY_MS = 86_400_000;
const START = new Date('2026-03-01T12:00:00Z');
const userId = v7();
const email = 'ann@example.org';
const PASSWORD = 'three green words';

const at = (days: number) => new Date(START.getTime() + days * DAY_MS);
/** Lucia reads the clock itself: it is set for it, and given to ours. */
function viewerOn(days: number, secret: string) {
  vi.setSystemTime(at(days));
  return viewerOfSecret(secret, at(days));
}
function beginOn(days: number) {
  vi.setSystemTime(at(days));
  return beginSession(userId, 'test', at(days));
}

beforeAll(async () => {
  const hash = await hashPassword(PASSWORD);
  await database.owner`
    insert into users (id, email, email_verified_at, display_name, password_hash) values (${userId}, ${email}, now(), 'Ann', ${hash})`;
  vi.useFakeTimers({ toFake: ['Date'] });
});
afterEach(() => endAllSessions(userId));

describe('a session', () => {
  it('ends after 14 days without a visit, not before', async () => {
    const secret = await beginOn(0);
    expect(await viewerOn(13.9, secret)).toMatchObject({ userId });
    const other = await beginOn(0);
    expect(await viewerOn(14.1, other)).toBeNull();
  });

  it('is kept by any visit, and ends after 60 days all the same', async () => {
    const secret = await beginOn(0);
    for (let day = 5; day < 60; day += 13) expect(await viewerOn(day, secret), `day ${day}`).not.toBeNull();
    expect(await viewerOn(59.9, secret)).not.toBeNull();
    expect(await viewerOn(60.1, secret)).toBeNull();
    expect(await database.owner`select 1 from sessions where user_id = ${userId}`).toHaveLength(0);
  });

  it('cannot be used from what the database holds', async () => {
    const secret = await beginOn(0);
    const rows = await database.owner<
      Record<string, unknown>[]
    >`select * from sessions where user_id = ${userId}`;
    expect(JSON.stringify(rows)).not.toContain(secret);
    const tried = rows.flatMap((row) => Object.values(row).filter((value) => typeof value === 'string'));
    for (const value of tried) expect(await viewerOn(0.1, value)).toBeNull();
    expect(await viewerOn(0.1, secret)).not.toBeNull();
  });

  it('is one of many: ending one leaves the others, ending all leaves none', async () => {
    const [one, two] = [await beginOn(0), await beginOn(0)];
    await endSession(one);
    expect(await viewerOn(1, one)).toBeNull();
    expect(await viewerOn(1, two)).not.toBeNull();
    await endAllSessions(userId);
    expect(await viewerOn(1, two)).toBeNull();
  });

  it('gives exactly what a viewer is, and never the password', async () => {
    const viewer = await viewerOn(0.1, await beginOn(0));
    expect(Object.keys(viewer ?? {}).sort()).toEqual(
      ['displayName', 'email', 'hidesMeasurements', 'isAdmin', 'isFitter', 'isPatternMaker', 'unit', 'userId', 'words'],
    ); // prettier-ignore
  });
});

describe('signing in', () => {
  const enter = () => outcomeOf(signIn({}, formOf({ email, password: PASSWORD })));

  it('gives a new secret each time and ends the session that the browser brought', async () => {
    vi.setSystemTime(at(0));
    const jar = newBrowser();
    await enter();
    const first = jar.get('session') ?? '';
    await enter();
    const second = jar.get('session') ?? '';
    expect(second).not.toBe(first);
    expect(await viewerOn(0.1, first)).toBeNull();
    expect(await viewerOn(0.1, second)).not.toBeNull();
  });

  it('does not take over a session that was planted in the browser', async () => {
    const planted = 'a'.repeat(43);
    vi.setSystemTime(at(0));
    const jar = newBrowser();
    jar.set('session', planted);
    await enter();
    expect(jar.get('session')).not.toBe(planted);
    expect(await viewerOn(0.1, planted)).toBeNull();
  });

  it('sets a cookie that scripts and other sites do not get', async () => {
    setCookie.mockClear();
    newBrowser();
    await enter();
    const [name, value, options] = setCookie.mock.calls.at(-1) ?? [];
    expect(name).toBe('session');
    expect(value).toMatch(/^[A-Za-z0-9_-]{43}$/);
    expect(options).toEqual({
      httpOnly: true,
      sameSite: 'lax',
      secure: false,
      path: '/',
      maxAge: 60 * 86_400,
    });
  });
});
