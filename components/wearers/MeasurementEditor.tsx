'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { FormFooter } from '@/components/ui/FormFooter';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import { type Measure, MEASURE_WORDS, MEASURES } from './measurement-schema';

type Form = Record<Measure, string> & { measuredOn: string; takenAlone: boolean };

interface Props {
  wearerId: string;
  unit: LengthUnit;
  today: string;
}

const lengthError = (unit: LengthUnit) => (text: string) => {
  if (text.trim() === '') return true;
  const parsed = parseAmount(text, unit);
  return parsed.kind === 'amount' || parsed.message;
};

/** A sitting with the tape: what is left empty is skipped. */
export function MeasurementEditor({ wearerId, unit, today }: Props) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const blank: Form = {
    waist: '',
    hip: '',
    thigh: '',
    knee: '',
    calf: '',
    measuredOn: today,
    takenAlone: true,
  };
  const { register, handleSubmit, reset, formState } = useForm<Form>({ defaultValues: blank });
  const save = handleSubmit(async ({ measuredOn, takenAlone, ...typed }) => {
    const values = MEASURES.filter((measure) => typed[measure].trim() !== '').map((measure) => ({
      measure,
      typed: typed[measure].trim(),
    }));
    if (values.length === 0) return setProblem('Take at least one measure, then save.');
    const set = { id: v7(), measuredOn, takenAlone, waistPlace: 'band', note: '', unit, values };
    const sent = await sendJson('POST', `/api/wearers/${wearerId}/measurements`, set);
    if (!sent.ok) return setProblem(sent.problem.message);
    setProblem(null);
    reset(blank);
    router.refresh();
  });
  return (
    <form onSubmit={save} noValidate className="grid max-w-xl gap-5">
      {MEASURES.map((measure) => (
        <TextField
          key={measure}
          label={MEASURE_WORDS[measure].label}
          hint={MEASURE_WORDS[measure].how}
          placeholder={unit === 'cm' ? 'cm' : 'in'}
          inputMode={unit === 'cm' ? 'decimal' : 'text'}
          autoComplete="off"
          error={formState.errors[measure]?.message}
          {...register(measure, { validate: lengthError(unit) })}
        />
      ))}
      <TextField type="date" label="Measured on" {...register('measuredOn')} />
      <Tick label="I took them alone" {...register('takenAlone')} />
      <FormFooter action="Save measures" isBusy={formState.isSubmitting} problem={problem} />
    </form>
  );
}
