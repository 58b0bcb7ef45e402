'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import useSWR from 'swr';
import { fetchJson, sendJson } from '@/components/net/send';
import { KEPT_FOR_UNDO, readDraft, writeDraft } from '@/components/offline/drafts';
import type { SaveState } from '@/components/round/useEvidence';
import type { MarkDto } from '@/db/queries/marks';
import { type MarkHistory, replaceMarks, startHistory } from './model/history';
import { type Mark, type MarkSeverity, photoPoint } from './model/mark';
import {
  batchOf,
  batchSize,
  type Known,
  knownAfter,
  type MarkAnswer,
  type MarkConflict,
  mergeServer,
  type SavedMark,
} from './model/sync';

interface Kept {
  history: MarkHistory;
  known: Known;
}

const PAUSE_MS = 600;
const RETRY_MS = 8000;

const savedMark = ({ points, severity, ...mark }: MarkDto): SavedMark => ({
  ...mark,
  severity: Math.min(3, Math.max(1, severity)) as MarkSeverity,
  points: points.map(({ x, y }) => photoPoint(x, y)),
});

/** Before the server has answered there is nothing to lay under: an empty list would read as all marks deleted. */
function layOver(kept: Kept, server: SavedMark[] | null): Kept {
  if (!server) return kept;
  const { history, known } = kept;
  const merged = mergeServer(history.marks, known, server);
  return { history: replaceMarks(history, merged.marks), known: merged.known };
}

interface ServerAnswer {
  saved: MarkDto[];
  deleted: string[];
  conflicts: { id: string; theirs: MarkDto | null }[];
}
const answerOf = ({ saved, deleted, conflicts }: ServerAnswer): MarkAnswer => ({
  saved: saved.map(savedMark),
  deleted,
  conflicts: conflicts.map(({ id, theirs }) => ({ id, theirs: theirs && savedMark(theirs) })),
});

/**
 * The marks of one photo: the person's at once, with undo that outlives a reload; sent in batches behind; kept on the device
 * until the server has them.
 */
export function useMarks(userId: string, photo: { id: string; revision: number }) {
  const [kept, setKept] = useState<Kept | null>(null);
  const [saveState, setSaveState] = useState<SaveState>({ kind: 'saved' });
  const [conflicts, setConflicts] = useState<MarkConflict[]>([]);
  const isSending = useRef(false);
  const keptKey = `${KEPT_FOR_UNDO}marks ${photo.id} ${photo.revision}`;
  const waitingKey = `marks ${photo.id}`;
  const url = `/api/photos/${photo.id}/marks`;
  const server = useRef<SavedMark[] | null>(null);
  const { data, error } = useSWR<{ revision: number; marks: MarkDto[] }>(url, fetchJson, {
    onSuccess: ({ marks }) => {
      server.current = marks.map(savedMark);
      setKept((now) => now && layOver(now, server.current));
    },
  });

  // What was kept on the device comes first; the server's marks are laid under it as soon as both are there.
  useEffect(() => {
    let isGone = false;
    void readDraft<Kept>(userId, keptKey).then((draft) => {
      if (!isGone)
        setKept((now) => now ?? layOver(draft ?? { history: startHistory([]), known: {} }, server.current));
    });
    return () => {
      isGone = true;
    };
  }, [userId, keptKey]);

  const send = useCallback(
    async ({ history, known }: Kept) => {
      const batch = batchOf(history.marks, known);
      const contested = new Set(conflicts.map(({ id }) => id));
      const upserts = batch.upserts.filter(({ mark }) => !contested.has(mark.id));
      const deletes = batch.deletes.filter(({ id }) => !contested.has(id));
      const size = upserts.length + deletes.length;
      if (size === 0 || isSending.current) return;
      isSending.current = true;
      setSaveState({ kind: 'saving' });
      const sent = await sendJson<ServerAnswer>('POST', url, { revision: photo.revision, upserts, deletes });
      isSending.current = false;
      if (!sent.ok) return setSaveState({ kind: 'waiting', count: size, message: sent.problem.message });
      const answer = answerOf(sent.value);
      setSaveState({ kind: 'saved' });
      setConflicts(answer.conflicts);
      setKept((now) => now && { ...now, known: knownAfter(now.known, answer) });
    },
    [conflicts, photo.revision, url],
  );

  useEffect(() => {
    if (!kept) return;
    const waiting = batchSize(batchOf(kept.history.marks, kept.known));
    void writeDraft(userId, keptKey, kept);
    void writeDraft(userId, waitingKey, waiting || null);
    if (waiting === 0) return;
    const pause = setTimeout(() => void send(kept), PAUSE_MS);
    const retry = setInterval(() => void send(kept), RETRY_MS);
    const online = () => void send(kept);
    window.addEventListener('online', online);
    return () => {
      clearTimeout(pause);
      clearInterval(retry);
      window.removeEventListener('online', online);
    };
  }, [kept, send, userId, keptKey, waitingKey]);

  const act = useCallback((step: (history: MarkHistory) => MarkHistory) => {
    setKept((now) => now && { ...now, history: step(now.history) });
  }, []);

  /** The person has chosen between two versions: theirs is taken over, or one's own is sent knowing of theirs. */
  const settle = useCallback((conflict: MarkConflict, keepsMine: boolean) => {
    setConflicts((now) => now.filter(({ id }) => id !== conflict.id));
    setKept((now) => {
      if (!now) return now;
      const known = { ...now.known };
      if (conflict.theirs) known[conflict.id] = conflict.theirs;
      else delete known[conflict.id];
      if (keepsMine) return { ...now, known };
      const others = now.history.marks.filter(({ id }) => id !== conflict.id);
      return {
        history: replaceMarks(now.history, conflict.theirs ? [...others, conflict.theirs] : others),
        known,
      };
    });
  }, []);

  const marks: Mark[] = kept?.history.marks ?? [];
  return {
    marks,
    history: kept?.history ?? null,
    isFailed: Boolean(error) && !data,
    saveState,
    conflicts,
    act,
    settle,
  };
}
