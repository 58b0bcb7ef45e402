import { beforeEach, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { type BinKind, listBin, restoreFromBin } from '@/db/queries/bin-list';
import { findDesk } from '@/db/queries/desk';
import { removeJournal } from '@/db/queries/journals';
import { removePattern } from '@/db/queries/patterns';
import { setPhotoRemoved } from '@/db/queries/photos';
import { purgeBin } from '@/db/queries/purge-bin';
import { removeRound } from '@/db/queries/rounds';
import type { Viewer } from '@/db/queries/viewer';
import { removeWearer } from '@/db/queries/wearers';
import { photoKeys } from '@/lib/photos/keys';
import { databaseOfFile } from '../support/database';
import { makeRound, makeViewer } from '../support/people';

const database = databaseOfFile();
const DAY_MS = 86_400_000;
const inDays = (days: number) => new Date(Date.now() + days * DAY_MS);
let owner: Viewer;
let other: Viewer;
let made: Awaited<ReturnType<typeof makeRound>>;
let photoId: string;

beforeEach(async () => {
  owner = await makeViewer(database.owner, 'Ada');
  other = await makeViewer(database.owner, 'Other');
  made = await makeRound(database.owner, owner);
  photoId = v7();
  await database.owner`insert into photos (id, round_id, upload_key, view, width_px, height_px, master_sha256, master_bytes)
    values (${photoId}, ${made.roundId}, ${v7()}, 'front', 800, 1200, 'none', 1)`;
});

const idOf = (kind: BinKind) => (kind === 'photo' ? photoId : made[`${kind}Id`]);
const PUT_AWAY: [BinKind, () => Promise<boolean>][] = [
  ['wearer', () => removeWearer(owner, made.wearerId)],
  ['pattern', () => removePattern(owner, made.patternId)],
  ['journal', () => removeJournal(owner, made.journalId)],
  ['round', () => removeRound(owner, made.roundId)],
  ['photo', () => setPhotoRemoved(owner, photoId, true)],
];
const photoRows = () => database.owner`select 1 from photos where id = ${photoId}`;
const doomedKeys = async () => (await database.owner<{ key: string }[]>`select key from doomed_objects`).map(({ key }) => key); // prettier-ignore

describe.each(PUT_AWAY)('a %s that was put away', (kind, putAway) => {
  it('is in its owner’s bin alone, and comes back as it was, by its owner alone, once', async () => {
    const before = await findDesk(owner, made.journalId);
    expect(await putAway()).toBe(true);
    expect((await listBin(owner)).map((one) => [one.kind, one.id])).toEqual([[kind, idOf(kind)]]);
    expect(await listBin(other)).toEqual([]);
    expect(await restoreFromBin(other, kind, idOf(kind))).toBe(false);
    expect(await restoreFromBin(owner, kind, idOf(kind))).toBe(true);
    expect(await restoreFromBin(owner, kind, idOf(kind))).toBe(false);
    const after = await findDesk(owner, made.journalId);
    const round = (desk: typeof after) => desk?.rounds.map((one) => ({ ...one, version: 0 }));
    expect(round(after)).toEqual(round(before));
    expect(await listBin(owner)).toEqual([]);
  });

  it('is erased after 30 days and not before, with the photos below it and a day left for their files', async () => {
    await putAway();
    await purgeBin(inDays(29.9), photoKeys);
    expect(await photoRows()).toHaveLength(1);
    const now = inDays(30.1);
    await purgeBin(now, photoKeys);
    expect(await photoRows()).toHaveLength(0);
    expect(await listBin(owner)).toEqual([]);
    expect(await doomedKeys()).toEqual(expect.arrayContaining(photoKeys(photoId, 1)));
    const [file] = await database.owner<{ erase_after: Date }[]>`select erase_after from doomed_objects where key = ${photoKeys(photoId, 1)[0] ?? ''}`; // prettier-ignore
    expect(file?.erase_after.getTime()).toBe(now.getTime() + DAY_MS);
    const stones = await database.owner`select object_kind from tombstones where id in ${database.owner([idOf(kind), photoId])}`; // prettier-ignore
    expect(new Set(stones.map(({ object_kind }) => object_kind as string))).toEqual(new Set([kind, 'photo']));
  });
});

it('what nobody put away is left alone', async () => {
  await purgeBin(inDays(400), photoKeys);
  expect(await photoRows()).toHaveLength(1);
});

it('a closed account is erased after 14 days with every row of it, and its photos’ files are doomed', async () => {
  await database.owner`update users set deleted_at = now() where id = ${owner.userId}`;
  await purgeBin(inDays(13.9), photoKeys);
  expect(await photoRows()).toHaveLength(1);
  await purgeBin(inDays(14.1), photoKeys);
  for (const [table, column] of [['users', 'id'], ['wearers', 'owner_id'], ['patterns', 'owner_id'], ['journals', 'owner_id']] as const) // prettier-ignore
    expect(await database.owner`select 1 from ${database.owner(table)} where ${database.owner(column)} = ${owner.userId}`, table).toHaveLength(0); // prettier-ignore
  expect(await photoRows()).toHaveLength(0);
  expect(await doomedKeys()).toEqual(expect.arrayContaining(photoKeys(photoId, 1)));
});
