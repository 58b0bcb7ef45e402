import 'server-only';
import type { PhotoFault } from './faults';

/** Bytes of uploads that one process holds at once, at the most; beyond it an upload is asked to come again. */
const HELD_BYTES_MAX = 256 * 1024 * 1024;
let heldBytes = 0;

/** A body that is too long is read to its end unkept, so far: a client that is cut off while it sends never hears why. */
const UNKEPT_BYTES_MAX = 128 * 1024 * 1024;

type Read = { bytes: Buffer } | { fault: PhotoFault };

async function readAll(request: Request, bytesMax: number, hold: (bytes: number) => boolean): Promise<Read> {
  const announced = request.headers.get('content-length');
  let fault: PhotoFault | null = Number(announced ?? 0) > bytesMax ? 'too-large' : null;
  if (Number(announced ?? 0) > UNKEPT_BYTES_MAX) return { fault: 'too-large' };
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  const reader = request.body?.getReader();
  for (let read = await reader?.read(); read && !read.done; read = await reader?.read()) {
    bytes += read.value.length;
    if (bytes > bytesMax) fault = 'too-large';
    else if (!fault && !hold(read.value.length)) fault = 'busy';
    if (fault) chunks.length = 0;
    else chunks.push(read.value);
    if (bytes > UNKEPT_BYTES_MAX) {
      await reader?.cancel();
      break;
    }
  }
  if (fault) return { fault };
  if (announced !== null && bytes !== Number(announced)) return { fault: 'cut' };
  return { bytes: Buffer.concat(chunks) };
}

/**
 * Works on the whole body of an upload, which is held in memory that long. Nothing beyond the limit is kept, and a body that is
 * shorter than was announced is a fault, never a short file.
 * @param bytesMax the longest body that may be
 */
export async function withBody<T>(
  request: Request,
  bytesMax: number,
  work: (bytes: Buffer) => Promise<T>,
): Promise<T | { fault: PhotoFault }> {
  let mine = 0;
  const hold = (bytes: number) => {
    if (heldBytes + bytes > HELD_BYTES_MAX) return false;
    heldBytes += bytes;
    mine += bytes;
    return true;
  };
  try {
    const read = await readAll(request, bytesMax, hold).catch((): Read => ({ fault: 'cut' }));
    return 'fault' in read ? read : await work(read.bytes);
  } finally {
    heldBytes -= mine;
  }
}
