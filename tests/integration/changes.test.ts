import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { v7 } from 'uuid';
import { PATCH as patchChange } from '@/app/api/changes/[changeId]/route';
import { POST as postChange } from '@/app/api/rounds/[roundId]/changes/route';
import { makeWorld, type World } from '../access/world';
import { databaseOfFile } from '../support/database';
import { newBrowser } from '../support/next-request';

vi.mock('next/headers', () => import('../support/next-request'));

const database = databaseOfFile();
let world: World;
beforeAll(async () => void (world = await makeWorld(database.owner)));
beforeEach(() => void newBrowser().set('session', world.sessions.owner ?? ''));

const ORIGIN = 'http://127.0.0.1:4321';
type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
async function send(handler: Handler, method: string, body: unknown, params: Record<string, string>) {
  const headers = { origin: ORIGIN, 'content-type': 'application/json' };
  const request = new Request(`${ORIGIN}/api`, { method, headers, body: JSON.stringify(body) });
  const answer = await handler(request, { params: Promise.resolve(params) });
  return { status: answer.status, body: (await answer.json()) as Record<string, unknown> };
}

const plan = (typed: string, reason = '') =>
  send(postChange, 'POST', { id: v7(), correction: 'shorten-depth', side: 'both', basis: 'piece', amount: { typed, unit: 'cm' }, reason }, { roundId: world.roundId }); // prettier-ignore
const edit = (row: Record<string, unknown>, wanted: object) =>
  send(patchChange, 'PATCH', { version: row.version, ...wanted }, { changeId: String(row.id) });
const planned = () =>
  database.owner`select planned_mm, reason from changes where round_id = ${world.roundId} and correction = 'shorten-depth'`;

// Shorten depth: first 10 mm, stop of a round 19 mm at hip 1000 (the fitter's table, common practice).
describe('past the stop mark of a round', () => {
  it('nothing is planned without a reason, and with one it is', async () => {
    expect(await plan('2.5')).toMatchObject({ status: 422, body: { kind: 'reason-wanted' } });
    expect(await planned()).toEqual([]);
    expect((await plan('2.5', 'The other leg had it too.')).status).toBe(200);
    expect(await planned()).toMatchObject([{ reason: 'The other leg had it too.' }]);
  });

  it('an amount is not raised without one, nor a reason taken away', async () => {
    const { body } = await plan('1', '');
    expect(await edit(body, { planned: { typed: '3', unit: 'cm' } })).toMatchObject({ status: 422 });
    const raised = await edit(body, { planned: { typed: '3', unit: 'cm' }, reason: 'Pinned and sat in.' });
    expect(raised.status).toBe(200);
    expect(await edit(raised.body, { reason: ' ' })).toMatchObject({ status: 422 });
    expect(await planned()).toMatchObject([{ reason: 'Pinned and sat in.' }]);
  });

  it('follows the body: what passes the stop at hip 1000 does not at hip 1300', async () => {
    const setId = v7();
    await database.owner`insert into measurement_sets (id, wearer_id, measured_on) values (${setId}, ${world.wearerId}, '2026-01-01')`;
    await database.owner`insert into measurements (set_id, measure, take, value_mm, typed) values (${setId}, 'hip', 1, 1300, '130')`;
    expect((await plan('2.2')).status).toBe(200);
  });

  it('says nothing of a round that is not the viewer’s', async () => {
    newBrowser().set('session', world.sessions.other ?? '');
    expect(await plan('9')).toMatchObject({ status: 404 });
  });
});
