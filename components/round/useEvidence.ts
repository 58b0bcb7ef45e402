'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import { sendJson } from '@/components/net/send';
import { readDraft, writeDraft } from '@/components/offline/drafts';
import type { DeskRoundDto } from '@/db/queries/desk';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import {
  type Acknowledged,
  acknowledge,
  applyEdits,
  dirtyEntries,
  type Edit,
  type Entry,
  evidenceFrom,
  type EvidenceState,
  formOf,
  withDrafts,
} from './evidence-state';

export type SaveState =
  { kind: 'saved' } | { kind: 'saving' } | { kind: 'waiting'; count: number; message: string };

const PAUSE_MS = 600;
const RETRY_MS = 8000;

interface Options {
  userId: string;
  round: DeskRoundDto;
  unit: LengthUnit;
}

/**
 * What the person found in a round: theirs at once, kept on the device until the server has it, sent in small batches. A lost
 * connection loses nothing.
 */
export function useEvidence({ userId, round, unit }: Options) {
  const [state, setState] = useState(() => evidenceFrom(round, unit));
  const [saveState, setSaveState] = useState<SaveState>({ kind: 'saved' });
  const [conflicts, setConflicts] = useState<Acknowledged['conflicts']>([]);
  const [isLoaded, setIsLoaded] = useState(false);
  const isSending = useRef(false);
  const draftKey = `evidence ${round.id}`;

  useEffect(() => {
    let isGone = false;
    void readDraft<Entry[]>(userId, draftKey).then((drafts) => {
      if (isGone) return;
      if (drafts) setState((now) => withDrafts(now, drafts));
      setIsLoaded(true);
    });
    return () => {
      isGone = true;
    };
  }, [userId, draftKey]);

  const send = useCallback(
    async (now: EvidenceState) => {
      const dirty = dirtyEntries(now).filter(({ isContested }) => !isContested);
      if (dirty.length === 0 || isSending.current) return;
      isSending.current = true;
      setSaveState({ kind: 'saving' });
      const sent = await sendJson<Acknowledged>('PUT', `/api/rounds/${round.id}/evidence`, formOf(dirty));
      isSending.current = false;
      if (!sent.ok)
        return setSaveState({ kind: 'waiting', count: dirty.length, message: sent.problem.message });
      setConflicts(sent.value.conflicts);
      setSaveState({ kind: 'saved' });
      setState((newer) => acknowledge(newer, now.edits, sent.value));
    },
    [round.id],
  );

  useEffect(() => {
    // Not before the drafts were read: the empty state of a fresh page would wipe them.
    if (!isLoaded) return;
    const dirty = dirtyEntries(state);
    void writeDraft(userId, draftKey, dirty.length > 0 ? dirty : null);
    if (dirty.length === 0) return;
    const pause = setTimeout(() => void send(state), PAUSE_MS);
    const retry = setInterval(() => void send(state), RETRY_MS);
    const online = () => void send(state);
    window.addEventListener('online', online);
    return () => {
      clearTimeout(pause);
      clearInterval(retry);
      window.removeEventListener('online', online);
    };
  }, [state, send, isLoaded, userId, draftKey]);

  const edit = useCallback((edits: Edit[]) => setState((now) => applyEdits(now, edits)), []);
  return { state, edit, saveState, conflicts };
}
