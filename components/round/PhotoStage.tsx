'use client';
import { EyeOff } from 'lucide-react';
import { useEffect, useState } from 'react';
import useSWR from 'swr';
import { MarkedPhoto } from '@/components/marks/MarkedPhoto';
import { fetchJson } from '@/components/net/send';
import { PhotoUploader } from '@/components/photos/PhotoUploader';
import { Button } from '@/components/ui/Button';
import { Disclosure } from '@/components/ui/Disclosure';
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
}

/** The photos of a round: one on the table to mark, the others in a strip; one touch covers them all. */
export function PhotoStage({ round, photos: first, userId, isOwner, view, onView }: Props) {
  const url = `/api/rounds/${round.id}/photos`;
  const { data: photos = first, mutate } = useSWR<PhotoDto[]>(url, fetchJson, { fallbackData: first });
  const [chosenId, setChosenId] = useState(first[0]?.id ?? null);
  const { isCovered, cover, uncover } = useCover();
  const chosen =
    photos.find(({ id }) => id === chosenId) ?? photos.find((photo) => photo.view === view) ?? photos[0];
  const chosenView = chosen?.view;
  useEffect(() => {
    if (chosenView) onView(chosenView);
  }, [chosenView, onView]);
  const added = (photo: PhotoDto) => {
    void mutate((now = []) => [...now.filter(({ id }) => id !== photo.id), photo], { revalidate: false });
    setChosenId(photo.id);
  };
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
          <MarkedPhoto key={`${chosen.id} ${chosen.revision}`} userId={userId} photo={chosen} />
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
      {isOwner ? (
        photos.length === 0 ? (
          <PhotoUploader userId={userId} roundId={round.id} view={view} onAdded={added} />
        ) : (
          <Disclosure summary="Add photos">
            <PhotoUploader userId={userId} roundId={round.id} view={view} onAdded={added} />
          </Disclosure>
        )
      ) : null}
    </div>
  );
}
