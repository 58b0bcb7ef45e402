import type { ProblemBody } from '@/components/net/send';
import type { PhotoDto } from '@/db/queries/photos';
import type { WaitingUpload } from './upload-store';

export type UploadEnd =
  | { kind: 'added'; photo: PhotoDto }
  /** `isForAll`: the others would fare the same just now. */
  | { kind: 'again'; afterMs: number; isForAll: boolean; message: string }
  | { kind: 'refused'; message: string }
  | { kind: 'cancelled' };

const OFFLINE = 'There is no connection just now. The photo waits on this phone.';

function problemOf(request: XMLHttpRequest): ProblemBody {
  try {
    return JSON.parse(request.responseText) as ProblemBody;
  } catch {
    return { kind: 'failed', message: 'The photo could not be sent. It waits on this phone.' };
  }
}

function endOf(request: XMLHttpRequest): UploadEnd {
  if (request.status >= 200 && request.status < 300) {
    return { kind: 'added', photo: JSON.parse(request.responseText) as PhotoDto };
  }
  const { message } = problemOf(request);
  const isForAll = [401, 429].includes(request.status);
  if (!isForAll && request.status !== 408 && request.status < 500) return { kind: 'refused', message };
  const afterMs = Number(request.getResponseHeader('retry-after') ?? 0) * 1000;
  return { kind: 'again', afterMs, isForAll, message };
}

/** Sends one photo; fetch does not tell how far it is, so this is an XMLHttpRequest. Aborting the signal ends it. */
export function sendUpload(
  { roundId, key, view, isMirrored, file }: WaitingUpload,
  onProgress: (part: number) => void,
  signal: AbortSignal,
): Promise<UploadEnd> {
  return new Promise((resolve) => {
    const request = new XMLHttpRequest();
    const query = new URLSearchParams({ key, view, mirrored: isMirrored ? '1' : '0' });
    request.open('POST', `/api/rounds/${roundId}/photos?${query}`);
    request.setRequestHeader('content-type', 'application/octet-stream');
    request.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0);
    request.onload = () => resolve(endOf(request));
    request.onerror = () => resolve({ kind: 'again', afterMs: 0, isForAll: true, message: OFFLINE });
    request.onabort = () => resolve({ kind: 'cancelled' });
    signal.addEventListener('abort', () => request.abort());
    request.send(file);
  });
}
