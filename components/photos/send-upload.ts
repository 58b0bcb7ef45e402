import type { ProblemBody } from '@/components/net/send';
import type { PhotoDto } from '@/db/queries/photos';
import type { WaitingUpload } from './upload-store';

export type UploadEnd =
  | { kind: 'added'; photo: PhotoDto }
  | { kind: 'again'; afterMs: number; message: string }
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
  const isLater = [401, 408, 429].includes(request.status) || request.status >= 500;
  if (!isLater) return { kind: 'refused', message };
  const retryAfterS = Number(request.getResponseHeader('retry-after') ?? 5);
  return { kind: 'again', afterMs: Math.max(2, retryAfterS) * 1000, message };
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
    request.onerror = () => resolve({ kind: 'again', afterMs: 4000, message: OFFLINE });
    request.onabort = () => resolve({ kind: 'cancelled' });
    signal.addEventListener('abort', () => request.abort());
    request.send(file);
  });
}
