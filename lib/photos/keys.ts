import { type Variant, VARIANTS } from './encode';

/** Where a picture lies in the store: by photo and revision, so that an old revision can be erased whole. */
export const photoKey = (photoId: string, revision: number, variant: Variant) =>
  `photos/${photoId}/${revision}/${variant}`;

export const photoKeys = (photoId: string, revision: number) =>
  VARIANTS.map((variant) => photoKey(photoId, revision, variant));

export const contentTypeOf = (variant: Variant) => (variant === 'master' ? 'image/jpeg' : 'image/webp');

/** The photo and revision of a key; null for a key that is not one of ours. */
export function photoOfKey(key: string): { photoId: string; revision: number } | null {
  const found = /^photos\/([0-9a-f-]{36})\/(\d+)\/\w+$/.exec(key);
  return found?.[1] && found[2] ? { photoId: found[1], revision: Number(found[2]) } : null;
}
