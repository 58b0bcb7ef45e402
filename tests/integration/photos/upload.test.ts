import { createHash, randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { Viewer } from '@/db/queries/viewer';
import { databaseOfFile } from '../../support/database';
import { HOSTILE_FILES } from '../../support/hostile-files';
import { paddedTo } from '../../support/jpeg-segments';
import { phoneJpeg } from '../../support/jpegs';
import { makeRound, makeViewer } from '../../support/people';
import { addedPhoto, listed, sendPhoto } from '../../support/photo-requests';
import { storeOfFile } from '../../support/store';

const asking = vi.hoisted(() => ({ viewer: null as Viewer | null }));
vi.mock('@/lib/auth/viewer', () => ({ currentViewer: async () => asking.viewer }));

const database = databaseOfFile();
const store = storeOfFile();

const MEGABYTE = 1024 * 1024;
const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
const filesOf = (photoId: string) =>
  ['160', '1600', '640', 'master'].map((variant) => `photos/${photoId}/1/${variant}`);

let roundId: string;
let jpeg: Buffer;
beforeAll(async () => {
  asking.viewer = await makeViewer(database.owner, 'Owner');
  jpeg = await phoneJpeg(6);
});
async function freshRound() {
  ({ roundId } = await makeRound(database.owner, asking.viewer as Viewer));
  await database.owner`delete from rate_limits`;
}
const rows = () => database.owner`select id, view, is_mirrored from photos where round_id = ${roundId}`;

describe('an upload', () => {
  beforeAll(freshRound);

  it('is one row and four files, and tells what arrived', async () => {
    const before = store.keys();
    const photo = await addedPhoto(sendPhoto(roundId, jpeg, { view: 'back' }));
    expect(Object.keys(photo).sort()).toEqual([
      'heightPx',
      'id',
      'isMirrored',
      'receivedSha256',
      'revision',
      'version',
      'view',
      'widthPx',
    ]);
    expect(photo).toMatchObject({ view: 'back', widthPx: 900, heightPx: 1200, receivedSha256: sha256(jpeg) });
    expect(store.keys().filter((key) => !before.includes(key))).toEqual(filesOf(photo.id));
    const { receivedSha256: _, ...kept } = photo;
    expect(await listed(roundId)).toEqual([kept]);
  });

  it.each([9.9, 10.1, 15, 25])('of %d MB arrives whole', async (megabytes) => {
    const bytes = paddedTo(jpeg, Math.floor(megabytes * MEGABYTE));
    expect(bytes.length).toBe(Math.floor(megabytes * MEGABYTE));
    expect((await addedPhoto(sendPhoto(roundId, bytes))).receivedSha256).toBe(sha256(bytes));
  });

  it.each(['with', 'without'])('of 25.1 MB %s a length is refused in so many words', async (kind) => {
    const [before, had] = [store.keys(), await rows()];
    const bytes = paddedTo(jpeg, Math.floor(25.1 * MEGABYTE));
    const body = kind === 'with' ? bytes : new Blob([new Uint8Array(bytes)]).stream();
    const response = await sendPhoto(roundId, body);
    expect(response.status).toBe(413);
    expect(await response.json()).toMatchObject({
      kind: 'too-large',
      message: expect.stringMatching(/25 MB/),
    });
    expect([store.keys(), await rows()]).toEqual([before, had]);
  });

  it('shorter than it announced is not taken for a photo, and is asked for again', async () => {
    const response = await sendPhoto(roundId, jpeg, {
      headers: { 'content-length': String(jpeg.length + 1) },
    });
    expect([response.status, (await response.json()).kind]).toEqual([503, 'cut']);
  });
});

describe('the same upload five times', () => {
  beforeAll(freshRound);

  it('at once, with connections cut between, is one photo with one set of files', async () => {
    const before = store.keys();
    const key = randomUUID();
    const cut = () =>
      sendPhoto(
        roundId,
        new ReadableStream({
          start: (stream) => stream.enqueue(new Uint8Array(jpeg.subarray(0, 9000))),
          pull: (stream) => stream.error(new Error('the connection went away')),
        }),
        { key },
      );
    const ends = await Promise.all([
      cut(),
      sendPhoto(roundId, jpeg, { key }),
      sendPhoto(roundId, jpeg, { key }),
      cut(),
      sendPhoto(roundId, jpeg, { key }),
    ]);
    expect(ends.map(({ status }) => status)).toEqual([503, 200, 200, 503, 200]);
    const again = await addedPhoto(sendPhoto(roundId, jpeg, { key }));
    const ids = await Promise.all([1, 2, 4].map(async (i) => (await ends[i]?.json()).id));
    expect(ids).toEqual([again.id, again.id, again.id]);
    expect(await rows()).toHaveLength(1);
    expect(store.keys().filter((one) => !before.includes(one))).toEqual(filesOf(again.id));
  });
});

describe('files that are no photo', () => {
  beforeAll(freshRound);

  it('leave nothing behind: no row, no file, no audit, and a sentence for each', async () => {
    const audits = () => database.owner`select id from audit order by id`;
    const [before, audited] = [store.keys(), await audits()];
    const refused = HOSTILE_FILES.filter(({ ends }) => ends !== 'taken');
    for (const { name, make, ends } of refused) {
      await database.owner`delete from rate_limits`;
      const response = await sendPhoto(roundId, await make());
      const { kind, message } = await response.json();
      expect([ends].flat(), name).toContain(kind);
      expect(message, name).toMatch(/^[A-Z].*\.$/);
      expect([413, 415, 422], name).toContain(response.status);
    }
    expect(await rows()).toEqual([]);
    expect(await audits()).toEqual(audited);
    expect(store.keys()).toEqual(before);
  }, 60_000);

  it('do not hold up a good one sent beside them', async () => {
    const bad = HOSTILE_FILES.filter(({ ends }) => ends === 'damaged').slice(0, 3);
    const ends = await Promise.all([
      ...bad.map(async ({ make }) => sendPhoto(roundId, await make())),
      sendPhoto(roundId, jpeg),
    ]);
    expect(ends.map(({ status }) => status)).toEqual([422, 422, 422, 200]);
    expect(await rows()).toHaveLength(1);
  });
});

describe('too many uploads', () => {
  beforeAll(freshRound);

  it('are stopped at sixty an hour, with the time to wait; one that is had already is not counted', async () => {
    const key = randomUUID();
    await addedPhoto(sendPhoto(roundId, jpeg, { key }));
    for (let i = 1; i < 60; i += 1) expect((await sendPhoto(roundId, Buffer.from('x'))).status).toBe(415);
    const stopped = await sendPhoto(roundId, jpeg);
    expect(stopped.status).toBe(429);
    expect(Number(stopped.headers.get('retry-after'))).toBeGreaterThan(3000);
    await addedPhoto(sendPhoto(roundId, jpeg, { key }));
  });
});
