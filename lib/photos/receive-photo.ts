import 'server-only';
import { createHash } from 'node:crypto';
import { v7 } from 'uuid';
import { addPhoto, findUploaded, mayAddPhoto, type NewPhoto, type PhotoDto } from '@/db/queries/photos';
import type { Viewer } from '@/db/queries/viewer';
import { takePoint } from '@/lib/limits/limit';
import { Problem } from '@/lib/request/problem';
import { orNotFound } from '@/lib/request/written';
import { waitSentence } from '@/lib/request/wait-sentence';
import { encodePhoto, PHOTO_BYTES_MAX } from './encode';
import { PHOTO_FAULTS, type PhotoFault } from './faults';
import { storePhoto, unstorePhoto } from './keep-photo';
import { readBody } from './read-body';

function refuse(fault: PhotoFault): never {
  const { status, message } = PHOTO_FAULTS[fault];
  throw new Problem(status, fault, message);
}

/** What the sender compares: that the bytes which arrived are the bytes that were sent. */
type Received = PhotoDto & { receivedSha256: string };

/**
 * Takes in one upload: permission, whole body, our own pictures of it, files, row. The same upload key gives back the photo
 * that it made the first time.
 */
export async function receivePhoto(
  viewer: Viewer,
  roundId: string,
  request: Request,
  upload: Pick<NewPhoto, 'uploadKey' | 'view' | 'isMirrored'>,
): Promise<Received> {
  orNotFound(await mayAddPhoto(viewer, roundId));
  const had = await findUploaded(viewer, roundId, upload.uploadKey);
  if (!had) {
    const wait = await takePoint('upload', [`user ${viewer.userId}`]);
    if (wait) throw new Problem(429, 'too-often', waitSentence(wait), { retryAfterS: wait });
  }
  const bytes = await readBody(request, PHOTO_BYTES_MAX);
  if (!bytes) refuse('too-large');
  const receivedSha256 = createHash('sha256').update(bytes).digest('hex');
  if (had) return { ...had, receivedSha256 };
  const encoded = await encodePhoto(bytes);
  if ('fault' in encoded) refuse(encoded.fault);
  const id = v7();
  await storePhoto(id, 1, encoded);
  const { widthPx, heightPx, masterSha256, files } = encoded;
  const added = await addPhoto(viewer, roundId, {
    id,
    ...upload,
    widthPx,
    heightPx,
    masterSha256,
    masterBytes: files.master.length,
  });
  if (!added?.isNew) await unstorePhoto(id, 1);
  return { ...orNotFound(added).photo, receivedSha256 };
}
