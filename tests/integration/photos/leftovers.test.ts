import { mkdirSync, utimesSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { Viewer } from '@/db/queries/viewer';
import { databaseOfFile } from '../../support/database';
import { phoneJpeg } from '../../support/jpegs';
import { makeRound, makeViewer } from '../../support/people';
import { addedPhoto, getPicture, removePhoto, restorePhoto, sendPhoto } from '../../support/photo-requests';
import { storeOfFile } from '../../support/store';

const asking = vi.hoisted(() => ({ viewer: null as Viewer | null }));
vi.mock('@/lib/auth/viewer', () => ({ currentViewer: async () => asking.viewer }));

const database = databaseOfFile();
const store = storeOfFile();
const HOUR_MS = 3_600_000;

let roundId: string;
let jpeg: Buffer;
beforeAll(async () => {
  asking.viewer = await makeViewer(database.owner, 'Owner');
  ({ roundId } = await makeRound(database.owner, asking.viewer));
  jpeg = await phoneJpeg(3);
});

const sweep = async (now = new Date()) =>
  (await import('@/lib/photos/erase-leftovers')).erasePhotoLeftovers(now);
const put = async (key: string) => (await import('@/lib/photo-store')).putObject(key, jpeg, 'image/jpeg');
function age(keys: string[], ms: number): void {
  const then = new Date(Date.now() - ms);
  for (const key of keys) utimesSync(join(store.folder, 'ruckle', key), then, then);
}

describe('a row and its files', () => {
  it('come to be in that order: with the store away there is no row', async () => {
    const photosBefore = await database.owner`select id from photos`;
    const failing = vi.spyOn(await import('@/lib/photo-store'), 'putObject');
    failing.mockRejectedValue(new Error('the store is away'));
    const response = await sendPhoto(roundId, jpeg);
    failing.mockRestore();
    expect(response.status).toBe(503);
    expect(await database.owner`select id from photos`).toEqual(photosBefore);
  });

  it('with the database away after the files there is no row, and the sweep takes the files', async () => {
    const before = store.keys();
    await database.owner`alter table photos add constraint away check (false) not valid`;
    const response = await sendPhoto(roundId, jpeg);
    await database.owner`alter table photos drop constraint away`;
    expect(response.status).toBe(503);
    const left = store.keys().filter((key) => !before.includes(key));
    expect(left).toHaveLength(4);
    await sweep();
    expect(store.keys()).toEqual([...before, ...left].sort());
    age(left, HOUR_MS + 1000);
    await sweep();
    expect(store.keys()).toEqual(before);
  });
});

describe('a photo in the bin', () => {
  it('is gone after thirty days but for an id and a hash, and its files a day after that', async () => {
    const photo = await addedPhoto(sendPhoto(roundId, jpeg));
    const [row] = await database.owner`select master_sha256 from photos where id = ${photo.id}`;
    await removePhoto(photo.id);
    const inDays = (days: number) => new Date(Date.now() + days * 24 * HOUR_MS);
    const rows = () => database.owner`select id from photos where id = ${photo.id}`;
    const files = () => store.keys().filter((key) => key.includes(photo.id));
    await sweep(inDays(29.9));
    expect(await rows()).toHaveLength(1);
    await sweep(inDays(30.1));
    expect(await rows()).toEqual([]);
    expect(await database.owner`select id, hash, object_kind from tombstones`).toEqual([
      { id: photo.id, hash: row?.master_sha256, object_kind: 'photo' },
    ]);
    expect(files()).toHaveLength(4);
    await sweep(inDays(31));
    expect(files()).toHaveLength(4);
    await sweep(inDays(31.2));
    expect(files()).toEqual([]);
    expect(await database.owner`select key from doomed_objects`).toEqual([]);
    expect((await restorePhoto(photo.id)).status).toBe(404);
  });
});

describe('the sweep', () => {
  it('keeps what has a row, in the bin too, whatever its age', async () => {
    const [standing, binned] = [
      await addedPhoto(sendPhoto(roundId, jpeg)),
      await addedPhoto(sendPhoto(roundId, jpeg)),
    ];
    await removePhoto(binned.id);
    const before = store.keys();
    age(before, 40 * 24 * HOUR_MS);
    await sweep();
    expect(store.keys()).toEqual(before);
    expect((await getPicture(standing.id, 'master')).status).toBe(200);
  });

  it('erases a doomed file on its day, and no sooner although it has no row', async () => {
    const before = store.keys();
    const key = `photos/${randomUUID()}/1/640`;
    await put(key);
    age([key], 2 * HOUR_MS);
    const due = new Date(Date.now() + 24 * HOUR_MS);
    await database.owner`insert into doomed_objects (key, erase_after) values (${key}, ${due})`;
    await sweep();
    expect(store.keys()).toContain(key);
    await sweep(due);
    expect(store.keys()).toEqual(before);
    expect(await database.owner`select key from doomed_objects`).toEqual([]);
  });

  it('erases more than a page of doomed files, and of orphans, in one go', async () => {
    const before = store.keys();
    const now = new Date();
    const rows = Array.from({ length: 1200 }, () => ({
      key: `photos/${randomUUID()}/1/160`,
      erase_after: now,
    }));
    await database.owner`insert into doomed_objects ${database.owner(rows)}`;
    const orphans = Array.from({ length: 1100 }, () => `photos/${randomUUID()}/1/160`);
    for (const key of orphans) {
      mkdirSync(dirname(join(store.folder, 'ruckle', key)), { recursive: true });
      writeFileSync(join(store.folder, 'ruckle', key), 'x');
    }
    age(orphans, 2 * HOUR_MS);
    await sweep(now);
    expect(await database.owner`select key from doomed_objects`).toEqual([]);
    expect(store.keys()).toEqual(before);
  }, 60_000);

  it('leaves files alone that are not photos of ours', async () => {
    const key = 'photos/notes/readme';
    await put(key);
    age([key], 90 * 24 * HOUR_MS);
    await sweep();
    expect(store.keys()).toContain(key);
  });
});
