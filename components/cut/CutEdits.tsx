'use client';
import { useRouter } from 'next/navigation';
import { createContext, type ReactNode, useContext, useRef, useState } from 'react';
import { sendJson } from '@/components/net/send';
import type { CutChoices } from '@/db/queries/cuts';
import type { CutForm } from './cut-schema';

export type CutEdit = Omit<CutForm, 'version'>;
type Edit = (change: (now: CutChoices) => CutEdit) => void;

const Edits = createContext<Edit | null>(null);

/** Writes to what is decided before the cut, one after another. @throws Error outside of `CutEdits` */
export function useCutEdit(): Edit {
  const edit = useContext(Edits);
  if (!edit) throw new Error('there is nothing to edit here');
  return edit;
}

interface Props {
  journalId: string;
  choices: CutChoices;
  children: ReactNode;
}

/**
 * Keeps the edits of one page in order: each is made from what the last one left, so that two quick ticks are two ticks. What
 * could not be kept is said above everything else.
 */
export function CutEdits({ journalId, choices, children }: Props) {
  const router = useRouter();
  const now = useRef(choices);
  const line = useRef<Promise<void>>(Promise.resolve());
  const [problem, setProblem] = useState<string | null>(null);
  const send = async (change: (now: CutChoices) => CutEdit) => {
    const body = { ...change(now.current), version: now.current.version };
    const sent = await sendJson<CutChoices>('PATCH', `/api/journals/${journalId}/cut`, body);
    if (sent.ok) now.current = sent.value;
    else if (sent.status === 409) now.current = sent.problem.theirs as CutChoices;
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  const edit: Edit = (change) => {
    line.current = line.current.then(() => send(change));
  };
  return (
    <Edits.Provider value={edit}>
      {problem ? (
        <p role="alert" className="no-print mb-4 border-l-4 border-pin bg-paper px-3 py-2 font-bold">
          {problem}
        </p>
      ) : null}
      {children}
    </Edits.Provider>
  );
}
