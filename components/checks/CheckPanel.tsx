'use client';
import {
  type CheckAnswer,
  type Edit,
  type Entry,
  entryKey,
  type EvidenceState,
  type Side,
} from '@/components/round/evidence-state';
import { SIDE_OPTIONS } from '@/components/round/side-options';
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
  const answered = knowledge.checks.filter((check) => entryOf(state, check) !== null);
  const isAnswered = new Set(answered.map((check) => check.id));
  const next = asked
    .filter(({ check }) => !isAnswered.has(check))
    .slice(0, ASKED_AT_ONCE)
    .flatMap(({ check }) => knowledge.checks.find((one) => one.id === check) ?? []);
  const others = knowledge.checks.filter((check) => !isAnswered.has(check.id) && !next.includes(check));
  const card = (check: Check) => {
    const entry = entryOf(state, check);
    return (
      <CheckCard
        key={check.id}
        check={check}
        answer={entry?.value ?? null}
        side={entry?.side ?? 'both'}
        unit={unit}
        onAnswer={(value, side) => onEdit(editsFor(entry, check, value, side))}
      />
    );
  };
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

type CheckEntry = Entry & { kind: 'check' };

/** The answer to a check, on whichever side it was given. */
function entryOf(state: EvidenceState, { id }: Check): CheckEntry | null {
  for (const { value: side } of SIDE_OPTIONS) {
    const entry = state.entries[entryKey({ kind: 'check', id, side })];
    if (entry?.kind === 'check' && entry.value !== null) return entry;
  }
  return null;
}

/** Said of another side, it is taken back on the one before. */
function editsFor(had: CheckEntry | null, { id }: Check, value: CheckAnswer | null, side: Side): Edit[] {
  const said: Edit = { kind: 'check', id, side, value };
  return had && had.side !== side ? [said, { kind: 'check', id, side: had.side, value: null }] : [said];
}
