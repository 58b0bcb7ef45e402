import { beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { savePreferences } from '@/db/queries/account';
import { signUp } from '@/db/queries/accounts';
import {
  createWearer,
  listWearers,
  removeWearer,
  updateWearer,
  type WearerInput,
} from '@/db/queries/wearers';
import type { Viewer } from '@/db/queries/viewer';
import { newWearer } from '@/components/wearers/wearer-schema';
import { databaseOfFile } from '../support/database';

const database = databaseOfFile();
const viewer: Viewer = { userId: '', email: 'ann@example.org', displayName: 'Ann', isAdmin: false, isPatternMaker: false, isFitter: false, unit: 'cm', words: 'uk', hidesMeasurements: false }; // prettier-ignore
const wearer: WearerInput = { ...newWearer(true), name: 'A name that is nobody’s business' };

const rows = () =>
  database.owner<{ verb: string; object_kind: string; fields: string[] }[]>`
    select verb, object_kind, fields from audit order by id`;
async function during<T>(work: () => Promise<T>) {
  const before = (await rows()).length;
  await work();
  return (await rows()).slice(before);
}

beforeAll(async () => {
  await signUp({ email: viewer.email, displayName: 'Ann', passwordHash: 'x' });
  const [user] = await database.owner<{ id: string }[]>`select id from users`;
  viewer.userId = user?.id ?? '';
});

describe('the audit', () => {
  const id = v7();

  it('holds one row for each change, with the names of fields and never what was written into them', async () => {
    const told = [
      await during(() => createWearer(viewer, id, wearer)),
      await during(() => updateWearer(viewer, id, 1, { ...wearer, wornBeneath: 'something private' })),
      await during(() => savePreferences(viewer, { displayName: 'Bea', unit: 'in', words: 'us', hidesMeasurements: true, isFitter: true, isPatternMaker: false })), // prettier-ignore
      await during(() => removeWearer(viewer, id)),
    ];
    expect(told.map((some) => some.map(({ verb, object_kind }) => `${verb} ${object_kind}`))).toEqual([['create wearer'], ['update wearer'], ['update user'], ['delete wearer']]); // prettier-ignore
    const whole = JSON.stringify(await database.owner`select * from audit`);
    expect(whole).toContain('wornBeneath');
    expect(whole).not.toMatch(/business|private|Bea|ann@/);
  });

  it('holds no row for what was not changed: a lost race, a foreign thing, the same thing sent again', async () => {
    const other = { ...viewer, userId: v7() };
    const again = v7();
    await createWearer(viewer, again, wearer);
    expect(await during(() => updateWearer(viewer, again, 7, wearer))).toEqual([]);
    expect(await during(() => updateWearer(other, again, 1, wearer))).toEqual([]);
    expect(await during(() => removeWearer(other, again))).toEqual([]);
    expect(await during(() => createWearer(viewer, again, wearer))).toEqual([]);
  });

  it('falls with its change: where the audit cannot be written, nothing is changed', async () => {
    const lost = v7();
    await database.owner`revoke insert on audit from ruckle_app`;
    try {
      await expect(createWearer(viewer, lost, wearer)).rejects.toThrow();
      expect(await database.owner`select 1 from wearers where id = ${lost}`).toHaveLength(0);
    } finally {
      await database.owner`grant insert on audit to ruckle_app`;
    }
  });

  it.each([
    ['audit', 'verb'],
    ['readings', 'id'],
    ['tombstones', 'id'],
  ])('cannot be rewritten by the role that serves people: %s', async (table, column) => {
    await expect(database.app.unsafe(`update ${table} set ${column} = ${column}`)).rejects.toThrow(
      /permission denied/,
    );
    await expect(database.app.unsafe(`delete from ${table}`)).rejects.toThrow(/permission denied/);
    await expect(database.app.unsafe(`truncate ${table}`)).rejects.toThrow(/permission denied/);
  });

  it('is beyond that role also by changing the rules: it owns nothing and may make nothing', async () => {
    for (const statement of ['alter table audit add column x int', 'create table mine (x int)', 'drop table audit', 'set role ruckle_owner']) {
      await expect(database.app.unsafe(statement), statement).rejects.toThrow();
    }
    await database.app.unsafe('grant update, delete on audit to ruckle_app'); // a warning, and nothing granted
    const [held] = await database.app`
      select has_table_privilege('audit', 'insert') as adds, has_table_privilege('audit', 'update') as changes, has_table_privilege('audit', 'delete') as removes`;
    expect(held).toEqual({ adds: true, changes: false, removes: false });
  }); // prettier-ignore
});

it('a wearer reads out with exactly the fields that pages show', async () => {
  await createWearer(viewer, v7(), wearer);
  const [one] = await listWearers(viewer);
  expect(Object.keys(one ?? {}).sort()).toEqual(['consentOn', 'consentsMeasure', 'consentsPhotograph', 'consentsShare', 'fittedFor', 'id', 'isSelf', 'isUnder18', 'name', 'shape', 'version', 'wornBeneath']); // prettier-ignore
});
