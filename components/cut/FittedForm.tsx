'use client';
import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { sendJson } from '@/components/net/send';
import { FormFooter } from '@/components/ui/FormFooter';
import { TextField } from '@/components/ui/TextField';
import { MEASURES, type MeasureId } from '@/diagnosis/measuring/measures';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

/** What a finished pair can be measured by. */
const FINISHED: readonly MeasureId[] = ['waist', 'hip', 'seated-depth', 'front-crotch-length', 'back-crotch-length', 'thigh', 'knee', 'inseam']; // prettier-ignore

interface Props {
  journalId: string;
  unit: LengthUnit;
  kept: { measure: string; typed: string }[];
}

/** Keeps what a pair that fits measures, between seamlines: the next draft is held against that. */
export function FittedForm({ journalId, unit, kept }: Props) {
  const router = useRouter();
  const [texts, setTexts] = useState<Record<string, string>>(Object.fromEntries(kept.map(({ measure, typed }) => [measure, typed]))); // prettier-ignore
  const [problem, setProblem] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const save = async (event: FormEvent) => {
    event.preventDefault();
    const measures = FINISHED.flatMap((measure) => {
      const typed = (texts[measure] ?? '').trim();
      return typed === '' ? [] : [{ measure, typed }];
    });
    setBusy(true);
    const sent = await sendJson('PUT', `/api/journals/${journalId}/fitted`, { unit, measures });
    setBusy(false);
    const first = sent.ok ? null : Object.values(sent.problem.fields ?? {})[0]?.[0];
    setProblem(sent.ok ? null : (first ?? sent.problem.message));
    router.refresh();
  };
  return (
    <form noValidate onSubmit={save} className="grid max-w-xl gap-3">
      {MEASURES.filter(({ id }) => FINISHED.includes(id)).map(({ id, name }) => (
        <TextField
          key={id}
          label={`${name} of the garment`}
          placeholder={unit}
          autoComplete="off"
          maxLength={24}
          value={texts[id] ?? ''}
          onChange={(event) => setTexts((all) => ({ ...all, [id]: event.target.value }))}
        />
      ))}
      <FormFooter action="Keep what fitted" isBusy={isBusy} problem={problem} />
    </form>
  );
}
