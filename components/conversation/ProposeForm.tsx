'use client';
import { type FormEvent, useState } from 'react';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import type { Proposal } from '@/components/plan/usePlan';
import { Button } from '@/components/ui/Button';
import { FormFooter } from '@/components/ui/FormFooter';
import { TextArea } from '@/components/ui/TextArea';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import type { ProposalForm } from './conversation-schema';

interface Props {
  roundId: string;
  knowledge: Knowledge;
  unit: LengthUnit;
  /** Taken from the reading. */
  changes: readonly Proposal[];
  onDrop: (change: Proposal) => void;
  onProposed: () => void;
}

/** A plan for somebody else’s round: changes taken from the reading, and why. They decide. */
export function ProposeForm({ roundId, knowledge, unit, changes, onDrop, onProposed }: Props) {
  const [id, setId] = useState(() => v7());
  const [reason, setReason] = useState('');
  const [isBusy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const nameOf = (correction: string) =>
    knowledge.corrections.find((one) => one.id === correction)?.name ?? correction;
  const send = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    const body: ProposalForm = {
      id,
      reason,
      changes: changes.map(({ amountMm, ...named }) => ({
        ...named,
        id: v7(),
        reason: '',
        amount: amountMm === null ? null : { typed: amountText(amountMm, unit), unit },
      })),
    };
    const sent = await sendJson('POST', `/api/rounds/${roundId}/proposals`, body);
    setBusy(false);
    const fields = sent.ok ? undefined : sent.problem.fields;
    setProblem(sent.ok ? null : (fields?.reason?.[0] ?? fields?.changes?.[0] ?? sent.problem.message));
    if (!sent.ok) return;
    setId(v7());
    setReason('');
    onProposed();
  };
  if (changes.length === 0)
    return <p className="max-w-prose text-graphite">Take a change from the reading to propose it.</p>;
  return (
    <form onSubmit={(event) => void send(event)} noValidate className="grid gap-4">
      <ul className="grid gap-2">
        {changes.map((change) => (
          <li key={`${change.correction}/${change.side}`} className="flex flex-wrap items-center gap-3">
            <span>{nameOf(change.correction)}</span>
            <Button look="quiet" onClick={() => onDrop(change)}>
              Leave it out
            </Button>
          </li>
        ))}
      </ul>
      <TextArea
        label="Why"
        value={reason}
        maxLength={2000}
        onChange={(event) => setReason(event.target.value)}
      />
      <FormFooter action="Propose it" isBusy={isBusy} problem={problem} />
    </form>
  );
}
