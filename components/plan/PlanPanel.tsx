'use client';
import { LinkButton } from '@/components/ui/LinkButton';
import { plannedKey } from '@/components/reading/ReadingPanel';
import type { ChangeFact } from '@/db/queries/round-facts';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { Reading } from '@/diagnosis/reading';
import type { CaseInput } from '@/diagnosis/case-schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { PlannedCard } from './PlannedCard';

interface Props {
  journalId: string;
  knowledge: Knowledge;
  reading: Reading | null;
  plan: ChangeFact[];
  problem: string | null;
  fitted: Pick<CaseInput, 'body' | 'cloth'>;
  unit: LengthUnit;
  onSet: (id: string, edit: { plannedMm?: number; reason?: string }) => void;
  onDrop: (id: string) => void;
}

const MUSLIN_WORDS = {
  're-baste': 'Re-baste this muslin: no new cloth needed.',
  patch: 'Patch this muslin: let a strip in where cloth is wanted.',
  'new-cloth': 'Cut new cloth for it.',
} as const;

/** What is changed before the next round, and what was left out of it and why. */
export function PlanPanel({
  journalId,
  knowledge,
  reading,
  plan,
  problem,
  fitted,
  unit,
  onSet,
  onDrop,
}: Props) {
  const isMade = plan.some((change) => change.madeAt !== null);
  const rowOf = (change: ChangeFact) =>
    reading?.corrections.find(
      (one) => plannedKey(one.correction, one.side) === plannedKey(change.correction, change.side),
    );
  const stopsOf = (change: ChangeFact) => {
    const row = rowOf(change);
    const { firstMm, capRoundMm, capTotalMm } = row ?? {};
    return firstMm && capRoundMm && capTotalMm ? { firstMm, capRoundMm, capTotalMm } : null;
  };
  const nameOf = (id: string) =>
    [...knowledge.corrections, ...knowledge.causes].find((one) => one.id === id)?.name ?? id;
  return (
    <div className="grid gap-4">
      {problem ? (
        <p role="alert" className="border-l-4 border-pin bg-paper px-3 py-2 font-bold">
          {problem}
        </p>
      ) : null}
      {plan.length === 0 ? (
        <p className="max-w-prose text-graphite">
          Nothing yet. Take one change from the reading; at most three that can be told apart.
        </p>
      ) : (
        <ol className="grid gap-4">
          {plan.map((change) => {
            const correction = knowledge.corrections.find((one) => one.id === change.correction);
            return correction ? (
              <PlannedCard
                key={change.id}
                change={change}
                correction={correction}
                stops={stopsOf(change)}
                fitted={fitted}
                unit={unit}
                onSet={(edit) => onSet(change.id, edit)}
                onDrop={() => onDrop(change.id)}
              />
            ) : null;
          })}
        </ol>
      )}
      {reading && plan.length > 0 ? <p className="font-bold">{MUSLIN_WORDS[reading.muslin]}</p> : null}
      {reading && reading.leftOut.length > 0 && plan.length > 0 ? (
        <ul className="grid gap-1 text-sm text-graphite">
          {reading.leftOut.slice(0, 4).map(({ id, why }) => (
            <li key={id}>
              Left out: {nameOf(id)}. {why}
            </li>
          ))}
        </ul>
      ) : null}
      {plan.length > 0 && !isMade ? (
        <div>
          <LinkButton look="chalk" href={`/journals/${journalId}/rounds/new`}>
            Changed and sewn: begin the next round
          </LinkButton>
        </div>
      ) : null}
    </div>
  );
}
