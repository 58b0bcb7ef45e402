'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import { type Sent, sendJson } from '@/components/net/send';
import { Choice } from '@/components/ui/Choice';
import { FormFooter } from '@/components/ui/FormFooter';
import { Section } from '@/components/ui/Section';
import { TextField } from '@/components/ui/TextField';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { type Made, MadeList, type PlannedChange, plannedText } from './MadeList';
import { MuslinFields } from './MuslinFields';
import { type MuslinForm, muslinSchema } from './round-schema';

type Begun = 'new-cloth' | 're-baste' | 'patch';

interface Props {
  journalId: string;
  unit: LengthUnit;
  today: string;
  muslin: MuslinForm;
  /** Planned in the round before and not yet said to be made. */
  planned: PlannedChange[];
  isFirst: boolean;
}

/** Says what was made of each change, one after another; the first failure stops and is shown, and a second try goes on from there. */
async function saveMade(
  planned: PlannedChange[],
  made: Record<string, Made>,
  unit: LengthUnit,
): Promise<Sent<unknown>> {
  for (const change of planned) {
    const { isMade, typed } = made[change.id] ?? { isMade: true, typed: plannedText(change, unit) };
    if (!isMade) continue;
    const body = {
      version: change.version,
      isMade: true,
      made: change.plannedMm === null ? null : { typed, unit },
    };
    const sent = await sendJson('PATCH', `/api/changes/${change.id}`, body);
    // Made by an earlier try that lost its answer: the row has moved on, and that is what was wanted.
    if (!sent.ok && sent.status !== 409) return sent;
  }
  return { ok: true, value: null };
}

export function RoundStartForm({ journalId, unit, today, muslin, planned, isFirst }: Props) {
  const router = useRouter();
  const [id] = useState(() => v7());
  const [begun, setBegun] = useState<Begun>(isFirst ? 'new-cloth' : 're-baste');
  const [wornOn, setWornOn] = useState(today);
  const [made, setMade] = useState<Record<string, Made>>({});
  const [problem, setProblem] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const form = useForm<MuslinForm>({ resolver: zodResolver(muslinSchema), defaultValues: muslin });

  const save = async (event: FormEvent) => {
    event.preventDefault();
    if (begun === 'new-cloth' && !(await form.trigger())) return;
    setBusy(true);
    const changed = await saveMade(planned, made, unit);
    const round = {
      id,
      wornOn: wornOn || null,
      ...(begun === 'new-cloth' ? { begun, muslin: form.getValues() } : { begun }),
    };
    const sent: Sent<{ number: number }> = changed.ok
      ? await sendJson('POST', `/api/journals/${journalId}/rounds`, round)
      : changed;
    setBusy(false);
    if (!sent.ok) return setProblem(sent.problem.message);
    router.push(`/journals/${journalId}/rounds/${sent.value.number}`);
    router.refresh();
  };

  return (
    <form onSubmit={save} noValidate className="grid max-w-2xl gap-8">
      {planned.length > 0 ? (
        <Section title="What was really made">
          <MadeList
            planned={planned}
            unit={unit}
            made={made}
            onChange={(changeId, now) => setMade((all) => ({ ...all, [changeId]: now }))}
          />
        </Section>
      ) : null}
      <Section title={isFirst ? 'The muslin' : 'On which muslin'}>
        {isFirst ? null : (
          <Choice
            legend="This round is"
            options={[
              { value: 're-baste', label: 'The same, basted again' },
              { value: 'patch', label: 'The same, patched' },
              { value: 'new-cloth', label: 'New cloth' },
            ]}
            value={begun}
            onChange={setBegun}
          />
        )}
        {begun === 'new-cloth' ? <MuslinFields form={form} /> : null}
        <TextField
          type="date"
          label="Worn on"
          value={wornOn}
          onChange={(event) => setWornOn(event.target.value)}
        />
      </Section>
      <FormFooter action="Begin the round" isBusy={isBusy} problem={problem} />
    </form>
  );
}
