import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import type { PhotoDto } from '@/db/queries/photos';
import type { Viewer } from '@/db/queries/viewer';
import { VARIANTS } from '@/lib/photos/encode';
import { databaseOfFile } from '../../support/database';
import { phoneJpeg } from '../../support/jpegs';
import { makeRound, makeViewer } from '../../support/people';
import {
  addedPhoto,
  editPhoto,
  getPicture,
  listed,
  listPhotosOf,
  removePhoto,
  restorePhoto,
  sendPhoto,
} from '../../support/photo-requests';
import { storeOfFile } from '../../support/store';

const asking = vi.hoisted(() => ({ viewer: null as Viewer | null }));
vi.mock('@/lib/auth/viewer', () => ({ currentViewer: async () => asking.viewer }));

const database = databaseOfFile();
const store = storeOfFile();

type Who = 'owner' | 'other' | 'reader' | 'nobody';
let people: Record<Who, Viewer | null>;
let round: Awaited<ReturnType<typeof makeRound>>;
let photo: PhotoDto;
let jpeg: Buffer;

beforeAll(async () => {
  const [owner, other, reader] = (await Promise.all(
    ['Owner', 'Other', 'Reader'].map((name) => makeViewer(database.owner, name)),
  )) as [Viewer, Viewer, Viewer];
  people = { owner, other, reader, nobody: null };
  jpeg = await phoneJpeg(6);
  round = await makeRound(database.owner, owner);
  await database.owner`insert into grants (id, subject_user_id, round_id, level, granted_by)
    values (${randomUUID()}, ${reader.userId}, ${round.roundId}, 'read', ${owner.userId})`;
});
beforeEach(async () => {
  asking.viewer = people.owner;
  photo ??= await addedPhoto(sendPhoto(round.roundId, jpeg));
});

/** Everything that a client can tell two answers apart by. */
async function seen(response: Promise<Response>) {
  const { status, headers, text } = await response.then(async (got) => ({
    status: got.status,
    headers: Object.fromEntries(got.headers),
    text: await got.text(),
  }));
  return { status, headers, text };
}

describe('the pictures of a photo', () => {
  it.each(VARIANTS)(
    '%s: come to their owner whole, in private, as nothing but a picture',
    async (variant) => {
      const response = await getPicture(photo.id, variant);
      const bytes = Buffer.from(await response.arrayBuffer());
      expect(response.status).toBe(200);
      expect(Object.fromEntries(response.headers)).toEqual({
        'cache-control': 'private, no-store',
        'content-disposition': 'inline',
        'content-length': String(bytes.length),
        'content-security-policy': "default-src 'none'; sandbox",
        'content-type': variant === 'master' ? 'image/jpeg' : 'image/webp',
        'cross-origin-resource-policy': 'same-origin',
        'x-content-type-options': 'nosniff',
      });
      expect(bytes.subarray(0, 4).toString('latin1')).toBe(
        variant === 'master' ? '\xff\xd8\xff\xdb' : 'RIFF',
      );
    },
  );

  it.each(VARIANTS)('%s: to another and to one signed out are what a missing one is', async (variant) => {
    const missing = await seen(getPicture(randomUUID(), variant));
    expect(missing.status).toBe(404);
    for (const who of ['other', 'nobody'] as const) {
      asking.viewer = people[who];
      expect(await seen(getPicture(photo.id, variant)), who).toEqual(missing);
    }
  });

  it('come to an invited reader, but for the master, until the round is no longer shared', async () => {
    asking.viewer = people.reader;
    const statuses = async () =>
      Promise.all(VARIANTS.map(async (variant) => (await getPicture(photo.id, variant)).status));
    expect(await statuses()).toEqual([404, 200, 200, 200]);
    await database.owner`update grants set revoked_at = now()`;
    expect(await statuses()).toEqual([404, 404, 404, 404]);
    await database.owner`update grants set revoked_at = null`;
  });

  it.each(['0', '2', '-1', '1.5', '99999999999', 'x', ''])(
    'of revision "%s" are missing',
    async (revision) => {
      expect((await getPicture(photo.id, '640', revision)).status).toBe(404);
    },
  );

  it.each(['800', '', 'constructor', '../1/master'])('of a size "%s" are missing', async (variant) => {
    expect((await getPicture(photo.id, variant)).status).toBe(404);
  });
});

describe('changing a photo', () => {
  it('is for the owner only: to others there is nothing, and nothing changes', async () => {
    const before = await database.owner`select * from photos`;
    const files = store.keys();
    for (const who of ['other', 'reader', 'nobody'] as const) {
      asking.viewer = people[who];
      const status = who === 'nobody' ? 401 : 404;
      const ends = await Promise.all([
        editPhoto(photo.id, { version: 1, view: 'back' }),
        removePhoto(photo.id),
        restorePhoto(photo.id),
        sendPhoto(round.roundId, jpeg),
      ]);
      expect(
        ends.map((end) => end.status),
        who,
      ).toEqual([status, status, status, status]);
      expect((await listPhotosOf(round.roundId)).status, who).toBe(who === 'reader' ? 200 : status);
    }
    expect(await database.owner`select * from photos`).toEqual(before);
    expect(store.keys()).toEqual(files);
  });

  it('needs a page of ours', async () => {
    const response = await sendPhoto(round.roundId, jpeg, { headers: { origin: 'https://elsewhere.test' } });
    expect(response.status).toBe(403);
  });

  it('writes what was edited, its audit, and nothing else that was sent', async () => {
    const edited = await editPhoto(photo.id, { version: photo.version, view: 'left', isMirrored: true });
    photo = await edited.json();
    expect(photo).toMatchObject({ view: 'left', isMirrored: true, version: 2 });
    const [entry] = await database.owner`select verb, object_id, fields from audit order by id desc limit 1`;
    expect(entry).toEqual({ verb: 'update', object_id: photo.id, fields: ['view', 'isMirrored'] });
    const before = await database.owner`select * from photos`;
    for (const extra of ['id', 'roundId', 'uploadKey', 'revision', 'widthPx', 'masterSha256', 'deletedAt']) {
      const refused = await editPhoto(photo.id, { version: photo.version, view: 'front', [extra]: 1 });
      expect(refused.status, extra).toBe(422);
    }
    expect(await database.owner`select * from photos`).toEqual(before);
  });

  it('of two edits made from one version keeps the first and gives both back', async () => {
    const stale = photo.version;
    photo = await (await editPhoto(photo.id, { version: stale, view: 'right' })).json();
    const lost = await editPhoto(photo.id, { version: stale, view: 'back' });
    expect(lost.status).toBe(409);
    expect(await lost.json()).toMatchObject({ kind: 'conflict', mine: { view: 'back' }, theirs: photo });
  });
});

describe('the bin', () => {
  it('takes a photo out of sight at once and gives it back whole', async () => {
    const files = store.keys();
    expect((await removePhoto(photo.id)).status).toBe(200);
    expect(await listed(round.roundId)).toEqual([]);
    for (const variant of VARIANTS) expect((await getPicture(photo.id, variant)).status).toBe(404);
    expect((await editPhoto(photo.id, { version: photo.version + 1, view: 'back' })).status).toBe(404);
    expect((await removePhoto(photo.id)).status).toBe(404);
    expect((await restorePhoto(photo.id)).status).toBe(200);
    expect((await listed(round.roundId)).map(({ id }) => id)).toEqual([photo.id]);
    expect((await getPicture(photo.id, 'master')).status).toBe(200);
    expect(store.keys()).toEqual(files);
  });

  it.each(['wearers', 'patterns', 'journals', 'rounds'] as const)(
    'hides every picture while one of the %s above it lies there',
    async (table) => {
      await database.owner`update ${database.owner(table)} set deleted_at = now()`;
      for (const variant of VARIANTS) expect((await getPicture(photo.id, variant)).status).toBe(404);
      expect((await sendPhoto(round.roundId, jpeg)).status).toBe(404);
      await database.owner`update ${database.owner(table)} set deleted_at = null`;
      expect((await getPicture(photo.id, '160')).status).toBe(200);
    },
  );
});
