import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { v7 } from 'uuid';
import { PATCH as patchJournal } from '@/app/api/journals/[journalId]/route';
import { PATCH as patchMe } from '@/app/api/me/route';
import { POST as postPattern } from '@/app/api/patterns/route';
import { POST as postWearer } from '@/app/api/wearers/route';
import { makeWorld, type World } from '../access/world';
import { databaseOfFile } from '../support/database';
import { newBrowser } from '../support/next-request';

vi.mock('next/headers', () => import('../support/next-request'));

const database = databaseOfFile();
let world: World;

const ORIGIN = 'http://127.0.0.1:4321';
type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
async function send(handler: Handler, body: unknown, { method = 'POST', params = {}, headers = {} }: { method?: string; params?: Record<string, string>; headers?: Record<string, string> } = {}) {
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const request = new Request(`${ORIGIN}/api`, { method, body: text, headers: { origin: ORIGIN, 'content-type': 'application/json', ...headers } });
  const response = await handler(request, { params: Promise.resolve(params) });
  return { status: response.status, body: (await response.json()) as Record<string, unknown> };
} // prettier-ignore

beforeAll(async () => {
  world = await makeWorld(database.owner);
});
beforeEach(() => void newBrowser().set('session', world.sessions.owner ?? ''));

const wearer = { name: 'Bea', isSelf: true, isUnder18: false, fittedFor: 'standing', wornBeneath: '', shape: [], consentsMeasure: false, consentsPhotograph: false, consentsShare: false, consentOn: null }; // prettier-ignore
const pattern = { name: 'Narrow legs', maker: '', clothKind: 'woven', stretchPercent: 0, notes: '' };
const preferences = { displayName: 'Bea', unit: 'in', words: 'us', hidesMeasurements: false, isFitter: false, isPatternMaker: false }; // prettier-ignore
const EXTRA = Object.fromEntries(
  ['id', 'ownerId', 'owner_id', 'userId', 'isAdmin', 'is_admin', 'email', 'emailVerifiedAt', 'passwordHash', 'suspendedAt', 'deletedAt', 'deleted_at', 'createdAt', 'version', 'settledAt', 'consentUntil', 'garment', 'constructor', 'toString', 'extra'].map((name) => [name, 'x']),
); // prettier-ignore

const columns = () => database.owner`
  select (select json_agg(u order by id) from users u) as users, (select json_agg(w order by id) from wearers w) as wearers,
    (select json_agg(p order by id) from patterns p) as patterns, (select json_agg(j order by id) from journals j) as journals`;

describe('a body with twenty fields more than there are', () => {
  it.each<[string, Handler, () => unknown, { method?: string; params?: () => Record<string, string> }]>([
    ['a wearer', postWearer, () => ({ id: v7(), wearer: { ...wearer, ...EXTRA } }), {}],
    ['beside a wearer', postWearer, () => ({ ...EXTRA, id: v7(), wearer }), {}],
    ['a pattern', postPattern, () => ({ id: v7(), pattern: { ...EXTRA, ...pattern, more: 1 } }), {}],
    ['preferences', patchMe, () => ({ ...EXTRA, ...preferences }), { method: 'PATCH' }],
    ['a journal', patchJournal, () => ({ ...EXTRA, version: 1, name: 'Other' }), { method: 'PATCH', params: () => ({ journalId: world.journalId }) }],
  ])('changes no column: %s', async (_what, handler, body, { method, params }) => {
    const before = await columns();
    const answer = await send(handler, body(), { method, params: params?.() });
    expect(answer).toMatchObject({ status: 422, body: { kind: 'invalid' } });
    expect(await columns()).toEqual(before);
  }); // prettier-ignore
});

describe('the request wrapper', () => {
  it('takes JSON only, whole, of bounded length and well formed', async () => {
    expect(await send(patchMe, preferences, { method: 'PATCH', headers: { 'content-type': 'text/plain' } })).toMatchObject({ status: 415 }); // prettier-ignore
    expect(await send(patchMe, '{', { method: 'PATCH' })).toMatchObject({
      status: 400,
      body: { kind: 'not-json' },
    });
    expect(await send(patchMe, JSON.stringify({ x: 'x'.repeat(1_100_000) }), { method: 'PATCH' })).toMatchObject({ status: 413 }); // prettier-ignore
    expect(await send(patchMe, '{"__proto__":{"isAdmin":true}}', { method: 'PATCH' })).toMatchObject({
      status: 422,
    });
  });

  it.each<Record<string, string>>([{ origin: 'https://elsewhere.invalid' }, { origin: 'null' }, { origin: `${ORIGIN}.elsewhere.invalid` }, { 'sec-fetch-site': 'cross-site' }])('refuses a change from elsewhere: %o', async (headers) => {
    expect(await send(patchMe, preferences, { method: 'PATCH', headers })).toMatchObject({ status: 403, body: { kind: 'cross-origin' } });
  }); // prettier-ignore

  it('says 401 to who is signed out before it looks at anything else', async () => {
    newBrowser();
    expect(await send(patchJournal, '{', { method: 'PATCH', params: { journalId: 'not an id' } })).toMatchObject({ status: 401 }); // prettier-ignore
  });

  it('answers a thing of somebody else exactly as one that is not there, also when it is no id at all', async () => {
    newBrowser().set('session', world.sessions.other ?? '');
    const change = { version: 1, name: 'Mine now' };
    const tried = [world.journalId, v7(), 'not an id', "'; drop table users; --"];
    const answers = await Promise.all(tried.map((journalId) => send(patchJournal, change, { method: 'PATCH', params: { journalId } }))); // prettier-ignore
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect(answers[0]?.status).toBe(404);
  });
});
