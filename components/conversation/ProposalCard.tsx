'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { amountWithBasis } from '@/components/tape/basis-words';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Tick } from '@/components/ui/Tick';
import type { ProposalDto, ProposedChangeDto } from '@/db/queries/proposals';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

interface Props {
  proposal: ProposalDto;
  knowledge: Knowledge;
  unit: LengthUnit;
  isOwner: boolean;
  onAnswered: () => void;
}

const SIDES = { left: ', your left', right: ', your right', both: '' } as const;
const ANSWERS = { taken: 'taken', left: 'not taken' } as const;

function changeWords(change: ProposedChangeDto, knowledge: Knowledge, unit: LengthUnit): string {
  const known = knowledge.corrections.find(({ id }) => id === change.correction);
  const amount = change.plannedMm === null || !known?.amounts ? '' : `: ${amountWithBasis(change.plannedMm, known.amounts, unit)}`; // prettier-ignore
  return `${known?.name ?? change.correction}${SIDES[change.side]}${amount}`;
}

/** A plan that someone proposes, with the reason; its owner takes all of it, some, or none, once. */
export function ProposalCard({ proposal, knowledge, unit, isOwner, onAnswered }: Props) {
  const router = useRouter();
  const { changes, isMine } = proposal;
  const [chosen, setChosen] = useState<ReadonlySet<string>>(() => new Set(changes.map(({ id }) => id)));
  const [problem, setProblem] = useState<string | null>(null);
  const isOpen = isOwner && !isMine && changes.some(({ answer }) => answer === null);
  const answer = async (taken: string[]) => {
    const sent = await sendJson('POST', `/api/proposals/${proposal.id}/answer`, { taken });
    setProblem(sent.ok ? null : sent.problem.message);
    onAnswered();
    router.refresh();
  };
  const toggle = (id: string) => {
    const next = new Set(chosen);
    if (!next.delete(id)) next.add(id);
    setChosen(next);
  };
  return (
    <div className="grid gap-3 border-l-4 border-chalk pl-4">
      <p className="font-bold">{isMine ? 'You propose' : `${proposal.authorName} proposes`}</p>
      <p className="max-w-prose whitespace-pre-line [overflow-wrap:anywhere]">{proposal.reason}</p>
      <ul className="grid gap-1">
        {changes.map((change) => (
          <li key={change.id}>
            {isOpen ? (
              <Tick
                label={changeWords(change, knowledge, unit)}
                checked={chosen.has(change.id)}
                onChange={() => toggle(change.id)}
              />
            ) : (
              `${changeWords(change, knowledge, unit)} (${change.answer ? ANSWERS[change.answer] : 'not answered yet'})`
            )}
          </li>
        ))}
      </ul>
      {problem ? (
        <Notice tone="danger" role="alert">
          {problem}
        </Notice>
      ) : null}
      {isOpen ? (
        <span className="flex flex-wrap gap-3">
          <Button disabled={chosen.size === 0} onClick={() => void answer([...chosen])}>
            {chosen.size === changes.length ? 'Take it into the plan' : 'Take these into the plan'}
          </Button>
          <Button look="quiet" onClick={() => void answer([])}>
            Leave it
          </Button>
        </span>
      ) : null}
    </div>
  );
}
