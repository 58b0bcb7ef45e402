import 'server-only';
import { deleteObject, putObject } from '@/lib/photo-store';
import type { EncodedPhoto } from './encode';
import { VARIANTS } from './encode';
import { contentTypeOf, photoKey, photoKeys } from './keys';

/** All pictures of a photo into the store, before its row: never a row without its files. */
export async function storePhoto(photoId: string, revision: number, { files }: EncodedPhoto): Promise<void> {
  await Promise.all(
    VARIANTS.map((variant) =>
      putObject(photoKey(photoId, revision, variant), files[variant], contentTypeOf(variant)),
    ),
  );
}

/** Takes back files whose row did not come to be. What fails here is swept up later. */
export async function unstorePhoto(photoId: string, revision: number): Promise<void> {
  await Promise.allSettled(photoKeys(photoId, revision).map(deleteObject));
}
