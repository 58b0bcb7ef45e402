'use client';
import { EyeOff } from 'lucide-react';
import { useEffect, useState } from 'react';
import useSWR from 'swr';
import { useConversation } from '@/components/conversation/useConversation';
import { MarkedPhoto } from '@/components/marks/MarkedPhoto';
import { fetchJson } from '@/components/net/send';
import type { ReadingTools } from '@/components/photo-reading/PhotoReading';
import { PhotoFacts } from '@/components/photos/PhotoFacts';
import { PhotoUploader } from '@/components/photos/PhotoUploader';
import { usePhotoEdits } from '@/components/photos/usePhotoEdits';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { DeskRoundDto } from '@/db/queries/desk';
import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { PhotoStrip } from './PhotoStrip';
import { useCover } from './useCover';

interface Props {
  round: DeskRoundDto;
  photos: PhotoDto[];
  userId: string;
  isOwner: boolean;
  view: View;
  onView: (view: View) => void;
  previousRoundId: string | null;
  /** What marks are read with, once it is here. */
  reading?: ReadingTools | undefined;
}

/** The photos of a round: one on the table to mark, the others in a strip; one touch covers them all. */
export function PhotoStage({
  round,
  photos: first,
  userId,
  isOwner,
  view,
  onView,
  previousRoundId,
  reading,
}: Props) {
  const url = `/api/rounds/${round.id}/photos`;
  const { data: photos = first, mutate } = useSWR<PhotoDto[]>(url, fetchJson, { fallbackData: first });
  const others = useConversation(round.id).data?.marks ?? [];
  const [chosenId, setChosenId] = useState(first[0]?.id ?? null);
  const { isCovered, cover, uncover } = useCover();
  const chosen =
    photos.find(({ id }) => id === chosenId) ?? photos.find((photo) => photo.view === view) ?? photos[0];
  const chosenView = chosen?.view;
  useEffect(() => {
    if (chosenView) onView(chosenView);
  }, [chosenView, onView]);
  const put = (photo: PhotoDto) => {
    const others = (now: PhotoDto[] = first) => now.filter(({ id }) => id !== photo.id);
    const inOrder = (a: PhotoDto, b: PhotoDto) => (a.id < b.id ? -1 : 1);
    void mutate((now) => [...others(now), photo].sort(inOrder), { revalidate: false });
    setChosenId(photo.id);
  };
  const { message, removed, edit, remove, undo } = usePhotoEdits({
    onChanged: put,
    onRemoved: ({ id }) =>
      void mutate((now = first) => now.filter((one) => one.id !== id), { revalidate: false }),
  });
  return (
    <div className="grid gap-4">
      {chosen ? (
        isCovered ? (
          <button
            type="button"
            onClick={uncover}
            className="grid min-h-[60vh] w-full place-items-center bg-ink text-lg font-bold text-cloth"
          >
            Covered. Press to show the photos.
          </button>
        ) : (
          <MarkedPhoto
            key={`${chosen.id} ${chosen.revision}`}
            userId={userId}
            photo={chosen}
            reading={reading}
            others={others.filter(({ photoId }) => photoId === chosen.id)}
            isReadOnly={!round.mayFit}
          />
        )
      ) : null}
      {photos.length > 0 ? (
        <div className="flex flex-wrap items-center justify-between gap-3">
          <PhotoStrip
            photos={photos}
            chosenId={chosen?.id ?? null}
            isCovered={isCovered}
            onChoose={setChosenId}
          />
          <Button onClick={cover} className="min-h-14 px-6">
            <EyeOff aria-hidden size={22} />
            Cover
          </Button>
        </div>
      ) : null}
      {isOwner && chosen && !isCovered ? (
        <PhotoFacts
          photo={chosen}
          onEdit={(change) => void edit(chosen, change)}
          onRemove={() => void remove(chosen)}
        />
      ) : null}
      {removed ? (
        <Notice role="status">
          <p>
            The photo ({VIEW_WORDS[removed.view].toLowerCase()}) is put away, with its marks, for 30 days.
          </p>
          <Button onClick={() => void undo()}>Bring it back</Button>
        </Notice>
      ) : null}
      {message ? (
        <Notice tone="care" role="alert">
          {message}
        </Notice>
      ) : null}
      {isOwner ? (
        <PhotoUploader
          userId={userId}
          roundId={round.id}
          view={view}
          isFolded={photos.length > 0}
          previousRoundId={previousRoundId}
          onAdded={put}
        />
      ) : null}
    </div>
  );
}
