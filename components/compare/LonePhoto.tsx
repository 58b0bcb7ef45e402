import { PHOTO_INKS } from '@/components/marks/PhotoMark';
import { VIEW_WORDS } from '@/components/photos/view-words';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { PhotoLayer } from './PhotoLayer';
import { RoundCaption } from './RoundCaption';

/** A view that only one of the rounds has; the other says so. */
export function LonePhoto({ number, photo }: { number: number; photo: MarkedPhotoDto | undefined }) {
  const height = photo ? photo.heightPx / photo.widthPx : 4 / 3;
  return (
    <figure className="grid content-start gap-2">
      {photo ? (
        <svg
          role="img"
          aria-label={`Round ${number}, ${VIEW_WORDS[photo.view]}`}
          viewBox={`0 0 1 ${height}`}
          className={`block w-full ${PHOTO_INKS}`}
        >
          <PhotoLayer photo={photo} hasMarks />
        </svg>
      ) : (
        <span className="grid aspect-[3/4] place-items-center bg-weave px-3 text-center text-graphite">
          Not photographed
        </span>
      )}
      <RoundCaption number={number} photo={photo} />
    </figure>
  );
}
