'use client';
import { lazy, Suspense, useState } from 'react';
import { v7 } from 'uuid';
import type { OthersMark } from '@/components/conversation/useConversation';
import type { ReadingTools } from '@/components/photo-reading/PhotoReading';
import { useLandmarks } from '@/components/photo-reading/useLandmarks';
import { photoSrcSet, photoUrl } from '@/components/photos/PhotoImage';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { SaveLine } from '@/components/round/SaveLine';
import type { PhotoDto } from '@/db/queries/photos';
import { ContestedMarks } from './ContestedMarks';
import { MarkCanvas } from './MarkCanvas';
import { MarkList } from './MarkList';
import { addMark, editMark, removeMark, startHistory } from './model/history';
import { newMark } from './model/mark';
import { useMarks } from './useMarks';
import { useWaitingMarks } from './useWaitingMarks';

interface Props {
  userId: string;
  photo: PhotoDto;
  /** Absent until the knowledge has come. */
  reading?: ReadingTools | undefined;
  others: readonly OthersMark[];
  /** Opened to look at only. */
  isReadOnly: boolean;
}

// The figure and what reads lines come after the photo can be marked.
const FigurePlacer = lazy(() => import('@/components/photo-reading/FigurePlacer').then(({ FigurePlacer: it }) => ({ default: it }))); // prettier-ignore
const PhotoReading = lazy(() => import('@/components/photo-reading/PhotoReading').then(({ PhotoReading: it }) => ({ default: it }))); // prettier-ignore

const NOTHING_YET = startHistory([]);

/** One photo with its marks: drawn on it, and listed beside it. */
export function MarkedPhoto({ userId, photo, reading, others, isReadOnly }: Props) {
  const { id, revision, widthPx, heightPx, view, isMirrored } = photo;
  const { marks, history, saveState, conflicts, act, settle } = useMarks(userId, photo);
  const elsewhere = useWaitingMarks(userId, id);
  const [selected, setSelected] = useState<string | null>(null);
  const figure = useLandmarks(photo);
  const [isPlacing, setPlacing] = useState(false);
  const alt = `${VIEW_WORDS[view]}${isMirrored ? ', in a mirror' : ''}`;
  const src = {
    src: photoUrl(id, revision, '1600'),
    srcSet: photoSrcSet(id, revision),
    widthPx,
    heightPx,
    alt,
  };
  if (isPlacing && view !== 'close-up')
    return (
      <Suspense fallback={null}>
        <FigurePlacer
          photo={{ ...photo, view }}
          tapped={figure.landmarks}
          message={figure.message}
          onKeep={figure.save}
          onClose={() => setPlacing(false)}
        />
      </Suspense>
    );
  return (
    <div className="grid gap-3">
      <MarkCanvas
        photo={src}
        history={history ?? NOTHING_YET}
        act={act}
        selected={selected}
        onSelect={setSelected}
        isReadOnly={isReadOnly || history === null}
        others={others}
      />
      {isReadOnly ? null : <SaveLine state={saveState} />}
      {elsewhere > 0 ? (
        <p className="text-sm text-graphite">On this phone only: {elsewhere} waiting on other photos.</p>
      ) : null}
      <ContestedMarks marks={marks} conflicts={conflicts} onSettle={settle} />
      {isReadOnly ? null : (
        <MarkList
          marks={marks}
          selected={selected}
          onSelect={setSelected}
          onAdd={(kind, points) => {
            const mark = newMark(v7(), kind, 2, points);
            act((now) => addMark(now, mark));
            setSelected(mark.id);
          }}
          onEdit={(markId, edit, run) => act((now) => editMark(now, markId, edit, run))}
          onDelete={(markId) => {
            act((now) => removeMark(now, markId));
            setSelected(null);
          }}
        />
      )}
      {reading && figure.isLoaded && !isReadOnly ? (
        <Suspense fallback={null}>
          {' '}
          <PhotoReading
            photo={photo}
            tapped={figure.landmarks}
            marks={marks}
            selected={selected}
            onPlace={() => setPlacing(true)}
            {...reading}
          />
        </Suspense>
      ) : null}
    </div>
  );
}
