import 'server-only';
import { getObject } from '@/lib/photo-store';
import { notFound } from '@/lib/request/problem';
import type { Variant } from './encode';
import { contentTypeOf, photoKey } from './keys';

/** One of our own pictures, for this person only: kept by no cache, run by no browser as anything but a picture. */
export async function servePhoto(photoId: string, revision: number, variant: Variant): Promise<Response> {
  const found = await getObject(photoKey(photoId, revision, variant));
  if (!found) throw notFound();
  const headers = new Headers({
    'content-type': contentTypeOf(variant),
    'cache-control': 'private, no-store',
    'x-content-type-options': 'nosniff',
    'content-security-policy': "default-src 'none'; sandbox",
    'cross-origin-resource-policy': 'same-origin',
    'content-disposition': 'inline',
  });
  if (found.bytes !== undefined) headers.set('content-length', String(found.bytes));
  return new Response(found.body, { headers });
}
