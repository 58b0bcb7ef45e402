import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { findLandmarks, saveLandmarks, type LandmarksSave } from '@/db/queries/landmarks';
import { listMarkedPhotos } from '@/db/queries/marked-photos';
import type { Viewer } from '@/db/queries/viewer';
import { databaseOfFile } from '../../support/database';
import { makeRound, makeViewer } from '../../support/people';

const database = databaseOfFile();
const WAIST = { landmark: 'waist-centre', x: 0.5, y: 0.2 };
const FORK = { landmark: 'fork', x: 0.51, y: 0.41 };
const sent = (over: Partial<LandmarksSave> = {}): LandmarksSave => ({
  revision: 1,
  seen: 0,
  landmarks: [WAIST, FORK],
  ...over,
});

let owner: Viewer;
let reader: Viewer;
let stranger: Viewer;
let roundId: string;
let photoId: string;

beforeAll(async () => {
  [owner, reader, stranger] = (await Promise.all(
    ['Owner', 'Reader', 'Stranger'].map((name) => makeViewer(database.owner, name)),
  )) as [Viewer, Viewer, Viewer];
  ({ roundId } = await makeRound(database.owner, owner));
  await database.owner`insert into grants (id, subject_user_id, round_id, level, granted_by)
    values (${randomUUID()}, ${reader.userId}, ${roundId}, 'read', ${owner.userId})`;
});
beforeEach(async () => {
  photoId = randomUUID();
  await database.owner`insert into photos (id, round_id, upload_key, view, width_px, height_px, master_sha256, master_bytes)
    values (${photoId}, ${roundId}, ${randomUUID()}, 'front', 1500, 2000, 'none', 1)`;
});

describe('where the figure lies on a photo', () => {
  it('is nowhere at first, and then where it was put, to the last digit', async () => {
    expect(await findLandmarks(owner, photoId)).toEqual({ revision: 1, version: 0, landmarks: [] });
    const exact = [{ ...WAIST, x: 0.123456 }, FORK];
    await saveLandmarks(owner, photoId, sent({ landmarks: exact }));
    expect(await findLandmarks(owner, photoId)).toEqual({ revision: 1, version: 1, landmarks: [FORK, exact[0]] }); // prettier-ignore
  });

  it('changes nothing when the same is sent twice', async () => {
    await saveLandmarks(owner, photoId, sent());
    expect(await saveLandmarks(owner, photoId, sent())).toMatchObject({
      kind: 'done',
      value: { version: 1 },
    });
  });

  it('gives both back when it was moved elsewhere meanwhile, and keeps what stood', async () => {
    await saveLandmarks(owner, photoId, sent());
    const late = sent({ landmarks: [WAIST] });
    const answer = await saveLandmarks(owner, photoId, late);
    expect(answer).toMatchObject({ kind: 'conflict', mine: [WAIST], theirs: { version: 1, landmarks: [FORK, WAIST] } }); // prettier-ignore
    expect((await findLandmarks(owner, photoId))!.landmarks).toHaveLength(2);
  });

  it('is not taken for another revision of the photo', async () => {
    await database.owner`update photos set revision = 2 where id = ${photoId}`;
    expect(await saveLandmarks(owner, photoId, sent())).toMatchObject({ kind: 'conflict', theirs: { revision: 2 } }); // prettier-ignore
    expect((await findLandmarks(owner, photoId))!.landmarks).toEqual([]);
  });

  it('is seen by whoever may read the round, moved by nobody else, and missing for a stranger', async () => {
    await saveLandmarks(owner, photoId, sent());
    expect((await findLandmarks(reader, photoId))!.landmarks).toHaveLength(2);
    expect(await saveLandmarks(reader, photoId, sent({ seen: 1, landmarks: [] }))).toEqual({ kind: 'missing' }); // prettier-ignore
    expect(await findLandmarks(stranger, photoId)).toBeNull();
    expect(await saveLandmarks(stranger, photoId, sent())).toEqual({ kind: 'missing' });
  });

  it('comes with the photos that are laid side by side', async () => {
    await saveLandmarks(owner, photoId, sent());
    const listed = await listMarkedPhotos(reader, [roundId]);
    expect(listed.find(({ id }) => id === photoId)).toMatchObject({ landmarks: [FORK, WAIST], marks: [] });
    expect(await listMarkedPhotos(stranger, [roundId])).toEqual([]);
  });
});
