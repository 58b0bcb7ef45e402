'use client';
import { PhotoImage } from '@/components/photos/PhotoImage';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { join } from '@/components/ui/styles';
import type { PhotoDto } from '@/db/queries/photos';

interface Props {
  photos: PhotoDto[];
  chosenId: string | null;
  isCovered: boolean;
  onChoose: (id: string) => void;
}

/** The photos of a round in a row; choosing one puts it on the table. */
export function PhotoStrip({ photos, chosenId, isCovered, onChoose }: Props) {
  return (
    <ul aria-label="Photos of this round" className="flex flex-wrap gap-2">
      {photos.map((photo) => (
        <li key={photo.id}>
          <button
            type="button"
            aria-pressed={photo.id === chosenId}
            onClick={() => onChoose(photo.id)}
            className={join(
              'grid w-18 gap-1 border-2 p-1 text-sm',
              photo.id === chosenId ? 'border-ink font-bold' : 'border-transparent',
            )}
          >
            <span className="block aspect-[3/4] overflow-hidden bg-weave">
              {isCovered ? null : (
                <PhotoImage photoId={photo.id} revision={photo.revision} alt="" sizes="72px" fit="cover" />
              )}
            </span>
            {VIEW_WORDS[photo.view]}
          </button>
        </li>
      ))}
    </ul>
  );
}
