interface Props {
  photoId: string;
  revision: number;
  alt: string;
  sizes: string;
  /** `cover` fills its frame; `whole` keeps the photo's own shape, and needs its size so that nothing jumps. */
  fit?: 'cover' | 'whole';
  widthPx?: number;
  heightPx?: number;
}

export const photoUrl = (photoId: string, revision: number, variant: '1600' | '640' | '160' | 'master') =>
  `/api/photos/${photoId}/${variant}?r=${revision}`;

export const photoSrcSet = (photoId: string, revision: number) =>
  (['160', '640', '1600'] as const).map((px) => `${photoUrl(photoId, revision, px)} ${px}w`).join(', ');

/** A photo in the size that the place asks for. It never passes through a shared cache or an image service. */
export function PhotoImage({ photoId, revision, alt, sizes, fit = 'whole', widthPx, heightPx }: Props) {
  return (
    <img
      src={photoUrl(photoId, revision, '640')}
      srcSet={photoSrcSet(photoId, revision)}
      sizes={sizes}
      width={widthPx}
      height={heightPx}
      alt={alt}
      loading="lazy"
      decoding="async"
      draggable={false}
      className={fit === 'cover' ? 'h-full w-full object-cover' : 'h-auto w-full'}
    />
  );
}
