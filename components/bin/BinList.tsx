'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { dayWords } from '@/components/sharing/sharing-words';
import { Button } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { Notice } from '@/components/ui/Notice';
import type { BinnedDto } from '@/db/queries/bin-list';

const KINDS = { wearer: 'Wearer', pattern: 'Pattern', journal: 'Journal', round: 'Round', photo: 'Photo' } as const; // prettier-ignore

/** What was put away, each with a way back. */
export function BinList({ binned }: { binned: BinnedDto[] }) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const restore = async ({ kind, id }: BinnedDto) => {
    const sent = await sendJson('POST', `/api/bin/${kind}/${id}/restore`);
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  if (binned.length === 0)
    return (
      <EmptyState title="Nothing is put away">
        <p>What you remove waits here for a while, so that it can be brought back.</p>
      </EmptyState>
    );
  return (
    <div className="grid gap-4">
      {problem ? (
        <Notice tone="danger" role="alert">
          {problem}
        </Notice>
      ) : null}
      <ul className="grid max-w-2xl gap-3">
        {binned.map((one) => (
          <li
            key={`${one.kind} ${one.id}`}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-seam pb-3"
          >
            <span className="grid min-w-0">
              <span className="font-bold [overflow-wrap:anywhere]">{one.name}</span>
              <span className="text-sm text-graphite">
                {[KINDS[one.kind], one.place, `put away on ${dayWords(one.deletedAt)}`]
                  .filter(Boolean)
                  .join(', ')}
              </span>
            </span>
            <Button aria-label={`Bring ${one.name} back`} onClick={() => void restore(one)}>
              Bring it back
            </Button>
          </li>
        ))}
      </ul>
    </div>
  );
}
