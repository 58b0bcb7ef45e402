'use client';
import { useState } from 'react';
import { v7 } from 'uuid';
import type { OthersMark } from '@/components/conversation/useConversation';
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
  others: readonly OthersMark[];
  /** Opened to look at only. */
  isReadOnly: boolean;
}

const NOTHING_YET = startHistory([]);

/** One photo with its marks: drawn on it, and listed beside it. */
export function MarkedPhoto({ userId, photo, others, isReadOnly }: Props) {
  const { id, revision, widthPx, heightPx, view, isMirrored } = photo;
  const { marks, history, saveState, conflicts, act, settle } = useMarks(userId, photo);
  const elsewhere = useWaitingMarks(userId, id);
  const [selected, setSelected] = useState<string | null>(null);
  const alt = `${VIEW_WORDS[view]}${isMirrored ? ', in a mirror' : ''}`;
  const src = {
    src: photoUrl(id, revision, '1600'),
    srcSet: photoSrcSet(id, revision),
    widthPx,
    heightPx,
    alt,
  };
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
    </div>
  );
}
