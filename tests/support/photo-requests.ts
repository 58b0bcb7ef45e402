import { randomUUID } from 'node:crypto';
import { expect } from 'vitest';
import type { PhotoDto } from '@/db/queries/photos';

const ORIGIN = 'http://127.0.0.1:4321';
const FROM_OUR_PAGE = { origin: ORIGIN, 'sec-fetch-site': 'same-origin' };

type Received = PhotoDto & { receivedSha256: string };

const context = <P extends Record<string, string>>(params: P) => ({ params: Promise.resolve(params) });

interface Sending {
  key?: string;
  view?: string;
  headers?: Record<string, string>;
}

/** Sends one upload to its handler, as a page of ours would. A stream goes out without a length, as a cut one does. */
export async function sendPhoto(
  roundId: string,
  body: Buffer | ReadableStream<Uint8Array>,
  { key = randomUUID(), view = 'front', headers = {} }: Sending = {},
): Promise<Response> {
  const { POST } = await import('@/app/api/rounds/[roundId]/photos/route');
  const length: Record<string, string> = Buffer.isBuffer(body)
    ? { 'content-length': String(body.length) }
    : {};
  const request = new Request(`${ORIGIN}/api/rounds/${roundId}/photos?key=${key}&view=${view}`, {
    method: 'POST',
    headers: { ...FROM_OUR_PAGE, ...length, ...headers },
    body: Buffer.isBuffer(body) ? new Uint8Array(body) : body,
    duplex: 'half',
  } as RequestInit);
  return POST(request, context({ roundId }));
}

/** The photo that came to be; a refusal fails the test with its sentence. */
export async function addedPhoto(sent: Promise<Response>): Promise<Received> {
  const response = await sent;
  const answer = await response.json();
  expect(answer.message).toBeUndefined();
  expect(response.status).toBe(200);
  return answer;
}

export async function getPicture(
  photoId: string,
  variant: string,
  revision: number | string = 1,
): Promise<Response> {
  const { GET } = await import('@/app/api/photos/[photoId]/[variant]/route');
  return GET(
    new Request(`${ORIGIN}/api/photos/${photoId}/${variant}?r=${revision}`),
    context({ photoId, variant }),
  );
}

export async function editPhoto(photoId: string, body: unknown): Promise<Response> {
  const { PATCH } = await import('@/app/api/photos/[photoId]/route');
  const request = new Request(`${ORIGIN}/api/photos/${photoId}`, {
    method: 'PATCH',
    headers: { ...FROM_OUR_PAGE, 'content-type': 'application/json' },
    body: JSON.stringify(body),
  });
  return PATCH(request, context({ photoId }));
}

export async function removePhoto(photoId: string): Promise<Response> {
  const { DELETE } = await import('@/app/api/photos/[photoId]/route');
  const request = new Request(`${ORIGIN}/api/photos/${photoId}`, {
    method: 'DELETE',
    headers: FROM_OUR_PAGE,
  });
  return DELETE(request, context({ photoId }));
}

export async function restorePhoto(photoId: string): Promise<Response> {
  const { POST } = await import('@/app/api/photos/[photoId]/restore/route');
  const request = new Request(`${ORIGIN}/api/photos/${photoId}/restore`, {
    method: 'POST',
    headers: FROM_OUR_PAGE,
  });
  return POST(request, context({ photoId }));
}

export async function listPhotosOf(roundId: string): Promise<Response> {
  const { GET } = await import('@/app/api/rounds/[roundId]/photos/route');
  return GET(new Request(`${ORIGIN}/api/rounds/${roundId}/photos`), context({ roundId }));
}

export const listed = async (roundId: string): Promise<PhotoDto[]> => (await listPhotosOf(roundId)).json();
