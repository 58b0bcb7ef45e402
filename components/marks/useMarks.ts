'use client';
import { useCallback, useEffect, useState, useSyncExternalStore } from 'react';
import useSWR, { useSWRConfig } from 'swr';
import { fetchJson } from '@/components/net/send';
import type { MarkDto } from '@/db/queries/marks';
import { savedMark, type ServerAnswer } from './mark-answers';
import { MarkKeeper } from './mark-keeper';
import type { MarkHistory } from './model/history';
import type { Mark } from './model/mark';
import type { MarkConflict } from './model/sync';

interface OnServer {
  revision: number;
  marks: MarkDto[];
}
const NO_MARKS: Mark[] = [];

/** What the server holds once it has answered. */
function afterAnswer({ revision, marks }: OnServer, { saved, deleted }: ServerAnswer): OnServer {
  const touched = new Set([...deleted, ...saved.map(({ id }) => id)]);
  return { revision, marks: [...marks.filter(({ id }) => !touched.has(id)), ...saved] };
}

/**
 * The marks of one photo: the person's at once, with undo that outlives a reload; sent in batches behind; kept on the device
 * until the server has them. One photo and one person for as long as it is mounted.
 */
export function useMarks(userId: string, photo: { id: string; revision: number }) {
  const url = `/api/photos/${photo.id}/marks`;
  const { mutate } = useSWRConfig();
  const [keeper] = useState(
    () =>
      new MarkKeeper({
        userId,
        photo,
        // An answer that was asked for before this one is older; writing the cache lets it fall.
        onAnswer: (answer) =>
          void mutate<OnServer>(url, (now) => now && afterAnswer(now, answer), { revalidate: false }),
      }),
  );
  useSWR<OnServer>(url, fetchJson, {
    onSuccess: ({ marks }) => keeper.layUnder(marks.map(savedMark)),
  });
  useEffect(() => {
    void keeper.open();
    return () => keeper.close();
  }, [keeper]);
  const { kept, saveState, conflicts } = useSyncExternalStore(
    keeper.subscribe,
    keeper.snapshot,
    keeper.snapshot,
  );
  const act = useCallback((step: (history: MarkHistory) => MarkHistory) => keeper.act(step), [keeper]);
  const settle = useCallback(
    (conflict: MarkConflict, keepsMine: boolean) => keeper.settle(conflict, keepsMine),
    [keeper],
  );
  const history = kept?.history ?? null;
  return { marks: history?.marks ?? NO_MARKS, history, saveState, conflicts, act, settle };
}
