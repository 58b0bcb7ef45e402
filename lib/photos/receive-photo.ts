import 'server-only';
import { createHash } from 'node:crypto';
import { v7 } from 'uuid';
import { PHOTO_BYTES_MAX } from '@/components/photos/upload-size-schema';
import { addPhoto, findRoundForUpload, type NewPhoto, type PhotoDto } from '@/db/queries/photos';
import type { Viewer } from '@/db/queries/viewer';
import { takePoint } from '@/lib/limits/limit';
import { Problem } from '@/lib/request/problem';
import { orNotFound } from '@/lib/request/written';
import { waitSentence } from '@/lib/request/wait-sentence';
import { encodePhoto } from './encode';
import { PHOTO_FAULTS, type PhotoFault } from './faults';
import { storePhoto, unstorePhoto } from './keep-photo';
import { withBody } from './read-body';

function answerOf<T extends object>(answer: T | { fault: PhotoFault }): T {
  if (!('fault' in answer)) return answer;
  const { status, message } = PHOTO_FAULTS[answer.fault];
  throw new Problem(status, answer.fault, message);
}

type Upload = Pick<NewPhoto, 'uploadKey' | 'view' | 'isMirrored'>;

/** What the sender compares: that the bytes which arrived are the bytes that were sent. */
type Received = PhotoDto & { receivedSha256: string };

const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

/** Files first, then the row that stands for them; files whose row did not come to be are taken back. */
async function keepPhoto(
  viewer: Viewer,
  roundId: string,
  upload: Upload,
  bytes: Buffer,
): Promise<PhotoDto | { fault: PhotoFault }> {
  const encoded = await encodePhoto(bytes);
  if ('fault' in encoded) return encoded;
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
  return orNotFound(added).photo;
}

/**
 * Takes in one upload: permission, whole body, our own pictures of it, files, row. The same upload key gives back the photo
 * that it made the first time.
 */
export async function receivePhoto(
  viewer: Viewer,
  roundId: string,
  request: Request,
  upload: Upload,
): Promise<Received> {
  const { had, isAgreed } = orNotFound(await findRoundForUpload(viewer, roundId, upload.uploadKey));
  if (!isAgreed)
    throw new Problem(403, 'no-consent', 'This person has not agreed to be photographed. Ask them first, then write it down with them.'); // prettier-ignore
  if (!had) {
    const wait = await takePoint('upload', [`user ${viewer.userId}`]);
    if (wait) throw new Problem(429, 'too-often', waitSentence(wait), { retryAfterS: wait });
  }
  const received = await withBody(request, PHOTO_BYTES_MAX, async (bytes) => {
    const photo = had ?? (await keepPhoto(viewer, roundId, upload, bytes));
    return 'fault' in photo ? photo : { ...photo, receivedSha256: sha256(bytes) };
  });
  return answerOf(received);
}
