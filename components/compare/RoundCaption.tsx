import { markText } from '@/components/marks/model/mark-text';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { marksOf } from './shown-photo';

/** The round's number under its photo, and its marks in words. */
export function RoundCaption({ number, photo }: { number: number; photo: MarkedPhotoDto | undefined }) {
  return (
    <figcaption>
      <span className="font-bold">Round {number}</span>
      <ul className="text-sm">
        {photo ? marksOf(photo).map((mark) => <li key={mark.id}>{markText(mark)}</li>) : null}
      </ul>
    </figcaption>
  );
}
