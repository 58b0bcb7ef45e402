'use client';
import { useState } from 'react';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { Choice } from '@/components/ui/Choice';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { type View, VIEWS } from '@/diagnosis/garments/schema';
import { LaidTogether } from './LaidTogether';
import { LonePhoto } from './LonePhoto';

export interface RoundPhotos {
  number: number;
  photos: MarkedPhotoDto[];
}

/** The same view of two rounds, with the marks of both: next to each other, or laid over one another by the figure. */
export function PhotoPairs({ before, after }: { before: RoundPhotos; after: RoundPhotos }) {
  const views = VIEWS.filter((view) =>
    [...before.photos, ...after.photos].some((photo) => photo.view === view),
  );
  const both = views.find((view) =>
    [before, after].every(({ photos }) => photos.some((photo) => photo.view === view)),
  );
  const [view, setView] = useState<View | null>(both ?? views[0] ?? null);
  if (!view) return <p className="text-graphite">Neither round has a photo yet.</p>;
  const of = ({ number, photos }: RoundPhotos) => ({
    number,
    photo: photos.find((photo) => photo.view === view),
  });
  const [first, second] = [of(before), of(after)];
  return (
    <div className="grid gap-4">
      <Choice
        legend="View"
        hidesLegend
        options={views.map((value) => ({ value, label: VIEW_WORDS[value] }))}
        value={view}
        onChange={setView}
      />
      {first.photo && second.photo ? (
        <LaidTogether
          key={`${first.photo.id} ${second.photo.id}`}
          before={{ number: first.number, photo: first.photo }}
          after={{ number: second.number, photo: second.photo }}
        />
      ) : (
        <div className="grid grid-cols-2 gap-2 md:gap-6">
          <LonePhoto {...first} />
          <LonePhoto {...second} />
        </div>
      )}
    </div>
  );
}
