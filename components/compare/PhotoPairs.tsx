'use client';
import { useState } from 'react';
import { PHOTO_INKS, PhotoMark } from '@/components/marks/PhotoMark';
import { markText } from '@/components/marks/model/mark-text';
import { type MarkSeverity, photoPoint } from '@/components/marks/model/mark';
import { PhotoImage } from '@/components/photos/PhotoImage';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { Choice } from '@/components/ui/Choice';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { type View, VIEWS } from '@/diagnosis/garments/schema';

interface Side {
  number: number;
  photos: MarkedPhotoDto[];
}

/** The width that marks are drawn for; the pane shows them larger or smaller with the photo. */
const PANE_PX = 500;

/** The same view of two rounds next to each other, with the marks of both. */
export function PhotoPairs({ before, after }: { before: Side; after: Side }) {
  const views = VIEWS.filter((view) =>
    [...before.photos, ...after.photos].some((photo) => photo.view === view),
  );
  const both = views.find((view) =>
    [before, after].every(({ photos }) => photos.some((photo) => photo.view === view)),
  );
  const [view, setView] = useState<View | null>(both ?? views[0] ?? null);
  if (!view) return <p className="text-graphite">Neither round has a photo yet.</p>;
  return (
    <div className="grid gap-4">
      <Choice
        legend="View"
        hidesLegend
        options={views.map((value) => ({ value, label: VIEW_WORDS[value] }))}
        value={view}
        onChange={setView}
      />
      <div className="grid grid-cols-2 gap-2 md:gap-6">
        {[before, after].map(({ number, photos }) => (
          <Pane
            key={number}
            number={number}
            view={view}
            photo={photos.find((photo) => photo.view === view)}
          />
        ))}
      </div>
    </div>
  );
}

function Pane({ number, view, photo }: { number: number; view: View; photo: MarkedPhotoDto | undefined }) {
  if (!photo) {
    return (
      <figure className="grid content-start gap-2">
        <span className="grid aspect-[3/4] place-items-center bg-weave px-3 text-center text-graphite">
          Not photographed
        </span>
        <figcaption className="font-bold">Round {number}</figcaption>
      </figure>
    );
  }
  const marks = photo.marks.map((mark) => ({
    ...mark,
    severity: Math.min(3, Math.max(1, mark.severity)) as MarkSeverity,
    points: mark.points.map(({ x, y }) => photoPoint(x, y)),
  }));
  const paneHeightPx = (PANE_PX * photo.heightPx) / photo.widthPx;
  return (
    <figure className="grid content-start gap-2">
      <span className="relative block">
        <PhotoImage
          photoId={photo.id}
          revision={photo.revision}
          alt={`Round ${number}, ${VIEW_WORDS[view]}`}
          sizes="(min-width: 64rem) 45vw, 50vw"
          widthPx={photo.widthPx}
          heightPx={photo.heightPx}
        />
        <svg
          viewBox={`0 0 ${PANE_PX} ${paneHeightPx}`}
          aria-hidden
          className={`absolute inset-0 h-full w-full ${PHOTO_INKS}`}
        >
          {marks.map((mark) => (
            <PhotoMark key={mark.id} mark={mark} widthPx={PANE_PX} heightPx={paneHeightPx} />
          ))}
        </svg>
      </span>
      <figcaption>
        <span className="font-bold">Round {number}</span>
        <ul className="text-sm">
          {marks.map((mark) => (
            <li key={mark.id}>{markText(mark)}</li>
          ))}
        </ul>
      </figcaption>
    </figure>
  );
}
