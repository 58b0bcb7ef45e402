'use client';
import { type Edit, entryKey, type EvidenceState } from '@/components/round/evidence-state';
import { Disclosure } from '@/components/ui/Disclosure';
import type { Check, Knowledge } from '@/diagnosis/garments/schema';
import type { CheckRow } from '@/diagnosis/reading';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { CheckCard } from './CheckCard';

interface Props {
  knowledge: Knowledge;
  asked: CheckRow[];
  state: EvidenceState;
  unit: LengthUnit;
  onEdit: (edits: Edit[]) => void;
}

const ASKED_AT_ONCE = 2;

/** The tests that would settle most for least trouble, then those already answered, then all. */
export function CheckPanel({ knowledge, asked, state, unit, onEdit }: Props) {
  const answered = knowledge.checks.filter((check) => answerOf(state, check) !== null);
  const isAnswered = new Set(answered.map((check) => check.id));
  const next = asked
    .filter(({ check }) => !isAnswered.has(check))
    .slice(0, ASKED_AT_ONCE)
    .flatMap(({ check }) => knowledge.checks.find((one) => one.id === check) ?? []);
  const others = knowledge.checks.filter((check) => !isAnswered.has(check.id) && !next.includes(check));
  const card = (check: Check) => (
    <CheckCard
      key={check.id}
      check={check}
      answer={answerOf(state, check)}
      side="both"
      unit={unit}
      onAnswer={(value, side) => onEdit([{ kind: 'check', id: check.id, side, value }])}
    />
  );
  return (
    <div className="grid gap-4">
      <p className="border-l-4 border-basting pl-3 text-sm">
        Change straight pins for safety pins or tacking before you sit, bend or walk. Nothing is cut or
        unpicked on a person.
      </p>
      {next.length > 0 ? (
        next.map(card)
      ) : (
        <p className="text-graphite">No test would change the plan just now.</p>
      )}
      {answered.length > 0 ? (
        <Disclosure summary={`Answered: ${answered.length}`}>{answered.map(card)}</Disclosure>
      ) : null}
      <Disclosure summary="All other tests">{others.map(card)}</Disclosure>
    </div>
  );
}

function answerOf(state: EvidenceState, check: Check) {
  const entry = state.entries[entryKey({ kind: 'check', id: check.id, side: 'both' })];
  return entry?.kind === 'check' ? entry.value : null;
}
