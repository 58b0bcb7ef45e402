import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Disclosure } from '@/components/ui/Disclosure';
import type { PhotoDto } from '@/db/queries/photos';
import type { PhotoEdit } from './usePhotoEdits';
import { TAKEN_OPTIONS, VIEW_OPTIONS } from './view-words';

interface Props {
  photo: PhotoDto;
  onEdit: (edit: PhotoEdit) => void;
  onRemove: () => void;
}

/** What this one photo shows, where several were added under one word; and the way to put it away. */
export function PhotoFacts({ photo, onEdit, onRemove }: Props) {
  return (
    <Disclosure summary="About this photo">
      <Choice
        legend="This photo shows"
        options={VIEW_OPTIONS}
        value={photo.view}
        onChange={(view) => onEdit({ view })}
      />
      <Choice
        legend="This photo was taken"
        options={TAKEN_OPTIONS}
        value={photo.isMirrored ? 'mirror' : 'camera'}
        onChange={(taken) => onEdit({ isMirrored: taken === 'mirror' })}
      />
      <div>
        <Button onClick={onRemove}>Put this photo away</Button>
      </div>
    </Disclosure>
  );
}
